/**
 * The interface of the built server with the released tables: stamps as published pages print them, each of which names
 * its source in `tests/published`, asked for over HTTP.
 */
import { describe, expect, it } from 'vitest';
import { samples, unmet, type Expectation } from '../published/samples';
import { ask } from '../fixtures/asking';
import { readAnswerSchema, stampsAnswerSchema } from '../../src/lib/types';

type Sample = Record<string, string>;

const EACH = 3;
const published: readonly Sample[] = [
	...['chrysler', 'ford', 'gm'].flatMap((maker) => samples(`stamps/${maker}.csv`)),
	...samples('serials/gm.csv').map((sample) => ({ ...sample, kind: 'serial' }))
].filter((sample: Sample) => sample['known_miss'] === '');

/** What the interface takes of an example: the division stands for its maker where one is named. */
const asked = ({ kind = '', text = '', maker, division, year, serial, field }: Sample) => ({
	kind,
	text,
	...((division || maker) && { maker: division || maker }),
	...(year && { year }),
	...(serial && { serial }),
	...(field && { field })
});

async function answerTo(sample: Sample) {
	const { status, body } = await ask(`/api/v1/readings?${new URLSearchParams(asked(sample))}`);
	expect(status, body).toBe(200);
	return readAnswerSchema.parse(JSON.parse(body));
}
const expected = (sample: Sample) => JSON.parse(sample['expect'] ?? '{}') as Expectation;

describe('published stamps over HTTP', () => {
	it.each(['serial', 'body_tag', 'engine', 'casting'])(
		'of kind %s read as published',
		async (kind) => {
			const some = published.filter((sample) => sample.kind === kind).slice(0, EACH);
			expect(some).toHaveLength(EACH);
			for (const sample of some) {
				const answer = await answerTo(sample);
				expect(answer.input.kind).toBe(kind);
				expect(unmet(answer.readings[0], expected(sample))).toEqual([]);
			}
		}
	);

	it('of kind date read as published, day by day', async () => {
		const days = samples('dates/dates.csv').filter(
			({ expect: day = '', year, years }) => /^\d{4}-/.test(day) && year !== '' && years === ''
		);
		for (const { text, year, expect: day } of days.slice(0, EACH)) {
			const { input, readings } = await answerTo({
				kind: 'date',
				text: text ?? '',
				year: year ?? ''
			});
			expect(input.kind).toBe('date');
			const found = readings.flatMap(({ fields }) => fields.flatMap(({ values }) => values));
			expect(found).toContainEqual(expect.objectContaining({ earliest: day, latest: day }));
		}
	});

	// 1966 Ford plate in stamps/ford.csv: paint V is Emberglo.
	it('of kind code read as published', async () => {
		const { input, readings } = await answerTo({
			kind: 'code',
			text: 'V',
			maker: 'ford',
			year: '1966',
			field: 'paint'
		});
		expect(input.kind).toBe('code');
		const meanings = readings.flatMap(({ fields }) =>
			fields.flatMap(({ meaning, possible }) => [meaning, ...possible.map((one) => one.meaning)])
		);
		expect(meanings.join('; ')).toContain('Emberglo');
	});

	it('of one car are read in one request, and held against each other', async () => {
		const [text = ''] = published
			.filter(
				({ kind, maker, text = '' }) =>
					kind === 'body_tag' && maker === 'ford' && text.includes('/')
			)
			.map(({ text }) => text);
		const [serial = '', plate = ''] = text.split(' / ');
		const { status, body } = await ask('/api/v1/readings', {
			json: {
				stamps: [
					{ kind: 'serial', text: serial, place: 'door' },
					{ kind: 'body_tag', text: `${serial} / ${plate}` }
				]
			}
		});
		expect(status, body).toBe(200);
		const { stamps, lines } = stampsAnswerSchema.parse(JSON.parse(body));
		expect(stamps.map(({ input }) => input.kind)).toEqual(['serial', 'body_tag']);
		const results = new Map(lines.map(({ attribute, result }) => [attribute, result]));
		expect(results.get('sequence_number')).toBe('tallies');
		expect(results.get('paint')).toBe('not_looked_at');
	});
});
