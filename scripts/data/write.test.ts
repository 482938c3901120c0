import { describe, expect, it } from 'vitest';
import { INVENTED, invented } from './checks/invented';
import { DataUnreadable, contentOf, parseData, readContent } from './read';
import { collectedFiles, editionFiles } from './write';
import { mkdtempSync, rmSync, writeFileSync, mkdirSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { tmpdir } from 'node:os';

function withFolder<T>(files: Readonly<Record<string, string>>, use: (root: string) => T): T {
	const root = mkdtempSync(join(tmpdir(), 'data-'));
	try {
		for (const [file, text] of Object.entries(files)) {
			mkdirSync(dirname(join(root, file)), { recursive: true });
			writeFileSync(join(root, file), text);
		}
		return use(root);
	} finally {
		rmSync(root, { recursive: true });
	}
}

describe('reading and writing', () => {
	it('gives back every byte of a canonical folder', () => {
		const data = invented();
		const values = <T>(placed: readonly { value: T }[]) => placed.map(({ value }) => value);
		const written = new Map([
			...editionFiles(contentOf(data)),
			...collectedFiles({
				mapping: values(data.mapping),
				candidates: values(data.candidates),
				rejected: values(data.rejected)
			})
		]);
		expect(Object.fromEntries(written)).toEqual(INVENTED);
	});

	it('writes one text whatever the order of rows, scope and facts', () => {
		const content = contentOf(invented());
		const shuffled = {
			...content,
			rows: [...content.rows].reverse().map((row) => ({
				...row,
				division: [...row.division].reverse(),
				values: Object.fromEntries(Object.entries(row.values).reverse())
			})),
			citations: [...content.citations].reverse(),
			sources: [...content.sources].reverse()
		};
		expect(editionFiles(shuffled)).toEqual(editionFiles(content));
	});

	it('keeps line numbers where a cell runs over several lines', () => {
		const data = parseData(
			new Map([
				[
					'gm/note.csv',
					[
						'row_key,division,line,body,engine,plant,market,years_from,years_to,code,meaning,values,note',
						'gm.note.x.1,,,,,,,,,,One,{},"First line.',
						'Second line."',
						'gm.note.x.2,,,,,,,,,,Two,{},',
						''
					].join('\n')
				]
			])
		);
		expect(data.rows.map(({ line }) => line)).toEqual([2, 4]);
	});

	it('reads a folder into the content of an edition', () => {
		const content = withFolder(INVENTED, readContent);
		expect(editionFiles(content)).toEqual(editionFiles(contentOf(invented())));
	});

	it('throws with the places when a folder cannot be read', () => {
		const broken = { ...INVENTED, 'gm/shoes.csv': INVENTED['gm/paint.csv'] as string };
		expect(() => withFolder(broken, readContent)).toThrow(DataUnreadable);
		expect(() => withFolder(broken, readContent)).toThrow('gm/shoes.csv:2');
	});
});
