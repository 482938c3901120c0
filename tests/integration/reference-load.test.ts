import { QueryTypes } from 'sequelize';
import { beforeEach, describe, expect, it } from 'vitest';
import { releases } from '../../src/lib/server/db/repositories';
import { contentOf, InvalidReleaseError, loadRelease } from '../../src/lib/server/reference';
import { entriesAt } from '../../src/lib/server/reference/content';
import { digestOf } from '../../src/lib/server/reference/digest';
import { entriesOf } from '../../src/lib/server/reference/entries';
import type { EditionContent, ReferenceRow } from '../../src/lib/types';
import { buildCitation, buildClaim, buildRow, buildSource } from '../fixtures/builders';
import { correct } from '../fixtures/corrections';
import { connectAgain, openTestDatabase, type TestDatabase } from '../fixtures/database';
import { INVENTED } from '../fixtures/invented';

let database: TestDatabase;
beforeEach(async () => {
	database = await openTestDatabase();
});

const digestAt = async (edition: number) => digestOf(await entriesAt(database, edition));
const rowAt = async (edition: number, row_key: string) =>
	(await entriesAt(database, edition)).rows.get(row_key);
const meaningAt = async (edition: number, row_key: string) =>
	(await rowAt(edition, row_key))?.row.meaning;
const counter = async () => {
	const [row] = await database.sequelize.query<{ number: number }>(
		'SELECT number FROM edition_counter',
		{ type: QueryTypes.SELECT }
	);
	return row?.number;
};

/** A release with some rows replaced, some dropped, some added. */
function released(
	change: Record<string, Partial<ReferenceRow> | null>,
	added: Partial<EditionContent> = {}
): EditionContent {
	const kept = (row_key: string) => change[row_key] !== null;
	return {
		rows: [
			...INVENTED.rows
				.filter(({ row_key }) => kept(row_key))
				.map((row) => ({ ...row, ...change[row.row_key] })),
			...(added.rows ?? [])
		],
		citations: [
			...INVENTED.citations.filter(({ row_key }) => kept(row_key)),
			...(added.citations ?? [])
		],
		sources: [...INVENTED.sources, ...(added.sources ?? [])],
		claims: added.claims ?? INVENTED.claims
	};
}
const entryOf = (row_key: string, change: Partial<ReferenceRow> = {}) => {
	const row = INVENTED.rows.find((one) => one.row_key === row_key);
	if (!row) throw new Error(`no invented row ${row_key}`);
	return {
		row: { ...row, ...change },
		citations: INVENTED.citations.filter((citation) => citation.row_key === row_key)
	};
};

describe('the first release', () => {
	it('becomes edition 1, with all that it holds', async () => {
		const report = await loadRelease(database, INVENTED);
		expect(report).toMatchObject({ loaded: true, edition: 1, retired: 0, conflicts: [] });
		const { head, content } = await contentOf(database);
		expect(head).toMatchObject({ number: 1, parent: null, cause: 'release', cause_id: '1' });
		expect(head.digest).toBe(digestOf(entriesOf(INVENTED)));
		expect(head.digest).toBe(report.digest);
		const byKey = (a: ReferenceRow, b: ReferenceRow) => (a.row_key < b.row_key ? -1 : 1);
		expect(content.rows.toSorted(byKey)).toEqual(INVENTED.rows.toSorted(byKey));
		expect(content.sources).toEqual(INVENTED.sources);
		expect(content.claims).toEqual(INVENTED.claims);
		expect(content.citations).toHaveLength(INVENTED.citations.length);
	});

	it('is not loaded again', async () => {
		await loadRelease(database, INVENTED);
		const again = await loadRelease(database, {
			...INVENTED,
			rows: [...INVENTED.rows].reverse(),
			citations: [...INVENTED.citations].reverse()
		});
		expect(again).toMatchObject({ loaded: false, edition: 1, written: 0 });
		expect(await counter()).toBe(1);
	});

	it('is loaded once by two processes that start together', async () => {
		const other = connectAgain(database);
		const reports = await Promise.all([
			loadRelease(database, INVENTED),
			loadRelease(other, INVENTED),
			loadRelease(database, INVENTED)
		]);
		expect(reports.filter(({ loaded }) => loaded)).toHaveLength(1);
		expect(reports.map(({ edition }) => edition)).toEqual([1, 1, 1]);
		expect(await counter()).toBe(1);
		expect(await digestAt(1)).toBe(reports[0]?.digest);
	});

	it('that contradicts itself leaves nothing behind', async () => {
		const twice = { ...INVENTED, rows: [...INVENTED.rows, ...INVENTED.rows.slice(0, 1)] };
		await expect(loadRelease(database, twice)).rejects.toBeInstanceOf(InvalidReleaseError);
		const tooLong = released({ 'gm.engine.t.1': { meaning: 'x'.repeat(601) } });
		await expect(loadRelease(database, tooLong)).rejects.toThrow();
		expect(await counter()).toBe(0);
		expect(await releases.lastLoad(database)).toBeNull();
	});

	it('keeps what is hard to keep: nothing, quotes, emoji, spaces at the end, big and small', async () => {
		const rows = [
			buildRow('gm', 'paint', ' a ', '“Reed” \\ green \' " 💚 ', {
				note: "line\nbreak\ttab'; DROP TABLE editions; --",
				values: { hex_approximate: '#00FF00', é: [1, 2.5, null, true], nested: { b: 1, a: {} } }
			}),
			buildRow('gm', 'paint', ' A ', 'Other case', { n: 2 })
		];
		const citations = [
			buildCitation(rows[0]?.row_key ?? '', 'b', { seen_on: '1999-12-31', quotation: '?:a $1' }),
			buildCitation(rows[0]?.row_key ?? '', 'b', { locator: 'p. 40' })
		];
		const content = { rows, citations, sources: [buildSource('b', { year: null })], claims: [] };
		await loadRelease(database, content);
		expect((await contentOf(database)).content).toEqual(content);
	});
});

