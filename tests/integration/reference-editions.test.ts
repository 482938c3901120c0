import { beforeAll, describe, expect, it } from 'vitest';
import { loadRelease, UnknownEditionError, UnknownRowError } from '../../src/lib/server/reference';
import {
	differenceBetween,
	headOf,
	headsBelow,
	historyOf
} from '../../src/lib/server/reference/editions';
import { buildCitation, buildRow, buildSource } from '../fixtures/builders';
import { correct } from '../fixtures/corrections';
import { openTestDatabase, type TestDatabase } from '../fixtures/database';
import { INVENTED } from '../fixtures/invented';

const CHANGED = 'gm.engine.t.1';
const RETIRED = 'gm.engine.z.1';
const ADDED = 'gm.engine.q.1';
const original = INVENTED.rows.find(({ row_key }) => row_key === CHANGED);
if (!original) throw new Error('the invented edition has lost a row');

let database: TestDatabase;
beforeAll(async () => {
	database = await openTestDatabase();
	await loadRelease(database, INVENTED, () => new Date('2026-12-01T10:00:00.125Z'));
	await correct(database, {
		rows: {
			put: [
				{ row: { ...original, meaning: 'Second' }, citations: [] },
				{
					row: buildRow('gm', 'engine', 'Q', 'New'),
					citations: [buildCitation(ADDED, 'new-book')]
				}
			],
			retire: [RETIRED]
		},
		sources: { put: [buildSource('new-book')] }
	});
	const citations = INVENTED.citations.filter(({ row_key }) => row_key === CHANGED);
	await correct(database, { rows: { put: [{ row: original, citations }] } });
});

describe('heads of editions', () => {
	it('name parent, cause and time', async () => {
		expect(await headOf(database, 1)).toMatchObject({
			number: 1,
			parent: null,
			cause: 'release',
			made_at: '2026-12-01T10:00:00.125Z'
		});
		expect(await headOf(database, 3)).toMatchObject({ parent: 2, cause: 'correction' });
	});

	it('are listed newest first, page by page', async () => {
		const numbers = async (below: number | null, limit: number) =>
			(await headsBelow(database, below, limit)).map(({ number }) => number);
		expect(await numbers(null, 2)).toEqual([3, 2]);
		expect(await numbers(2, 2)).toEqual([1]);
		expect(await numbers(1, 2)).toEqual([]);
	});

	it.each([0, 4, -1, 1.5, NaN, 1e300])('there is no edition %d', async (number) => {
		await expect(headOf(database, number)).rejects.toBeInstanceOf(UnknownEditionError);
	});
});

describe('the difference of two editions', () => {
	it('tells rows and sources added, changed and retired', async () => {
		const { rows, sources, claims } = await differenceBetween(database, 1, 2);
		expect(rows.added.map(({ row, citations }) => [row.row_key, citations.length])).toEqual([
			[ADDED, 1]
		]);
		expect(rows.changed).toMatchObject([
			{ old: { row: { meaning: original.meaning } }, new: { row: { meaning: 'Second' } } }
		]);
		expect(rows.retired.map(({ row }) => row.row_key)).toEqual([RETIRED]);
		expect(sources.added.map(({ key }) => key)).toEqual(['new-book']);
		expect(claims).toEqual({ added: [], changed: [], retired: [] });
	});

	it('can be asked backwards', async () => {
		const { rows, from, to } = await differenceBetween(database, 2, 1);
		expect([from.number, to.number]).toEqual([2, 1]);
		expect(rows.added.map(({ row }) => row.row_key)).toEqual([RETIRED]);
		expect(rows.retired.map(({ row }) => row.row_key)).toEqual([ADDED]);
		expect(rows.changed).toMatchObject([{ new: { row: { meaning: original.meaning } } }]);
	});

	it('leaves out what was changed and changed back', async () => {
		const { rows } = await differenceBetween(database, 1, 3);
		expect(rows.changed).toEqual([]);
		expect(rows.added).toHaveLength(1);
	});

	it('of an edition with itself is nothing', async () => {
		const { rows, sources } = await differenceBetween(database, 2, 2);
		expect([rows, sources]).toEqual(Array(2).fill({ added: [], changed: [], retired: [] }));
	});

	it('needs two editions that exist', async () => {
		await expect(differenceBetween(database, 1, 9)).rejects.toBeInstanceOf(UnknownEditionError);
	});
});

describe('the history of a row', () => {
	it('holds every version with the editions that it was live in', async () => {
		const versions = await historyOf(database, CHANGED);
		expect(
			versions.map(({ version, edition_from, edition_to, row, citations }) => [
				version,
				edition_from,
				edition_to,
				row.meaning,
				citations.length
			])
		).toEqual([
			[1, 1, 2, original.meaning, 1],
			[2, 2, 3, 'Second', 0],
			[3, 3, null, original.meaning, 1]
		]);
	});

	it('tells of a retired row too, and not of one that never was', async () => {
		expect(await historyOf(database, RETIRED)).toMatchObject([{ edition_to: 2 }]);
		await expect(historyOf(database, 'gm.engine.nothing.1')).rejects.toBeInstanceOf(
			UnknownRowError
		);
	});
});
