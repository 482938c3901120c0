import { ESLint } from 'eslint';
import { describe, expect, it } from 'vitest';
import { borderBetween } from './import-borders.mjs';

describe('borderBetween', () => {
	it.each([
		['src/lib/decoder/read.ts', 'node:crypto', 'pure'],
		['src/lib/decoder/read.ts', '$app/environment', 'pure'],
		['src/lib/decoder/read.ts', '$env/static/private', 'pure'],
		['src/lib/decoder/read.ts', 'sequelize', 'pure'],
		['src/lib/decoder/read.ts', 'zod', 'pure'],
		['src/lib/decoder/engine/fit.ts', '../../server/log', 'pure'],
		['src/lib/decoder/engine/fit.ts', '$lib/format/years', 'pure'],
		['src/lib/types/rows.ts', 'sequelize', 'nothing but zod'],
		['src/lib/types/rows.ts', '../decoder', 'nothing but zod'],
		['src/lib/server/readings/read.ts', '../../../routes/api/x', 'one way'],
		['src/lib/server/readings/read.ts', '../../components/Stamp.svelte', 'hands out data'],
		['src/routes/tables/+page.server.ts', '$lib/server/db', 'a subject of lib/server'],
		['src/routes/tables/+page.server.ts', '$lib/server/reference/search', 'index.ts'],
		['src/hooks.server.ts', '$lib/server/http/domain-errors', 'index.ts'],
		['src/lib/server/readings/read.ts', '../reference/search', 'index.ts'],
		['src/lib/server/readings/read.ts', '$lib/server/reference/search', 'index.ts'],
		['src/lib/server/reference/load.ts', '../db/connection', 'index.ts'],
		['src/lib/server/reference/load.ts', '../db/models/source', 'repositories'],
		['src/lib/server/reference/load.ts', '../db/models', 'repositories'],
		['src/lib/server/reference/load.ts', 'sequelize', 'Only lib/server/db'],
		['src/routes/+page.server.ts', '$env/dynamic/private', 'config.ts']
	])('%s may not import %s', (file, specifier, why) => {
		expect(borderBetween(file, specifier)).toContain(why);
	});

	it.each([
		['src/lib/decoder/read.ts', '../types'],
		['src/lib/decoder/read.ts', '../text/en/decoder'],
		['src/lib/decoder/engine/fit.ts', './layout'],
		['src/lib/decoder/engine/fit.test.ts', 'vitest'],
		['src/lib/decoder/engine/fit.test.ts', '../../../../tests/fixtures/invented'],
		['src/lib/types/rows.ts', 'zod'],
		['src/routes/tables/+page.server.ts', '$lib/server/reference'],
		['src/routes/tables/+page.server.ts', '$lib/server/config'],
		['src/routes/tables/+page.svelte', '$lib/components/Stamp.svelte'],
		['src/lib/server/readings/read.ts', '../reference'],
		['src/lib/server/readings/read.ts', '../../decoder'],
		['src/lib/server/readings/read.ts', '../config'],
		['src/lib/server/reference/load.ts', '../db'],
		['src/lib/server/reference/load.ts', '../db/repositories'],
		['src/lib/server/db/repositories/rows.ts', '../models'],
		['src/lib/server/db/connection.ts', './models'],
		['src/lib/server/db/connection.ts', 'sequelize']
	])('%s may import %s', (file, specifier) => {
		expect(borderBetween(file, specifier)).toBeNull();
	});
});

describe('the lint of the project', () => {
	const eslint = new ESLint();
	const rulesBroken = async (code: string, filePath: string) => {
		const [result] = await eslint.lintText(code, { filePath });
		return result!.messages.map(({ ruleId }) => ruleId);
	};

	it.each([
		['an import', `import { connect } from '$lib/server/db';\nconnect('');\n`],
		['an export', `export { connect } from '$lib/server/db';\n`],
		['an export of everything', `export * from '$lib/server/db';\n`],
		['a late import', `export const load = () => import('$lib/server/db');\n`]
	])('catches a breach of a border in %s', async (_what, code) => {
		expect(await rulesBroken(code, 'src/routes/tables/+page.server.ts')).toEqual([
			'tallyplate/import-borders'
		]);
	});

	it('catches a breach in a page', async () => {
		const code = `<script lang="ts">\n\timport { start } from '$lib/server/reference/current';\n</script>\n\n{start}\n`;
		expect(await rulesBroken(code, 'src/routes/+page.svelte')).toContain(
			'tallyplate/import-borders'
		);
	});

	it('lets config.ts alone read the environment', async () => {
		const code = `export const url = process.env.DATABASE_URL;\n`;
		expect(await rulesBroken(code, 'src/lib/server/db/connection.ts')).toEqual([
			'no-restricted-properties'
		]);
		expect(await rulesBroken(code, 'src/lib/server/config.ts')).toEqual([]);
	});
}, 30_000);
