import { once } from 'node:events';
import { request as httpRequest, type IncomingHttpHeaders } from 'node:http';
import { connect } from 'node:net';
import { brotliDecompressSync } from 'node:zlib';
import { describe, expect, inject, it } from 'vitest';
import { startBuiltServer } from '../fixtures/built-server';

const SERIAL = '1M8GDM9AXKP042788';
const origin = new URL(inject('origin'));

interface Answer {
	readonly status: number;
	readonly headers: IncomingHttpHeaders;
	readonly body: Buffer;
}

/** Plain HTTP: fetch hides encodings and refuses some headers. */
async function ask(
	path: string,
	{ method = 'GET', headers = {} as Record<string, string>, body = '', port = origin.port } = {}
): Promise<Answer> {
	const request = httpRequest({ host: '127.0.0.1', port, path, method, headers, agent: false });
	request.end(body);
	const [response] = await once(request, 'response');
	const pieces: Buffer[] = [];
	for await (const piece of response) pieces.push(piece);
	return { status: response.statusCode, headers: response.headers, body: Buffer.concat(pieces) };
}

async function send(bytes: string): Promise<string> {
	const socket = connect(Number(origin.port), '127.0.0.1');
	socket.write(bytes);
	let answer = '';
	for await (const piece of socket) answer += piece;
	return answer;
}

const jsonOf = ({ body }: Answer) => JSON.parse(body.toString());

