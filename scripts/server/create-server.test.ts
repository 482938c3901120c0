import { once } from 'node:events';
import { request as httpRequest, type IncomingHttpHeaders, type Server } from 'node:http';
import { connect, type AddressInfo } from 'node:net';
import { brotliDecompressSync, gunzipSync } from 'node:zlib';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { createServer } from './create-server.mjs';

type Handler = Parameters<typeof createServer>[0]['handler'];
type Options = Partial<Parameters<typeof createServer>[0]>;

const running: Server[] = [];
afterEach(() => {
	for (const server of running.splice(0)) {
		server.closeAllConnections();
		server.close();
	}
});

const SETTINGS = { origin: 'http://127.0.0.1:3000', trustProxy: 0, bodyLimit: 2048 };

async function start(handler: Handler, options: Options = {}) {
	const made = createServer({ handler, settings: SETTINGS, ...options });
	running.push(made.server);
	made.server.listen(0, '127.0.0.1');
	await once(made.server, 'listening');
	return { ...made, port: (made.server.address() as AddressInfo).port };
}

interface Answer {
	readonly status: number;
	readonly headers: IncomingHttpHeaders;
	readonly body: Buffer;
}

/** Plain HTTP, because fetch hides encodings and refuses some headers. */
async function ask(
	port: number,
	path: string,
	{ method = 'GET', headers = {}, body = '' } = {}
): Promise<Answer> {
	const request = httpRequest({ port, host: '127.0.0.1', path, method, headers, agent: false });
	request.end(body);
	const [response] = await once(request, 'response');
	const pieces: Buffer[] = [];
	for await (const piece of response) pieces.push(piece);
	return {
		status: response.statusCode,
		headers: response.headers,
		body: Buffer.concat(pieces)
	};
}

/** Sends bytes as they are and returns all that comes back. */
async function send(port: number, bytes: string): Promise<string> {
	const socket = connect(port, '127.0.0.1');
	socket.write(bytes);
	let answer = '';
	for await (const piece of socket) answer += piece;
	return answer;
}

const json = (value: unknown, more: Record<string, string> = {}): Handler => {
	const body = JSON.stringify(value);
	return (_request, response) => {
		response.setHeader('content-type', 'application/json');
		response.setHeader('content-length', Buffer.byteLength(body));
		for (const [name, header] of Object.entries(more)) response.setHeader(name, header);
		response.writeHead(200);
		response.end(body);
	};
};
const LONG = { rows: Array.from({ length: 200 }, (_, n) => ({ code: `${n}`, meaning: 'Red' })) };
const problemOf = ({ body }: Answer) => JSON.parse(body.toString());

