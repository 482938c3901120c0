import { createHash } from 'node:crypto';
import { readdirSync, readFileSync, statSync } from 'node:fs';
import { join, relative, resolve, sep } from 'node:path';
import type { Plugin } from 'vite';

/** What a reading is made by: the decoder with its layouts, its words, and the types that they rest on. */
const READING_SOURCES = [
	'src/lib/decoder',
	'src/lib/text/en/decoder.ts',
	'src/lib/types/fields.ts',
	'src/lib/types/makers.ts',
	'src/lib/types/readings.ts',
	'src/lib/types/rows.ts',
	'src/lib/types/tables.ts',
	'src/lib/types/values.ts'
] as const;

function filesUnder(path: string): string[] {
	if (!statSync(path).isDirectory()) return [path];
	return readdirSync(path, { recursive: true, encoding: 'utf8' })
		.map((name) => join(path, name))
		.filter((name) => name.endsWith('.ts') && !name.endsWith('.test.ts'));
}

/**
 * SHA-256 over sources under a project's root: path and content of each, in the order of their paths,
 * line ends as `\n`. Tests do not count. 64 hexadecimal figures.
 */
function digestOf(root: string, sources: readonly string[]): string {
	const hash = createHash('sha256');
	const files = sources
		.flatMap((source) => filesUnder(join(root, source)))
		.map((file) => ({ file, name: relative(root, file).split(sep).join('/') }))
		.sort((a, b) => (a.name < b.name ? -1 : 1));
	for (const { file, name } of files)
		hash.update(`${name}\0${readFileSync(file, 'utf8').replaceAll('\r\n', '\n')}\0`);
	return hash.digest('hex');
}

/** The digest of the reading code and its layouts. */
export const readerDigest = (root: string): string => digestOf(root, READING_SOURCES);

/** The digest of all code that shapes an answer: an answer kept under older code is asked for again. */
export const answerDigest = (root: string): string => digestOf(root, ['src/lib', 'src/routes/api']);

/**
 * Builds the digests in as `__READER_DIGEST__` and `__ANSWER_DIGEST__`; the dev server starts anew when
 * the reader changes.
 */
export function readerPlugin(): Plugin {
	let root = process.cwd();
	let digest = '';
	return {
		name: 'tallyplate-reader',
		config(config) {
			root = resolve(config.root ?? process.cwd());
			digest = readerDigest(root);
			return {
				define: {
					__READER_DIGEST__: JSON.stringify(digest),
					__ANSWER_DIGEST__: JSON.stringify(answerDigest(root))
				}
			};
		},
		configureServer(server) {
			const sources = READING_SOURCES.map((source) => join(root, source));
			server.watcher.on('all', (_event, file) => {
				if (!sources.some((source) => file.startsWith(source))) return;
				if (readerDigest(root) !== digest) void server.restart();
			});
		}
	};
}
