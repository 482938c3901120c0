import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { build, type Rolldown } from 'vite';
import type * as decoder from '../../../src/lib/decoder';
import { inProject, LOCAL } from '../../../scripts/lib/project.mjs';

type Decoder = typeof decoder;

/** The decoder as a build bundles it: what is measured is what runs. */
export async function bundledDecoder(): Promise<Decoder> {
	const output = (await build({
		configFile: false,
		logLevel: 'silent',
		build: {
			write: false,
			minify: false,
			target: 'node20',
			lib: { entry: inProject('src/lib/decoder/index.ts'), formats: ['es'] }
		}
	})) as Rolldown.RolldownOutput[];
	const file = join(LOCAL, 'bench-decoder.mjs');
	mkdirSync(LOCAL, { recursive: true });
	writeFileSync(file, output[0]?.output[0]?.code ?? '');
	return (await import(pathToFileURL(file).href)) as Decoder;
}