describe('headers', () => {
	const EVERYWHERE = {
		'x-content-type-options': 'nosniff',
		'x-frame-options': 'DENY',
		'cross-origin-opener-policy': 'same-origin',
		'permissions-policy': expect.stringContaining('geolocation=()'),
		'content-security-policy': expect.stringContaining("frame-ancestors 'none'"),
		'x-request-id': expect.stringMatching(/^[0-9a-f]{12}-[0-9a-z]+$/)
	};

	it('stand on an answer of the application', async () => {
		const { port } = await start(json({}));
		const { headers } = await ask(port, '/tables');
		expect(headers).toMatchObject({
			...EVERYWHERE,
			'referrer-policy': 'same-origin',
			'cross-origin-resource-policy': 'same-origin'
		});
		expect(headers).not.toHaveProperty('x-robots-tag');
		expect(headers).not.toHaveProperty('strict-transport-security');
	});

	it('stand on an answer whose headers came with writeHead, as of files', async () => {
		const { port } = await start((_request, response) =>
			response.writeHead(200, { 'content-type': 'image/svg+xml', 'content-length': 4 }).end('<svg')
		);
		const { headers, body } = await ask(port, '/mark.svg');
		expect(headers).toMatchObject({ ...EVERYWHERE, 'content-type': 'image/svg+xml' });
		expect(body.toString()).toBe('<svg');
	});

	it('stand on an answer that was ended without a word', async () => {
		const { port } = await start((_request, response) => response.end('x'));
		const { headers } = await ask(port, '/');
		expect(headers).toMatchObject({ ...EVERYWHERE, 'content-length': '1' });
	});

	it.each(['/?kind=serial&text=242378B123456', '/?te%78t=242378B123456'])(
		'keep a stamp in the address to the site: %s',
		async (path) => {
			const { port } = await start(json({}));
			const { headers } = await ask(port, path);
			expect(headers).toMatchObject({
				'referrer-policy': 'no-referrer',
				'x-robots-tag': 'noindex'
			});
		}
	);

	it('open the interface to other sites and close it to search engines', async () => {
		const { port } = await start(json({}));
		const { headers } = await ask(port, '/api/v1/makers');
		expect(headers).toMatchObject({
			'cross-origin-resource-policy': 'cross-origin',
			'x-robots-tag': 'noindex'
		});
	});

	it('leave a policy that the application set', async () => {
		const { port } = await start(json({}, { 'content-security-policy': "default-src 'self'" }));
		const { headers } = await ask(port, '/');
		expect(headers['content-security-policy']).toBe("default-src 'self'");
	});

	it('leave the policy of a page that has not changed as the browser keeps it', async () => {
		const { port } = await start((_request, response) => response.writeHead(304).end());
		const { status, headers } = await ask(port, '/tables');
		expect(status).toBe(304);
		expect(headers).not.toHaveProperty('content-security-policy');
		expect(headers).toMatchObject({ 'x-content-type-options': 'nosniff' });
	});

	it('give a page without a policy one that lets it load its own files only', async () => {
		const { port } = await start(json({}, { 'content-type': 'text/html' }));
		const { headers } = await ask(port, '/');
		expect(headers['content-security-policy']).toContain("script-src 'self'");
		expect(headers['content-security-policy']).not.toContain('unsafe');
	});

	it('give a prerendered page the policy that stands in it', async () => {
		const files = { paths: new Set<string>(), policies: new Map([['/help', "script-src 'x'"]]) };
		const { port } = await start(json({}, { 'content-type': 'text/html' }), { files });
		const { headers } = await ask(port, '/help?x=1');
		expect(headers['content-security-policy']).toBe("script-src 'x'");
	});

	it('ask for https from then on where visitors come by https', async () => {
		const settings = { ...SETTINGS, origin: 'https://tallyplate.example' };
		const { port } = await start(json({}), { settings });
		const { headers } = await ask(port, '/');
		expect(headers['strict-transport-security']).toMatch(/^max-age=\d{8}$/);
	});
});

