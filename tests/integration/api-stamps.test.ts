import { describe, expect, it } from 'vitest';
import { call, json } from './api-calls';
import { READER } from '../../src/lib/server/readings';
import {
	problemDetailsSchema,
	readAnswerSchema,
	STAMP_KINDS,
	stampsAnswerSchema,
	type ReadAnswer,
	type StampsAnswer
} from '../../src/lib/types';

const SERIAL = '242377P100123';

const read = async (query: string): Promise<ReadAnswer> => {
	const response = await call(`/api/v1/readings?${query}`);
	expect(response.status).toBe(200);
	return readAnswerSchema.parse(await response.json());
};
const posted = async (body: unknown): Promise<StampsAnswer> => {
	const response = await call('/api/v1/readings', json(body));
	expect(response.status).toBe(200);
	expect(response.headers.get('cache-control')).toBe('no-store');
	return stampsAnswerSchema.parse(await response.json());
};
const refused = async (body: unknown) => {
	const response = await call('/api/v1/readings', json(body));
	const { status, errors } = problemDetailsSchema.parse(await response.json());
	expect(status).toBe(response.status);
	return [status, ...errors.map(({ field, code }) => `${field} ${code}`)];
};

describe('kinds of stamp', () => {
	it.each(STAMP_KINDS)('%s is read as that', async (kind) => {
		expect((await read(`text=W&kind=${kind}`)).input.kind).toBe(kind);
	});

	it('of several lines, joined by " / " or line breaks, are body tags', async () => {
		const [one, other] = [await read('text=A1+/+B2'), await read('text=A1%0AB2')];
		expect(one.input).toMatchObject({ kind: 'body_tag', normalised: 'A1 / B2' });
		expect(other.input.normalised).toBe(one.input.normalised);
	});

	it('are known by a permanent address as serials are', async () => {
		const address = `/api/v1/readings?kind=date&text=A7&edition=2&reader=${READER}`;
		const response = await call(address);
		expect(response.headers.get('cache-control')).toContain('immutable');
		const etag = response.headers.get('etag') ?? '';
		expect((await call(address, { headers: { 'if-none-match': etag } })).status).toBe(304);
	});

	it('are scoped by the serial of the same car', async () => {
		const beside = await read(`text=W&kind=code&serial=${SERIAL}`);
		const scoped = await read('text=W&kind=code&maker=pontiac&year=1967');
		expect(beside.readings).toEqual(scoped.readings);
		expect(beside.readings).not.toEqual((await read('text=W&kind=code')).readings);
	});
});

describe('a body tag by its fields', () => {
	it('is read like the text that they make', async () => {
		const response = await call('/api/v1/readings', json({ fields: { paint: 'C', trim: '223' } }));
		const answer = readAnswerSchema.parse(await response.json());
		expect(answer.input).toMatchObject({ kind: 'body_tag', text: 'C / 223' });
	});
});

describe('several stamps of one car', () => {
	it('have a result each, in the order asked, and lines of what they say of each other', async () => {
		const answer = await posted({
			stamps: [
				{ kind: 'code', text: 'W', place: 'pad' },
				{ kind: 'serial', text: SERIAL, place: 'dash' },
				{ kind: 'serial', text: '242377P100124', place: 'cowl' }
			]
		});
		expect(answer).toMatchObject({ edition: 2, reader: READER });
		expect(answer.stamps.map(({ input }) => input.kind)).toEqual(['code', 'serial', 'serial']);
		expect(answer.stamps[1]?.readings[0]).toMatchObject({
			maker: 'General Motors',
			division: 'Pontiac'
		});
		const numbers = answer.lines.find(({ attribute }) => attribute === 'sequence_number');
		expect(numbers?.result).toBe('does_not_tally');
		expect([numbers?.left.place, numbers?.right?.place].sort()).toEqual(['cowl', 'dash']);
	});

	it('are each read as alone, with the serial beside them', async () => {
		const { stamps } = await posted({
			stamps: [
				{ kind: 'serial', text: SERIAL },
				{ kind: 'code', text: 'W' }
			]
		});
		const alone = await read(`text=W&kind=code&serial=${SERIAL}`);
		expect(stamps[1]?.readings).toEqual(alone.readings);
	});

	it('are read against the edition that is named, and tell their questions when asked', async () => {
		const asked = { stamps: [{ kind: 'serial', text: SERIAL }], edition: 1, explain: true };
		const answer = await posted(asked);
		expect(answer.edition).toBe(1);
		expect(answer.stamps[0]?.readings[0]?.fields[0]).toHaveProperty('lookups');
		expect(answer.lines).toEqual([]);
	});

	it.each([
		[{ stamps: [] }, [422, 'stamps number_of_stamps']],
		[{ stamps: SERIAL }, [422, 'stamps number_of_stamps']],
		[{ stamps: Array(25).fill({ text: SERIAL }) }, [422, 'stamps number_of_stamps']],
		[{ stamps: [{ text: SERIAL }, 'W'] }, [422, 'stamps[1] not_an_object']],
		[
			{ stamps: [{ text: '?' }, { text: 'W', kind: 'plate' }] },
			[422, 'stamps[0].text nothing_struck', 'stamps[1].kind unknown_kind']
		],
		[{ stamps: [{ text: 'W', fields: { paint: '1' } }] }, [422, 'stamps[0].fields given_twice']],
		[{ stamps: [{ text: 'W', place: 'x'.repeat(101) }] }, [422, 'stamps[0].place too_long']],
		[{ stamps: [{ text: 'W', txet: 'W' }] }, [400, 'stamps[0].txet unknown_parameter']],
		[{ stamps: [{ text: 'W' }], text: 'W' }, [400, 'text unknown_parameter']],
		[{ stamps: [{ text: 'W' }], context: { maker: 'Trabant' } }, [422, 'maker unknown_maker']],
		[{ stamps: [{ text: 'W' }], edition: 99 }, [404, 'edition unknown_edition']]
	])('refuses %j', async (body, expected) => {
		expect(await refused(body)).toEqual(expected);
	});
});
