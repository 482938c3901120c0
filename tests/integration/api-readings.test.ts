import { afterEach, describe, expect, it } from 'vitest';
import { broken, call, json, PRESENT, type Call } from './api-calls';
import { NoTablesYetError, ServiceBusyError } from '../../src/lib/server/reference';
import { READER, READER_DIGEST } from '../../src/lib/server/readings';
import {
	problemDetailsSchema,
	readAnswerSchema,
	STAMP_KINDS,
	type ProblemDetails,
	type ReadAnswer
} from '../../src/lib/types';

const read = async (query: string, options?: Call): Promise<ReadAnswer> => {
	const response = await call(`/api/v1/readings?${query}`, options);
	expect(response.status).toBe(200);
	return readAnswerSchema.parse(await response.json());
};
const refused = async (path: string, options?: Call): Promise<ProblemDetails> => {
	const response = await call(path, options);
	expect(response.headers.get('content-type')).toBe('application/problem+json');
	const problem = problemDetailsSchema.parse(await response.json());
	expect(problem.status).toBe(response.status);
	return problem;
};
const codes = ({ status, errors }: ProblemDetails) => [
	status,
	...errors.map(({ field, code }) => `${field} ${code}`)
];
afterEach(() => void (broken.current = null));

describe('GET /api/v1/readings', () => {
	it('answers what a reading is a function of, and the readings', async () => {
		const answer = await read('text=*242377P100123*&kind=serial');
		expect(answer).toMatchObject({
			edition: 2,
			digest: PRESENT.head.digest,
			reader: READER,
			input: { kind: 'serial', text: '*242377P100123*', normalised: '242377P100123' }
		});
		expect(answer.readings[0]).toMatchObject({
			maker: 'General Motors',
			maker_key: 'gm',
			division: 'Pontiac',
			model_year: 1967
		});
	});

	it('reads a bare code in every table where it stands', async () => {
		const answer = await read('text=w&kind=code&maker=pontiac&year=1967');
		expect(answer.readings.map(({ fields }) => fields[0]?.outcome)).toContain('contested');
	});

	it('is forgiving about case and space, and takes an empty parameter for none', async () => {
		const one = await read('text=242377P100123&kind=%20Serial%20&maker=+PONTIAC&year=1967&plant=');
		const other = await read('text=242377P100123&kind=serial&maker=gm&division=pontiac&year=+1967');
		expect(one).toEqual(other);
	});

	it('tells what it looked up only when asked', async () => {
		const lookups = ({ readings }: ReadAnswer) =>
			readings.flatMap(({ fields }) => fields.flatMap((field) => field.lookups ?? []));
		expect(lookups(await read('text=242377P100123'))).toEqual([]);
		expect(lookups(await read('text=242377P100123&explain=1')).length).toBeGreaterThan(0);
	});

	it('answers 200 and what stands in the way when nothing fits', async () => {
		const answer = await read('text=ZZZZZZZZZZZZZZ');
		expect(answer.readings).toEqual([]);
		expect(answer.problems[0]?.message).not.toBe('');
	});

	it('reads against an earlier edition', async () => {
		const answer = await read('text=242377P100123&edition=1');
		expect(answer.edition).toBe(1);
	});

	it('refuses in problem details, naming each parameter and what is accepted', async () => {
		const problem = await refused(
			'/api/v1/readings?text=%20&kind=hood&maker=Tucker&division=Edsel&year=1954&plant=ABCD&field=x'
		);
		expect(codes(problem)).toEqual([
			422,
			'kind unknown_kind',
			'text empty',
			'maker unknown_maker',
			'division unknown_division',
			'year year_out_of_range',
			'plant plant_too_long',
			'field unknown_field'
		]);
		expect(problem.errors[0]?.accepted).toEqual([...STAMP_KINDS]);
		expect(problem.errors[2]?.accepted).toContain('Pontiac');
	});

	it.each([
		['', [422, 'text empty']],
		['?text=', [422, 'text empty']],
		[`?text=${'1'.repeat(65)}`, [422, 'text too_long']],
		['?text=%3F%3F-*', [422, 'text nothing_struck']],
		[`?text=${'1'.repeat(121)}&kind=engine`, [422, 'text too_long']],
		[`?text=${'1'.repeat(601)}&kind=body_tag`, [422, 'text too_long']],
		[`?text=1&serial=${'1'.repeat(65)}`, [422, 'serial too_long']],
		['?text=1&year=1967.5', [422, 'year year_out_of_range']],
		['?text=1&year=2040', [422, 'year year_out_of_range']],
		['?text=1&maker=ford&division=Pontiac', [422, 'division division_of_other_maker']],
		['?text=1&maker=Olds&division=Pontiac', [422, 'division division_of_other_maker']],
		['?text=1&edition=99', [404, 'edition unknown_edition']],
		['?text=1&edition=last', [400, 'edition edition_invalid']],
		['?text=1&explain=perhaps', [400, 'explain no_switch']],
		['?text=1&txet=2', [400, 'txet unknown_parameter']],
		['?text=1&text=2', [400, 'text repeated']],
		['?text=%E0%A4%A', [400, 'text=%E0%A4%A not_decodable']]
	])('refuses %s', async (query, expected) => {
		expect(codes(await refused(`/api/v1/readings${query}`))).toEqual(expected);
	});

	it('takes the corporation for Chrysler unless a division is given', async () => {
		for (const query of ['maker=Chrysler', 'maker=Chrysler&division=Chrysler', 'division=Chrysler'])
			await read(`text=RM23N0G100001&${query}`);
	});

	it('is 406 for an asker who takes no JSON', async () => {
		const problem = await refused('/api/v1/readings?text=1', { headers: { accept: 'text/html' } });
		expect(codes(problem)).toEqual([406, 'Accept not_acceptable']);
	});

	it('is 503 with Retry-After while there are no tables', async () => {
		for (const error of [new NoTablesYetError(), new ServiceBusyError()]) {
			broken.current = error;
			const response = await call('/api/v1/readings?text=1');
			expect(response.status).toBe(503);
			expect(Number(response.headers.get('retry-after'))).toBeGreaterThan(0);
		}
	});

	it('throws on to the hooks what is no refusal', async () => {
		broken.current = new RangeError('a slip of ours');
		await expect(call('/api/v1/readings?text=1')).rejects.toThrow(RangeError);
	});
});