describe('refusals', () => {
	const plain =
		(status: number): Handler =>
		(_request, response) => {
			response.setHeader('content-type', 'text/plain');
			response.writeHead(status);
			response.write('no ');
			response.end('way');
		};

	it('turns plain text into problem details', async () => {
		const { port } = await start(plain(405));
		const answer = await ask(port, '/', { method: 'PUT' });
		expect(answer.status).toBe(405);
		expect(answer.headers['content-type']).toBe('application/problem+json');
		expect(problemOf(answer)).toEqual({
			type: 'about:blank',
			title: 'Method Not Allowed',
			status: 405,
			detail: expect.any(String),
			errors: []
		});
	});

	it('turns any other refusal under /api into problem details, readable from anywhere', async () => {
		const { port } = await start((_request, response) =>
			response.writeHead(404, { 'content-type': 'text/html' }).end('<h1>Not found</h1>')
		);
		const answer = await ask(port, '/api/v1/nothing');
		expect(problemOf(answer)).toMatchObject({ status: 404 });
		expect(answer.headers['access-control-allow-origin']).toBe('*');
	});

	it('leaves problem details of the application and pages of errors alone', async () => {
		const { port } = await start((request, response) =>
			response
				.writeHead(422, {
					'content-type': request.url === '/' ? 'text/html' : 'application/problem+json'
				})
				.end('own')
		);
		expect((await ask(port, '/api/v1/readings')).body.toString()).toBe('own');
		expect((await ask(port, '/')).body.toString()).toBe('own');
	});

	it('answers HEAD without a body', async () => {
		const { port } = await start(plain(405));
		const answer = await ask(port, '/', { method: 'HEAD' });
		expect(answer.headers['content-type']).toBe('application/problem+json');
		expect(answer.body).toHaveLength(0);
	});

	it.each(['TRACE', 'PROPFIND'])('refuses %s and names what it takes', async (method) => {
		const { port } = await start(json({}));
		const answer = await ask(port, '/', { method });
		expect(answer.status).toBe(405);
		expect(answer.headers.allow).toBe('GET, HEAD, POST, PUT, PATCH, DELETE, OPTIONS');
	});

	it('refuses to post to a file', async () => {
		const files = { paths: new Set(['/favicon.svg']), policies: new Map<string, string>() };
		const { port } = await start(json({}), { files });
		const answer = await ask(port, '/favicon.svg', { method: 'POST' });
		expect(answer).toMatchObject({ status: 405, headers: { allow: 'GET, HEAD' } });
	});

	it('refuses a form under /api, which takes JSON', async () => {
		const { port } = await start(json({}));
		const headers = { 'content-type': 'application/x-www-form-urlencoded' };
		const answer = await ask(port, '/api/v1/readings', { method: 'POST', headers, body: 'a=b' });
		expect(problemOf(answer)).toMatchObject({ status: 415 });
		expect(await ask(port, '/', { method: 'POST', headers, body: 'a=b' })).toMatchObject({
			status: 200
		});
	});

	it('refuses a body above the limit before it is read', async () => {
		const { port } = await start(json({}));
		const answer = await ask(port, '/api/v1/readings', { method: 'POST', body: 'x'.repeat(2049) });
		expect(answer.status).toBe(413);
		expect(problemOf(answer)).toMatchObject({ status: 413 });
	});

	it.each([
		['headers above 64 kB', `GET / HTTP/1.1\r\nHost: x\r\nA: ${'a'.repeat(70_000)}\r\n\r\n`, 431],
		['an address above 64 kB', `GET /?text=${'1'.repeat(70_000)} HTTP/1.1\r\nHost: x\r\n\r\n`, 431],
		['what is no HTTP', 'hello\r\n\r\n', 400],
		['an unknown method', 'FETCH / HTTP/1.1\r\nHost: x\r\n\r\n', 400],
		['no Host', 'GET / HTTP/1.1\r\n\r\n', 400],
		[
			'a foreign expectation',
			'GET / HTTP/1.1\r\nHost: x\r\nExpect: tea\r\nConnection: close\r\n\r\n',
			417
		],
		['an asterisk', 'OPTIONS * HTTP/1.1\r\nHost: x\r\nConnection: close\r\n\r\n', 400]
	])('answers %s with problem details', async (_what, bytes, status) => {
		const { port } = await start(json({}));
		const answer = await send(port, bytes);
		expect(answer).toMatch(new RegExp(`^HTTP/1\\.1 ${status} `));
		expect(answer.toLowerCase()).toContain('content-type: application/problem+json');
		expect(answer.toLowerCase()).toContain('x-content-type-options: nosniff');
		expect(JSON.parse(answer.split('\r\n\r\n')[1]!)).toMatchObject({ status });
	});

	it('takes headers of 60 kB', async () => {
		const { port } = await start(json({}));
		expect(await ask(port, '/', { headers: { a: 'a'.repeat(60_000) } })).toMatchObject({
			status: 200
		});
	});

	it('answers 500 and tells the log when the handler fails', async () => {
		const failed = vi.fn();
		const error = new Error('broken');
		const { port } = await start(() => Promise.reject(error), {
			events: { answered: null, failed }
		});
		const answer = await ask(port, '/');
		expect(problemOf(answer)).toMatchObject({ status: 500 });
		expect(failed).toHaveBeenCalledWith(error, answer.headers['x-request-id']);
	});
});