describe('every answer', () => {
	const HEADERS = {
		'x-content-type-options': 'nosniff',
		'x-frame-options': 'DENY',
		'content-security-policy': expect.stringContaining("frame-ancestors 'none'"),
		'permissions-policy': expect.stringContaining('camera=()'),
		'cross-origin-opener-policy': 'same-origin',
		'x-request-id': expect.any(String)
	};

	it.each([
		['a page', 'GET', '/', 200],
		['a page with a serial', 'GET', `/?text=${SERIAL}`, 200],
		['a file', 'GET', '/favicon.svg', 200],
		['the interface', 'GET', `/api/v1/readings?text=${SERIAL}`, 200],
		['no such page', 'GET', '/nothing-here', 404],
		['nothing in the interface', 'GET', '/api/v1/nothing', 404],
		['a text without a character', 'GET', '/api/v1/readings?text=---', 422],
		['a method that a page does not take', 'PUT', '/', 405],
		['a method that a file does not take', 'POST', '/favicon.svg', 405],
		['a method that nothing takes', 'TRACE', '/', 405],
		['a path that is no text', 'GET', '/%zz', 400],
		['health', 'GET', '/healthz', 200]
	])('carries the headers: %s', async (_what, method, path, status) => {
		const answer = await ask(path, { method });
		expect(answer.status).toBe(status);
		expect(answer.headers).toMatchObject(HEADERS);
		expect(answer.headers['content-security-policy']).not.toMatch(/unsafe|\*/);
	});

	it('carries them on files of the build too, which may be kept for ever', async () => {
		const page = (await ask('/')).body.toString();
		const [file] = /\/_app\/immutable\/[^"']+\.css/.exec(page) ?? [];
		const answer = await ask(file!, { headers: { 'accept-encoding': 'br' } });
		expect(answer.headers).toMatchObject({
			...HEADERS,
			'cache-control': expect.stringContaining('immutable'),
			'content-encoding': 'br'
		});
	});

	it('keeps a serial in the address from other sites and from search engines', async () => {
		const { headers } = await ask(`/?text=${SERIAL}`);
		expect(headers).toMatchObject({ 'referrer-policy': 'no-referrer', 'x-robots-tag': 'noindex' });
		expect((await ask('/')).headers['x-robots-tag']).toBeUndefined();
	});

	it('is a problem where Node alone would refuse', async () => {
		for (const [bytes, status] of [
			[`GET / HTTP/1.1\r\nHost: x\r\nA: ${'a'.repeat(70_000)}\r\n\r\n`, 431],
			['hello\r\n\r\n', 400]
		] as const) {
			const answer = (await send(bytes)).toLowerCase();
			expect(answer).toContain(`http/1.1 ${status}`);
			expect(answer).toContain('content-type: application/problem+json');
			expect(answer).toContain('x-content-type-options: nosniff');
		}
	});

	it.each([
		['PUT', '/', {}, 405],
		['PUT', '/api/v1/readings', {}, 405],
		['POST', '/api/v1/readings', { 'content-type': 'text/plain' }, 415],
		[
			'POST',
			'/api/v1/readings',
			{ 'content-type': 'application/json', origin: 'http://evil.test' },
			403
		],
		[
			'POST',
			'/',
			{ 'content-type': 'application/x-www-form-urlencoded', origin: 'http://evil.test' },
			403
		],
		['GET', '/api/v1/nothing', {}, 404]
	])('is a problem for %s %s %o', async (method, path, headers, status) => {
		const answer = await ask(path, {
			method,
			headers: { ...headers } as Record<string, string>,
			body: method === 'POST' ? 'text=1' : ''
		});
		expect(answer.status).toBe(status);
		expect(answer.headers['content-type']).toBe('application/problem+json');
		expect(jsonOf(answer)).toMatchObject({ status, title: expect.any(String) });
	});

	it('is a problem for a body that is too large', async () => {
		const answer = await ask('/api/v1/readings', {
			method: 'POST',
			headers: { 'content-type': 'application/json' },
			body: `{"text":"${'1'.repeat(600_000)}"}`
		});
		expect(answer.status).toBe(413);
	});

	it('is compressed when that is welcome', async () => {
		const path = `/api/v1/readings?text=${SERIAL}`;
		const plain = await ask(path);
		const packed = await ask(path, { headers: { 'accept-encoding': 'gzip, br' } });
		expect(packed.headers).toMatchObject({ 'content-encoding': 'br', vary: 'accept-encoding' });
		expect(packed.body.length).toBeLessThan(plain.body.length / 2);
		expect(brotliDecompressSync(packed.body).equals(plain.body)).toBe(true);
	});
});

describe('how the service stands', () => {
	it('is told to who watches it', async () => {
		const answer = await ask('/healthz');
		expect(jsonOf(answer)).toEqual({
			status: 'ok',
			parts: { tables: expect.stringMatching(/^edition \d+$/), database: 'up' }
		});
		expect(answer.headers['cache-control']).toBe('no-store');
	});

	it('is told to a balancer', async () => {
		expect(jsonOf(await ask('/readyz'))).toEqual({ status: 'ready' });
	});

	it('goes on without the database as long as tables are in memory, and not without both', async () => {
		const server = await startBuiltServer({
			DATABASE_URL: 'mariadb://nobody:x@127.0.0.1:1/tallyplate'
		});
		const health = await ask('/healthz', { port: String(server.port) });
		expect(health.status).toBe(503);
		expect(jsonOf(health)).toEqual({ status: 'down', parts: { tables: 'none', database: 'down' } });
		expect((await ask('/readyz', { port: String(server.port) })).status).toBe(503);
		const reading = await ask(`/api/v1/readings?text=${SERIAL}`, { port: String(server.port) });
		expect(reading).toMatchObject({
			status: 503,
			headers: { 'content-type': 'application/problem+json', 'retry-after': expect.any(String) }
		});
		expect(await server.end()).toBe(0);
	});
});

describe('a fixed reading', () => {
	it('comes from memory when edition and reader are named, byte for byte the same', async () => {
		const { edition, reader } = jsonOf(await ask(`/api/v1/readings?text=${SERIAL}`));
		const path = `/api/v1/readings?text=${SERIAL}&edition=${edition}&reader=${reader}`;
		const computed = await ask(path);
		expect(computed.headers['cache-control']).toContain('immutable');
		const kept = await ask(`/api/v1/readings?reader=${reader}&text=${SERIAL}&edition=${edition}`);
		expect(kept.body.equals(computed.body)).toBe(true);
		expect(kept.headers.etag).toBe(computed.headers.etag);
		const known = await ask(path, { headers: { 'if-none-match': computed.headers.etag! } });
		expect(known.status).toBe(304);
	});

	it('of another reader is not kept', async () => {
		const { edition } = jsonOf(await ask(`/api/v1/readings?text=${SERIAL}`));
		const answer = await ask(`/api/v1/readings?text=${SERIAL}&edition=${edition}&reader=0`);
		expect(answer.headers['cache-control'] ?? '').not.toContain('immutable');
	});
});

describe('the log', () => {
	it('names each request and masks the serial in it', async () => {
		const server = await startBuiltServer({
			DATABASE_URL: inject('builtDatabaseUrl'),
			LOG_LEVEL: 'info'
		});
		const port = String(server.port);
		const { headers } = await ask(`/api/v1/readings?text=${SERIAL}`, { port });
		await ask(`/nothing/${SERIAL}`, { port });
		await server.end();
		expect(server.output()).toContain(headers['x-request-id']);
		expect(server.output()).toContain('/api/v1/readings?text=1M8GDM9AXKP******');
		expect(server.output()).not.toContain('042788');
	});
});

describe('a wrong setting', () => {
	it.each([
		[{ DEMO: 'perhaps' }, 'DEMO is "perhaps"; expected on or off.'],
		[{ PORT: '4999' }, 'ORIGIN is not set; expected a value, as this is production.'],
		[{ AUTH_SECRET: '' }, 'AUTH_SECRET is not set; expected a value, as this is production.'],
		[{ DATABASE_URL: 'postgres://me:hush@x/y' }, 'DATABASE_URL is not usable'],
		[{ LOG_LEVEL: 'loud' }, 'LOG_LEVEL is "loud"; expected one of']
	])('ends the start in one sentence: %o', async (environment, sentence) => {
		const starting = startBuiltServer({
			DATABASE_URL: inject('builtDatabaseUrl'),
			...environment
		} as Record<string, string>);
		await expect(starting).rejects.toThrow(sentence);
		await expect(starting).rejects.not.toThrow(/hush| {4}at /);
	});

	it('says that the port is taken', async () => {
		const starting = startBuiltServer({
			DATABASE_URL: inject('builtDatabaseUrl'),
			PORT: origin.port,
			ORIGIN: origin.origin
		});
		await expect(starting).rejects.toThrow(`Port ${origin.port} is taken on 127.0.0.1.`);
	});
});

describe('stopping', () => {
	it('lets a request under way end, takes no new one, and leaves with 0', async () => {
		const server = await startBuiltServer({ DATABASE_URL: inject('builtDatabaseUrl') });
		const body = JSON.stringify({ text: SERIAL });
		const request = httpRequest({
			port: server.port,
			path: '/api/v1/readings',
			method: 'POST',
			headers: { 'content-type': 'application/json', 'content-length': Buffer.byteLength(body) }
		});
		request.write(body.slice(0, 5));
		await once(request, 'socket');
		await new Promise((done) => setTimeout(done, 200));
		const ended = server.end();
		await new Promise((done) => setTimeout(done, 200));
		await expect(ask('/healthz', { port: String(server.port) })).rejects.toThrow(/ECONNREFUSED/);
		const answered = once(request, 'response');
		request.end(body.slice(5));
		const [response] = await answered;
		expect(response.statusCode).toBe(200);
		expect(response.headers.connection).toBe('close');
		response.resume();
		expect(await ended).toBe(0);
	});

	it('tells a balancer first, when given the time', async () => {
		const server = await startBuiltServer({
			DATABASE_URL: inject('builtDatabaseUrl'),
			DRAIN_SECONDS: '1'
		});
		const ended = server.end();
		await new Promise((done) => setTimeout(done, 300));
		const answer = await ask('/readyz', { port: String(server.port) });
		expect(answer.status).toBe(503);
		expect(jsonOf(answer)).toEqual({ status: 'draining' });
		expect(await ended).toBe(0);
	});

	it('cuts off what does not end', async () => {
		const server = await startBuiltServer({
			DATABASE_URL: inject('builtDatabaseUrl'),
			SHUTDOWN_SECONDS: '1'
		});
		const socket = connect(server.port, '127.0.0.1');
		socket.on('error', () => undefined);
		socket.write(
			'POST /api/v1/readings HTTP/1.1\r\nHost: x\r\nContent-Type: application/json\r\nContent-Length: 9\r\n\r\n{'
		);
		await new Promise((done) => setTimeout(done, 200));
		const started = performance.now();
		expect(await server.end()).toBe(0);
		expect(performance.now() - started).toBeLessThan(4000);
	});
});