describe('caching of readings', () => {
	const get = (query: string, headers?: Record<string, string>) =>
		call(`/api/v1/readings?text=242377P100123${query}`, { headers });

	it('asks again each time, and spares the body when nothing changed', async () => {
		const first = await get('');
		expect(first.headers.get('cache-control')).toBe('no-cache');
		const etag = first.headers.get('etag')!;
		const again = await get('', { 'if-none-match': etag });
		expect(again.status).toBe(304);
		expect(await again.text()).toBe('');
		expect(again.headers.get('etag')).toBe(etag);
		expect((await get('&year=1967', { 'if-none-match': etag })).status).toBe(200);
		expect((await get('&edition=1', { 'if-none-match': etag })).status).toBe(200);
	});

	it('is for good only when the address carries edition and this reader', async () => {
		const kept = async (query: string) => (await get(query)).headers.get('cache-control');
		expect(await kept(`&edition=1&reader=${READER}`)).toBe('public, max-age=31536000, immutable');
		expect(await kept(`&edition=2&reader=${READER_DIGEST}`)).toContain('immutable');
		for (const query of ['&edition=1', `&reader=${READER}`, '&edition=1&reader=000000000000'])
			expect(await kept(query)).toBe('no-cache');
	});

	it('keeps no refusal', async () => {
		const response = await call(`/api/v1/readings?text=&edition=1&reader=${READER}`);
		expect(response.headers.get('cache-control')).toBe('no-store');
	});
});