describe('compression', () => {
	const unpack = ({ headers, body }: Answer) => {
		const encoding = headers['content-encoding'];
		return encoding === 'br'
			? brotliDecompressSync(body)
			: encoding === 'gzip'
				? gunzipSync(body)
				: body;
	};

	it.each([
		['br, gzip', 'br'],
		['gzip, deflate', 'gzip'],
		['gzip;q=1, br;q=0.2', 'gzip'],
		['*', 'br'],
		['br;q=0, gzip;q=0', undefined],
		['identity', undefined]
	])('follows Accept-Encoding %s', async (accept, encoding) => {
		const { port } = await start(json(LONG, { etag: '"a"' }));
		const answer = await ask(port, '/', { headers: { 'accept-encoding': accept } });
		expect(answer.headers['content-encoding']).toBe(encoding);
		expect(answer.headers.vary).toBe('accept-encoding');
		expect(answer.headers.etag).toBe(encoding ? 'W/"a"' : '"a"');
		expect(JSON.parse(unpack(answer).toString())).toEqual(LONG);
	});

	it.each<[string, Handler]>([
		['small', json({ a: 1 })],
		['already encoded', json(LONG, { 'content-encoding': 'x-own' })],
		['a picture', json(LONG, { 'content-type': 'image/png' })],
		['not to be transformed', json(LONG, { 'cache-control': 'no-transform' })]
	])('leaves alone what is %s', async (_what, handler) => {
		const { port } = await start(handler);
		const answer = await ask(port, '/', { headers: { 'accept-encoding': 'br' } });
		expect(answer.headers['content-encoding']).not.toBe('br');
	});

	it('sends each piece of a stream as it comes', async () => {
		let goOn = () => {};
		const { port } = await start((_request, response) => {
			response.setHeader('content-type', 'text/html');
			response.writeHead(200);
			response.write('<p>first</p>');
			// Each piece asks for the next; a packed one can come in two.
			goOn = () => {
				goOn = () => {};
				response.end('<p>last</p>');
			};
		});
		const request = httpRequest({ port, path: '/', headers: { 'accept-encoding': 'gzip' } }).end();
		const [response] = await once(request, 'response');
		const pieces: Buffer[] = [];
		for await (const piece of response) {
			pieces.push(piece);
			goOn();
		}
		expect(gunzipSync(Buffer.concat(pieces)).toString()).toBe('<p>first</p><p>last</p>');
	});

	it('adds to a Vary that is there, and keeps its own out of answers without a body', async () => {
		const { port } = await start(json(LONG, { vary: 'accept' }));
		const answer = await ask(port, '/', { method: 'HEAD', headers: { 'accept-encoding': 'br' } });
		expect(answer.headers.vary).toBe('accept, accept-encoding');
		expect(answer.headers).not.toHaveProperty('content-encoding');
	});
});

describe('the visitor', () => {
	const seen: Handler = (request, response) => response.end(JSON.stringify(request.headers));
	const headersSeen = async (port: number, headers: Record<string, string>) =>
		problemOf(await ask(port, '/', { headers }));

	it('is the peer, whatever the request says', async () => {
		const { port } = await start(seen);
		expect(
			await headersSeen(port, { 'x-forwarded-for': '1.2.3.4', 'x-visitor-address': '1.2.3.4' })
		).toMatchObject({ 'x-visitor-address': '127.0.0.1' });
	});

	it('stands so many entries from the end as there are trusted proxies', async () => {
		const { port } = await start(seen, { settings: { ...SETTINGS, trustProxy: 2 } });
		expect(
			await headersSeen(port, { 'x-forwarded-for': 'made up, 1.2.3.4, 10.0.0.1' })
		).toMatchObject({ 'x-visitor-address': '1.2.3.4' });
		expect(await headersSeen(port, {})).toMatchObject({ 'x-visitor-address': '127.0.0.1' });
	});

	it('is answered by the configured origin, or another name of loopback on the same port', async () => {
		const { port } = await start(seen);
		const named = (host: string) => headersSeen(port, { host, 'x-visitor-host': 'evil.test' });
		expect(await named('evil.test')).toMatchObject({ 'x-visitor-host': '127.0.0.1:3000' });
		expect(await named('localhost:3000')).toMatchObject({ 'x-visitor-host': 'localhost:3000' });
		expect(await named('localhost:4000')).toMatchObject({ 'x-visitor-host': '127.0.0.1:3000' });
	});

	it('has its origin restored when the browser vouches that it stays within the site', async () => {
		const { port } = await start(seen);
		const withSite = (site: string) =>
			headersSeen(port, { origin: 'null', 'sec-fetch-site': site });
		expect(await withSite('same-origin')).toMatchObject({ origin: 'http://127.0.0.1:3000' });
		expect(await withSite('cross-site')).toMatchObject({ origin: 'null' });
	});

	it('passes its request id on only from a trusted proxy', async () => {
		const id = 'from-the-proxy-1';
		const near = await start(seen);
		const far = await start(seen, { settings: { ...SETTINGS, trustProxy: 1 } });
		const idOf = async (port: number) =>
			(await ask(port, '/', { headers: { 'x-request-id': id } })).headers['x-request-id'];
		expect(await idOf(near.port)).not.toBe(id);
		expect(await idOf(far.port)).toBe(id);
	});
});

