import { describe, expect, it } from 'vitest';
import { citationsOf, itemEntry, rowAnswer } from '../../src/lib/server/answers';
import { readAgainst } from '../../src/lib/server/readings';
import { tablesInOrder } from '../../src/lib/server/reference';
import {
	itemEntrySchema,
	readAnswerSchema,
	rowDetailSchema,
	type EditionHead
} from '../../src/lib/types';
import { released, samples } from '../published/samples';

const head: EditionHead = {
	number: 1,
	parent: null,
	digest: '0'.repeat(64),
	cause: 'release',
	cause_id: null,
	made_at: '2026-12-01T04:00:00.000Z'
};
const tables = released();
const serials = ['amc', 'chrysler', 'ford', 'gm'].flatMap((maker) =>
	samples(`serials/${maker}.csv`).map(({ text }) => text ?? '')
);

describe('the released tables', () => {
	it('give answers as the interface promises them, for whole and for partly read serials', () => {
		expect(serials.length).toBeGreaterThan(50);
		const texts = serials.flatMap((serial, index) =>
			index % 12 > 0
				? [serial]
				: [
						serial,
						serial.slice(0, 1),
						serial.slice(0, 5),
						`${serial.slice(0, 4)}??${serial.slice(6)}`
					]
		);
		for (const text of texts)
			readAnswerSchema.parse(readAgainst({ head, tables }, { text, context: {}, explain: true }));
	});

	it('have rows and items as the interface promises them', () => {
		for (const row of tables.rows.values())
			rowDetailSchema.parse({
				edition: head.number,
				digest: head.digest,
				...rowAnswer(row),
				citations: citationsOf(row, tables)
			});
		for (const { rows } of tablesInOrder(tables, { table: 'item' }))
			for (const row of rows) itemEntrySchema.parse(itemEntry(row));
	});
});
