import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { READER, READER_DIGEST, isThisReader } from '../../src/lib/server/readings/reader';
import { answerDigest, readerDigest } from './reader';

const TYPES = ['fields', 'makers', 'readings', 'rows', 'tables', 'values'];
let root: string;
const write = (name: string, content: string) => {
	mkdirSync(dirname(join(root, name)), { recursive: true });
	writeFileSync(join(root, name), content);
};

beforeEach(() => {
	root = mkdtempSync(join(tmpdir(), 'reader-'));
	for (const type of TYPES) write(`src/lib/types/${type}.ts`, 'export {};\n');
	write('src/lib/text/en/decoder.ts', 'words\n');
	write('src/lib/decoder/engine/read.ts', 'a\nb\n');
	write('src/routes/api/v1/readings/+server.ts', 'route\n');
});
afterEach(() => rmSync(root, { recursive: true }));

describe('the reader’s digest', () => {
	it('is the same for the same sources, wherever they lie and however lines end', () => {
		const before = readerDigest(root);
		expect(before).toMatch(/^[0-9a-f]{64}$/);
		write('src/lib/decoder/engine/read.ts', 'a\r\nb\r\n');
		expect(readerDigest(root)).toBe(before);
	});

	it('changes with the reading code, its layouts, its words and its types', () => {
		const seen = [readerDigest(root)];
		for (const [name, content] of [
			['src/lib/decoder/engine/read.ts', 'c\n'],
			['src/lib/decoder/layouts/gm.ts', 'layout\n'],
			['src/lib/text/en/decoder.ts', 'other words\n'],
			['src/lib/types/fields.ts', 'more\n']
		] as const) {
			write(name, content);
			seen.push(readerDigest(root));
		}
		expect(new Set(seen).size).toBe(seen.length);
	});

	it('does not change with tests or pages', () => {
		const before = readerDigest(root);
		write('src/lib/decoder/engine/read.test.ts', 'test\n');
		write('src/lib/components/Stamp.ts', 'page\n');
		expect(readerDigest(root)).toBe(before);
	});

	it('is built in, and named short or whole in an address', () => {
		expect(READER_DIGEST).toBe(readerDigest(process.cwd()));
		expect(READER).toHaveLength(12);
		expect(isThisReader(` ${READER.toUpperCase()}`)).toBe(true);
		expect(isThisReader(READER_DIGEST)).toBe(true);
		expect(isThisReader(READER.slice(0, 11))).toBe(false);
	});
});

describe('the answers’ digest', () => {
	it('changes with the routes of the interface too', () => {
		const before = answerDigest(root);
		write('src/routes/api/v1/readings/+server.ts', 'other route\n');
		expect(answerDigest(root)).not.toBe(before);
	});
});
