import {
	DIVISIONS,
	type Citation,
	type EditionContent,
	type ReferenceRow,
	type TableName
} from '../../src/lib/types';
import { buildCitation, buildRow, buildSource } from '../fixtures/builders';

const LETTERS = 'ABCDEFGHJKLMNPRSTUVWXYZ';
type SerialMaker = 'gm' | 'chrysler' | 'ford';
const MAKERS: readonly SerialMaker[] = ['gm', 'chrysler', 'ford'];
const pad = (n: number): string => String(n).padStart(2, '0');

/** Rows that every invented edition has, so that the same serials read the same whatever its size. */
function base(maker: SerialMaker): ReferenceRow[] {
	const rows: ReferenceRow[] = [];
	const add = (
		table: TableName,
		code: string,
		meaning: string,
		parts: Parameters<typeof buildRow>[4]
	) => rows.push(buildRow(maker, table, code, meaning, { ...parts, n: rows.length + 1 }));
	DIVISIONS[maker].forEach((division, index) => {
		const own = { division: [division], years: [1960, 1980] as const };
		const line = `Line ${division}`;
		if (maker === 'gm') add('division', String(index + 1), division, { values: { division } });
		for (let n = 0; n < 20; n += 1) {
			const values = { line, series: `Series ${n}` };
			if (maker === 'gm')
				add('series', `${n % 10}${n % 7}`, `Series ${n}`, { ...own, values, line: [] });
			if (maker === 'gm') add('series', LETTERS.charAt(n), `Series ${n}`, { ...own, values });
			if (maker === 'ford')
				add('body_serial', pad(index * 30 + n), `Body ${n}`, { ...own, values });
		}
		if (maker === 'chrysler')
			add('line', LETTERS.charAt(index), line, { ...own, values: { division, line } });
	});
	for (const code of LETTERS) {
		const years = [1960, 1980] as const;
		add('engine', code, `Engine ${code}`, { years, values: { cylinders: 8 } });
		add('assembly_plant', code, `Plant ${code}`, { years });
		if (maker === 'chrysler') add('price_class', code, `Class ${code}`, { years });
	}
	for (let n = 0; n < 100; n += 1) add('body_style', pad(n), `Body ${n}`, { years: [1960, 1980] });
	add('sequence', '', 'From 100001', { values: { first_sequence: 100001 } });
	return rows;
}

/**
 * An invented edition of about `size` rows: a base that reads every serial of `inventedSerials`, and more rows of the
 * same tables in other scopes (other lines, plants, codes), as a grown edition would have.
 */
export function inventedEdition(size: number): EditionContent {
	const rows = MAKERS.flatMap(base);
	const tables: readonly TableName[] = [
		'paint',
		'trim',
		'unit_code',
		'casting_number',
		'engine',
		'assembly_plant',
		'series',
		'body_style'
	];
	for (let n = 0; rows.length < size; n += 1) {
		const maker = MAKERS[n % 3] as SerialMaker;
		const table = tables[n % tables.length] as TableName;
		const year = 1960 + (n % 20);
		rows.push(
			buildRow(
				maker,
				table,
				`${LETTERS.charAt(n % 23)}${n % 10}${n.toString(36).toUpperCase()}`,
				`Meaning ${n}`,
				{
					n: 100_000 + n,
					years: [year, year],
					line: [`Other ${n % 50}`],
					values: { displacement_cuin: 200 + (n % 300) }
				}
			)
		);
	}
	const sources = Array.from({ length: 50 }, (_, n) =>
		buildSource(`work-${n}`, { kind: n % 2 === 0 ? 'book' : 'web_page' })
	);
	const citations: Citation[] = rows.map((row, n) => buildCitation(row.row_key, `work-${n % 50}`));
	return { rows, citations, sources, claims: [] };
}

/** Serials of the four shapes that an invented edition reads, mixed; a fixed sequence, no two alike. */
export function inventedSerials(count: number): string[] {
	const letter = (n: number): string => LETTERS.charAt(n % LETTERS.length);
	return Array.from({ length: count }, (_, n) => {
		const run = String(100_001 + (n % 90_000));
		switch (n % 4) {
			case 0:
				return `${1 + (n % 5)}${n % 10}${(n % 20) % 7}${pad(n % 100)}${'5678901'.charAt(n % 7)}${letter(n)}${run}`;
			case 1:
				return `${1 + (n % 5)}${letter(n % 20)}${pad(n % 100)}${letter(n)}${2 + (n % 8)}${letter(n + 3)}${run}`;
			case 2:
				return `${letter(n % 4)}${letter(n)}${pad(n % 100)}${letter(n + 5)}${n % 10}${letter(n + 7)}${run}`;
			default:
				return `${n % 10}${letter(n)}${pad((n % 3) * 30 + (n % 20))}${letter(n + 9)}${run}`;
		}
	});
}