describe('POST /api/v1/readings', () => {
	it('answers the same as GET, context beside the text or under it', async () => {
		const got = await read('text=242377P100123&maker=pontiac&year=1967&explain=1');
		for (const body of [
			{ text: '242377P100123', maker: 'Pontiac', year: 1967, explain: true },
			{ text: '242377P100123', explain: 1, context: { maker: 'pontiac', year: '1967' }, kind: null }
		]) {
			const response = await call('/api/v1/readings', json(body));
			expect(response.status).toBe(200);
			expect(response.headers.get('cache-control')).toBe('no-store');
			expect(await response.json()).toEqual(got);
		}
	});

	it.each([
		[{}, [422, 'text empty']],
		[{ text: 5 }, [422, 'text not_text']],
		[{ text: '1', year: [1967] }, [422, 'year not_text']],
		[{ text: '1', fields: { paint: '50' } }, [422, 'fields given_twice']],
		[{ kind: 'engine', fields: { paint: '50' } }, [422, 'fields fields_of_other_kind']],
		[
			{ fields: { paint: ['50'], color: '1' } },
			[422, 'fields.paint not_text', 'fields.color unknown_field']
		],
		[{ fields: { paint: ' ' } }, [422, 'fields empty']],
		[{ fields: '50' }, [422, 'fields not_an_object']],
		[{ text: '1', year: 1967, context: { year: 1967 } }, [422, 'year given_twice']],
		[{ text: '1', context: 'gm' }, [400, 'context not_an_object']],
		[
			{ text: '1', txet: 1, context: { mkr: 'gm' } },
			[400, 'txet unknown_parameter', 'mkr unknown_parameter']
		],
		[[], [400, 'body not_an_object']]
	])('refuses %j', async (body, expected) => {
		expect(codes(await refused('/api/v1/readings', json(body)))).toEqual(expected);
	});

	it('refuses what is no JSON, another type, and a body that is too large', async () => {
		const post = (body: string, type = 'application/json'): Call => ({
			method: 'POST',
			body,
			headers: { 'content-type': type }
		});
		expect((await refused('/api/v1/readings', post('{'))).status).toBe(400);
		expect((await refused('/api/v1/readings', post('text=1', 'text/plain'))).status).toBe(415);
		const large = await refused('/api/v1/readings', post(`{"text":"${'1'.repeat(70_000)}"}`));
		expect(large.status).toBe(413);
	});
});

describe('methods and origins', () => {
	it('HEAD answers as GET', async () => {
		const response = await call('/api/v1/readings?text=242377P100123', { method: 'HEAD' });
		expect(response.status).toBe(200);
		expect(response.headers.get('etag')).not.toBeNull();
	});

	it('any origin may read, without credentials', async () => {
		const response = await call('/api/v1/readings?text=1');
		expect(response.headers.get('access-control-allow-origin')).toBe('*');
		expect(response.headers.has('access-control-allow-credentials')).toBe(false);
		const asked = await call('/api/v1/readings', { method: 'OPTIONS' });
		expect(asked.status).toBe(204);
		expect(asked.headers.get('access-control-allow-methods')).toBe('GET, HEAD, OPTIONS');
		expect(asked.headers.get('allow')).toBe('GET, HEAD, POST, OPTIONS');
	});

	it.each(['PUT', 'PATCH', 'DELETE'])(
		'%s is refused with the methods that are taken',
		async (method) => {
			const response = await call('/api/v1/readings', { method });
			expect(response.status).toBe(405);
			expect(response.headers.get('allow')).toBe('GET, HEAD, POST, OPTIONS');
			const makers = await call('/api/v1/makers', { method });
			expect(makers.headers.get('allow')).toBe('GET, HEAD, OPTIONS');
		}
	);

	it('one address is stopped when it asks too much, the others are not', async () => {
		const ask = (address: string) => call('/api/v1/tables/gm/engine?q=v8', { address });
		const { admit } = await import('../../src/lib/server/http');
		expect((await ask('198.51.100.8')).status).toBe(200);
		admit('198.51.100.7', 600);
		const stopped = await ask('198.51.100.7');
		expect(stopped.status).toBe(429);
		expect(Number(stopped.headers.get('retry-after'))).toBeGreaterThan(0);
		expect((await ask('198.51.100.8')).status).toBe(200);
	});
});