describe('a second release', () => {
	const KEYS = {
		untouched: 'gm.division.1.1',
		releaseChanged: 'gm.engine.t.1',
		releaseRetired: 'gm.engine.z.1',
		hereChanged: 'gm.engine.t.2',
		hereRetired: 'gm.body_style.45.1',
		sameChange: 'gm.paint.50.1',
		clash: 'gm.assembly_plant.p.1',
		changedThereRetiredHere: 'gm.assembly_plant.b.1',
		retiredThereChangedHere: 'gm.assembly_plant.b.2',
		added: 'gm.engine.q.1',
		addedHere: 'gm.engine.y.1'
	};
	const second = released(
		{
			[KEYS.releaseChanged]: { meaning: 'From the release' },
			[KEYS.releaseRetired]: null,
			[KEYS.sameChange]: { meaning: 'Same on both sides' },
			[KEYS.clash]: { meaning: 'Clash, as released' },
			[KEYS.changedThereRetiredHere]: { meaning: 'Changed there' },
			[KEYS.retiredThereChangedHere]: null
		},
		{
			rows: [buildRow('gm', 'engine', 'Q', 'Added by the release')],
			citations: [buildCitation(KEYS.added, 'new-book')],
			sources: [buildSource('new-book')],
			claims: [buildClaim('gm.engine.all', 'gm', 'engine', 'new-book')]
		}
	);

	beforeEach(async () => {
		await loadRelease(database, INVENTED);
		await correct(database, {
			rows: {
				put: [
					entryOf(KEYS.hereChanged, { meaning: 'Changed here' }),
					entryOf(KEYS.sameChange, { meaning: 'Same on both sides' }),
					entryOf(KEYS.clash, { meaning: 'Clash, as corrected' }),
					entryOf(KEYS.retiredThereChangedHere, { meaning: 'Changed here' }),
					{ row: buildRow('gm', 'engine', 'Y', 'Added here'), citations: [] }
				],
				retire: [KEYS.hereRetired, KEYS.changedThereRetiredHere]
			}
		});
	});

	it('is merged with the corrections made here, in one edition', async () => {
		const report = await loadRelease(database, second);
		expect(report).toMatchObject({ loaded: true, edition: 3 });
		const { head, content } = await contentOf(database);
		expect(head).toMatchObject({ number: 3, parent: 2, cause: 'release', cause_id: '2' });
		expect(head.digest).toBe(digestOf(entriesOf(content)));
		const meanings = Object.fromEntries(
			await Promise.all(
				Object.entries(KEYS).map(async ([name, key]) => [name, await meaningAt(3, key)])
			)
		);
		expect(meanings).toEqual({
			untouched: 'Chevrolet',
			releaseChanged: 'From the release',
			releaseRetired: undefined,
			hereChanged: 'Changed here',
			hereRetired: undefined,
			sameChange: 'Same on both sides',
			clash: 'Clash, as corrected',
			changedThereRetiredHere: undefined,
			retiredThereChangedHere: 'Changed here',
			added: 'Added by the release',
			addedHere: 'Added here'
		});
		expect(content.claims.map(({ claim_key }) => claim_key)).toEqual(['gm.engine.all']);
		expect((await rowAt(3, KEYS.added))?.citations).toMatchObject([{ source: 'new-book' }]);
	});

	it('lists for moderators what both sides changed, with all three states', async () => {
		await loadRelease(database, second);
		const open = await releases.openConflicts(database);
		expect(open.map(({ entry_key, reason }) => [entry_key, reason])).toEqual([
			[KEYS.changedThereRetiredHere, 'retired_here'],
			[KEYS.retiredThereChangedHere, 'retired_in_release'],
			[KEYS.clash, 'changed_in_both']
		]);
		expect(open[2]).toMatchObject({
			load_number: 2,
			kind: 'row',
			base: { row: { meaning: 'Plovertown, Michigan' } },
			theirs: { row: { meaning: 'Clash, as released' } },
			ours: { row: { meaning: 'Clash, as corrected' } },
			resolved_at: null
		});
	});

	it('leaves the editions before it as they were', async () => {
		const before = [await digestAt(1), await digestAt(2)];
		await loadRelease(database, second);
		expect([await digestAt(1), await digestAt(2)]).toEqual(before);
		expect(before[0]).toBe(digestOf(entriesOf(INVENTED)));
	});

	it('is the base of the third, so that a clash is told once', async () => {
		await loadRelease(database, second);
		const third = {
			...second,
			rows: second.rows.map((row) =>
				row.row_key === KEYS.untouched ? { ...row, note: 'Third.' } : row
			)
		};
		const report = await loadRelease(database, third);
		expect(report).toMatchObject({ edition: 4, written: 1, retired: 0, conflicts: [] });
		expect(await meaningAt(4, KEYS.clash)).toBe('Clash, as corrected');
	});

	it('that brings nothing new makes no edition, and is remembered', async () => {
		const { content } = await contentOf(database);
		expect(await loadRelease(database, content)).toMatchObject({ loaded: true, edition: 2 });
		expect(await counter()).toBe(2);
		expect(await loadRelease(database, content)).toMatchObject({ loaded: false, edition: 2 });
	});

	it('lets a row come back as a new version of its key', async () => {
		await loadRelease(database, second);
		await loadRelease(database, INVENTED);
		expect(await meaningAt(3, KEYS.releaseRetired)).toBeUndefined();
		expect(await meaningAt(4, KEYS.releaseRetired)).toBe('400-cubic-inch V8');
	});

	it('is merged once, whoever else makes an edition at the same time', async () => {
		const other = connectAgain(database);
		const [report, number] = await Promise.all([
			loadRelease(database, second),
			correct(other, { rows: { put: [entryOf(KEYS.untouched, { note: 'Meanwhile.' })] } })
		]);
		expect([report.edition, number].sort()).toEqual([3, 4]);
		const { content } = await contentOf(database, 4);
		const row = content.rows.find(({ row_key }) => row_key === KEYS.untouched);
		expect(row?.note).toBe('Meanwhile.');
		expect(await meaningAt(4, KEYS.releaseChanged)).toBe('From the release');
	});
});

describe('the tables', () => {
	it('refuse a second live version of a row, and a citation of no source', async () => {
		await loadRelease(database, INVENTED);
		const insert = (table: string, from: string) =>
			database.sequelize.query(`INSERT INTO ${table} ${from}`);
		await expect(
			insert(
				'sources (source_key, version, title, publisher, kind, seen_at, licence, edition_from)',
				`VALUES ('memory', 9, '', '', 'memory', '', '', 1)`
			)
		).rejects.toMatchObject({ name: 'SequelizeUniqueConstraintError' });
		await expect(
			insert(
				'citations (row_key, version, position, source, stance, locator, quotation)',
				`VALUES ('gm.engine.t.1', 1, 9, 'no-such-work', 'for', '', '')`
			)
		).rejects.toMatchObject({ name: 'SequelizeForeignKeyConstraintError' });
	});
});