describe('fixed readings', () => {
	const ADDRESS = '/api/v1/readings?text=242378B123456&edition=3&reader=abc';
	const FIXED = { 'cache-control': 'public, max-age=31536000, immutable', etag: '"3-abc"' };

	async function startCounting(more: Record<string, string> = FIXED) {
		const handler = vi.fn(json(LONG, more));
		return { handler, ...(await start(handler)) };
	}

	it('are answered once by the application, then from memory with the same headers', async () => {
		const { handler, port } = await startCounting();
		const first = await ask(port, ADDRESS);
		const second = await ask(port, '/api/v1/readings?reader=abc&edition=3&text=242378B123456');
		expect(handler).toHaveBeenCalledTimes(1);
		expect(second.body).toEqual(first.body);
		const { date: _d1, 'x-request-id': id1, ...firstHeaders } = first.headers;
		const { date: _d2, 'x-request-id': id2, ...secondHeaders } = second.headers;
		expect(secondHeaders).toEqual(firstHeaders);
		expect(id2).not.toBe(id1);
	});

	it('are compressed as each request likes', async () => {
		const { handler, port } = await startCounting();
		await ask(port, ADDRESS);
		for (const encoding of ['br', 'gzip', 'br']) {
			const answer = await ask(port, ADDRESS, { headers: { 'accept-encoding': encoding } });
			expect(answer.headers).toMatchObject({ 'content-encoding': encoding, etag: 'W/"3-abc"' });
			const body = (encoding === 'br' ? brotliDecompressSync : gunzipSync)(answer.body);
			expect(JSON.parse(body.toString())).toEqual(LONG);
		}
		expect(handler).toHaveBeenCalledTimes(1);
	});

	it('are not sent again to who has them', async () => {
		const { port } = await startCounting();
		await ask(port, ADDRESS);
		const answer = await ask(port, ADDRESS, { headers: { 'if-none-match': 'W/"3-abc"' } });
		expect(answer).toMatchObject({ status: 304, headers: { etag: '"3-abc"' } });
		expect(answer.body).toHaveLength(0);
	});

	it.each([
		['with a cookie', ADDRESS, { cookie: 'a=b' }],
		['with a token', ADDRESS, { authorization: 'Bearer x' }],
		['that ask for another type', ADDRESS, { accept: 'text/html' }],
		['without a reader', ADDRESS.replace('&reader=abc', ''), {}],
		['without an edition', ADDRESS.replace('&edition=3', ''), {}],
		['of another address', ADDRESS.replace('readings', 'tables'), {}]
	])('are asked anew for requests %s', async (_what, path, headers) => {
		const { handler, port } = await startCounting();
		for (let times = 0; times < 2; times++) await ask(port, path, { headers: { ...headers } });
		expect(handler).toHaveBeenCalledTimes(2);
	});

	it('are pages too, while they hold, and do not say so', async () => {
		const { handler, port } = await startCounting({ 'x-kept-while': '' });
		for (let times = 0; times < 2; times++) {
			const { headers } = await ask(port, '/?text=1', { headers: { accept: 'text/html' } });
			expect(headers).not.toHaveProperty('x-kept-while');
		}
		expect(handler).toHaveBeenCalledTimes(1);
		await ask(port, '/?text=1', { headers: { cookie: 'a=b' } });
		expect(handler).toHaveBeenCalledTimes(2);
	});

	it.each([
		['may change', { 'cache-control': 'no-cache' }],
		['set a cookie', { ...FIXED, 'set-cookie': 'a=b' }]
	])('are not kept when they %s', async (_what, headers) => {
		const { handler, port } = await startCounting(headers);
		for (let times = 0; times < 2; times++) await ask(port, ADDRESS);
		expect(handler).toHaveBeenCalledTimes(2);
	});
});

describe('draining', () => {
	it('says so on /readyz and closes connections behind each answer', async () => {
		const { drain, port } = await start(json({}));
		expect((await ask(port, '/readyz')).status).toBe(200);
		drain();
		const answer = await ask(port, '/readyz');
		expect(answer.status).toBe(503);
		expect(problemOf(answer)).toEqual({ status: 'draining' });
		expect((await ask(port, '/')).headers.connection).toBe('close');
	});
});
