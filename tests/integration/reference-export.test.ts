import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { exportContent } from '../../scripts/data/export';
import { readContent, readFiles } from '../../scripts/data/read';
import { collectedFiles } from '../../scripts/data/write';
import { contentOf, loadRelease } from '../../src/lib/server/reference';
import { correct } from '../fixtures/corrections';
import { openTestDatabase } from '../fixtures/database';
import { INVENTED } from '../fixtures/invented';

let folder: string;
beforeEach(() => {
	folder = mkdtempSync(join(tmpdir(), 'tallyplate-data-'));
	// What a data folder has beside the tables.
	for (const [file, text] of collectedFiles({ mapping: [], candidates: [], rejected: [] }))
		writeFileSync(join(folder, file), text);
});
afterEach(() => rmSync(folder, { recursive: true }));

describe('an export', () => {
	it('of what was imported changes no byte', async () => {
		const database = await openTestDatabase();
		await loadRelease(database, INVENTED);
		const first = await contentOf(database);
		expect(exportContent(first.content, folder)).toContain('gm/engine.csv');
		const files = readFiles(folder);

		const other = await openTestDatabase();
		const report = await loadRelease(other, readContent(folder));
		expect(report.digest).toBe(first.head.digest);
		expect(exportContent((await contentOf(other)).content, folder)).toEqual([]);
		expect(readFiles(folder)).toEqual(files);
	});

	it('of the released tables changes no byte of them', async () => {
		const database = await openTestDatabase();
		await loadRelease(database, readContent('data'));
		const before = readFiles('data');
		for (const [file, text] of before) {
			if (file.includes('/')) continue;
			writeFileSync(join(folder, file), text);
		}
		exportContent((await contentOf(database)).content, folder);
		const after = readFiles(folder);
		for (const [file, text] of before) expect.soft(after.get(file), file).toBe(text);
	});

	it('brings accepted corrections back, touches no other file, and loads as nothing new', async () => {
		const database = await openTestDatabase();
		await loadRelease(database, INVENTED);
		exportContent((await contentOf(database)).content, folder);
		const row = INVENTED.rows.find(({ row_key }) => row_key === 'gm.paint.50.1');
		if (!row) throw new Error('the invented edition has lost a row');
		await correct(database, {
			rows: { put: [{ row: { ...row, meaning: 'Sedge Green' }, citations: [] }] }
		});
		const { content } = await contentOf(database);
		expect(exportContent(content, folder).sort()).toEqual([
			'gm/paint.citations.csv',
			'gm/paint.csv'
		]);
		expect(readFiles(folder).get('gm/paint.csv')).toContain('Sedge Green');
		expect(await loadRelease(database, readContent(folder))).toMatchObject({
			edition: 2,
			written: 0,
			conflicts: []
		});
	});

	it('leaves the file of a table that lost its last row, with its header', async () => {
		const database = await openTestDatabase();
		await loadRelease(database, INVENTED);
		exportContent((await contentOf(database)).content, folder);
		await correct(database, { rows: { retire: ['gm.paint.50.1'] } });
		exportContent((await contentOf(database)).content, folder);
		expect(readFiles(folder).get('gm/paint.csv')).toMatch(/^row_key,[a-z_,]+\n$/);
		expect(readContent(folder).rows.some(({ table }) => table === 'paint')).toBe(false);
	});
});
