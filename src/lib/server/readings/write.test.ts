import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { INVENTED } from '../../../../tests/fixtures/invented';
import { compile } from '../../decoder';
import { readAgainst } from './read';
import { writeAnswer } from './write';

const edition = {
	head: {
		number: 2,
		parent: 1,
		digest: 'a'.repeat(64),
		cause: 'release' as const,
		cause_id: null,
		made_at: '2026-12-01T04:00:00.000Z'
	},
	tables: compile({ ...INVENTED, rows: [...INVENTED.rows] })
};
const answerTo = (text: string, explain = false) =>
	readAgainst(edition, { text, context: {}, explain });
const written = (text: string, explain?: boolean) =>
	Buffer.from(writeAnswer(answerTo(text, explain))).toString('utf8');

describe('an answer written', () => {
	it('is what JSON.stringify comes to, the first time and every time after', () => {
		for (const text of ['242377P100123', '24237?7P1?????', '2', 'w', 'ZZZZZZZZZZZZZZ', 'Ж2🚗'])
			for (let time = 0; time < 2; time += 1) {
				expect(written(text)).toBe(JSON.stringify(answerTo(text)));
				expect(written(text, true)).toBe(JSON.stringify(answerTo(text, true)));
			}
	});

	it('is so for any text, however long the answer before was', () => {
		const text = fc.oneof(
			fc.stringMatching(/^[12][HK?][0-9?]{2}[A-Z?]?[5-9?][PB0?][0-9?]{0,6}$/),
			fc.string({ unit: 'binary', maxLength: 64 })
		);
		fc.assert(
			fc.property(text, (typed) => {
				expect(JSON.parse(written(typed))).toEqual(JSON.parse(JSON.stringify(answerTo(typed))));
			})
		);
	});

	it('finds room for an answer longer than any before', () => {
		const [reading] = answerTo('242377P100123').readings;
		const long = { ...reading!, why: 'è'.repeat(200_000) };
		const answer = { ...answerTo('2'), readings: [long, long] };
		expect(Buffer.from(writeAnswer(answer)).toString('utf8')).toBe(JSON.stringify(answer));
	});
});
