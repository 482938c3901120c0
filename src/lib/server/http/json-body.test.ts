import { describe, expect, it } from 'vitest';
import { MOST_BYTES, readJsonObject } from './json-body';
import { Refusal } from './refusal';

const post = (body: BodyInit | null, headers: Record<string, string> = {}) =>
	new Request('http://localhost/', {
		method: 'POST',
		body,
		headers: { 'content-type': 'application/json', ...headers },
		duplex: 'half'
	} as RequestInit);
const status = async (request: Request) => {
	const error: unknown = await readJsonObject(request).catch((thrown: unknown) => thrown);
	return error instanceof Refusal ? error.status : error;
};

describe('a JSON body', () => {
	it('is read as one object', async () => {
		expect(await readJsonObject(post('{"text":"é"}'))).toEqual({ text: 'é' });
		const typed = post('{}', { 'content-type': 'Application/JSON; charset="UTF-8"' });
		expect(await readJsonObject(typed)).toEqual({});
	});

	it.each(['', '{', 'nothing', '[]', '1', 'null', '"a"'])('is refused as %j', async (body) => {
		expect(await status(post(body))).toBe(400);
	});

	it('is refused when missing', async () => {
		expect(await status(post(null))).toBe(400);
	});

	it('is refused when it is not UTF-8', async () => {
		expect(await status(post(new Uint8Array([0x22, 0xff, 0x22])))).toBe(400);
	});

	it('is refused as another media type, charset or coding', async () => {
		for (const type of ['text/plain', 'application/x-www-form-urlencoded', ''])
			expect(await status(post('{}', { 'content-type': type }))).toBe(415);
		const latin = post('{}', { 'content-type': 'application/json; charset=latin1' });
		expect(await status(latin)).toBe(415);
		expect(await status(post('{}', { 'content-encoding': 'gzip' }))).toBe(415);
	});

	it('is refused when too large, announced or not', async () => {
		const long = `{"text":"${'a'.repeat(MOST_BYTES)}"}`;
		expect(await status(post('{}', { 'content-length': String(MOST_BYTES + 1) }))).toBe(413);
		expect(await status(post(new Blob([long]).stream()))).toBe(413);
	});

	it('is refused when the server’s own limit cuts it off', async () => {
		const cut = new ReadableStream({
			start: (controller) =>
				controller.error(Object.assign(new Error('Payload Too Large'), { status: 413 }))
		});
		expect(await status(post(cut))).toBe(413);
	});
});
