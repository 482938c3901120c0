import { once } from 'node:events';
import { request as httpRequest, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { getRequest } from '@sveltejs/kit/node';
import { afterEach, describe, expect, it } from 'vitest';
import { limitOf, UPLOAD_LIMIT } from './body-limits.mjs';
import { createServer } from './create-server.mjs';

const USUAL = 2048;

describe('the limit of a body', () => {
	it.each([
		['/account/files', UPLOAD_LIMIT],
		['/files/uploads/0123', UPLOAD_LIMIT],
		['/', USUAL],
		['/account/filesystem', USUAL],
		['/api/v1/readings', USUAL],
		['/files/0123/thumb', USUAL]
	])('of %s is %i bytes', (path, limit) => {
		expect(limitOf(path, USUAL)).toBe(limit);
	});
});

describe('a body whose length is not said beforehand', () => {
	const running: Server[] = [];
	afterEach(() => {
		for (const server of running.splice(0)) {
			server.closeAllConnections();
			server.close();
		}
	});

	/** What the framework makes of a body of so many bytes: its length, or the status of the error that it meets. */
	async function read(path: string, bytes: number): Promise<unknown> {
		let read: unknown;
		const { server } = createServer({
			settings: { origin: 'http://127.0.0.1:3000', trustProxy: 0, bodyLimit: USUAL },
			async handler(incoming, response) {
				const request = await getRequest({
					base: 'http://127.0.0.1:3000',
					request: incoming,
					bodySizeLimit: UPLOAD_LIMIT
				});
				read = await request.arrayBuffer().then(
					(body) => body.byteLength,
					(error) => error.status
				);
				response.end();
			}
		});
		running.push(server);
		server.listen(0, '127.0.0.1');
		await once(server, 'listening');
		const { port } = server.address() as AddressInfo;
		const request = httpRequest({
			port,
			path,
			method: 'POST',
			headers: { 'transfer-encoding': 'chunked', 'content-type': 'application/json' }
		});
		for (let sent = 0; sent < bytes; sent += 500)
			request.write(Buffer.alloc(Math.min(500, bytes - sent)));
		request.end();
		const [response] = await once(request, 'response');
		response.resume();
		return read;
	}

	it('is read whole up to its limit, and no further', async () => {
		expect(await read('/', USUAL)).toBe(USUAL);
		expect(await read('/', USUAL + 1)).toBe(413);
		expect(await read('/', 100_000)).toBe(413);
	});

	it('may be longer where files are taken', async () => {
		expect(await read('/files/uploads', 100_000)).toBe(100_000);
	});
});
