// The answer that every request gets: headers on all of them, problem details in place of bare
// refusals, compression where it is welcome, a copy of what can be kept.
import { ServerResponse } from 'node:http';
import { chooseEncoding, isCompressible, makeEncoder, SMALLEST, weakTag } from './compression.mjs';
import { isFixed, KEPT_WHILE } from './fixed-readings.mjs';
import { PROBLEM_TYPE, problemBody } from './problems.mjs';
import { namesStamp, securityHeaders } from './security-headers.mjs';

/**
 * What an answer needs to know of its server.
 * @typedef {object} Surroundings
 * @property {boolean} secure visitors come by https
 * @property {(path: string) => string | undefined} pagePolicy policy of a page that brings no header
 * @property {() => boolean} isDraining
 *
 * @typedef {import('node:http').IncomingMessage} Request
 * @typedef {import('node:http').OutgoingHttpHeaders} Headers
 * @typedef {(status: number, headers: Headers, body: Buffer) => void} Keep
 */

/** @type {Surroundings} */
const NOWHERE = { secure: false, pagePolicy: () => undefined, isDraining: () => false };

/** @extends {ServerResponse<Request>} */
export class GuardedResponse extends ServerResponse {
	requestId = '';
	/** Is handed the answer as it was before compression, if it can be kept. @type {Keep | null} */
	keep = null;
	/** @type {import('node:stream').Transform | null} */
	#encoder = null;
	/** Stands in for whatever body comes. @type {string | null} */
	#instead = null;
	/** @type {{ headers: Headers, pieces: Buffer[] } | null} */
	#copy = null;

	/** Shared by all answers of a server. @returns {Surroundings} */
	get surroundings() {
		return NOWHERE;
	}

	/**
	 * @override
	 * @param {number} status
	 * @param {...any} rest reason and headers, as Node takes them
	 * @returns {this}
	 */
	writeHead(status, ...rest) {
		if (this.headersSent) return super.writeHead(status, ...rest);
		this.#take(typeof rest[0] === 'string' ? rest[1] : rest[0]);
		this.statusCode = status;
		this.#replaceBareRefusal();
		this.#guard();
		const type = String(this.getHeader('content-type') ?? '');
		const compressible = isCompressible(type);
		if (compressible) this.appendVary('accept-encoding');
		if (this.keep && isFixed(status, this.getHeaders()))
			this.#copy = { headers: { ...this.getHeaders() }, pieces: [] };
		this.removeHeader(KEPT_WHILE);
		if (compressible) this.#compress();
		return super.writeHead(status);
	}

	/**
	 * Sends what was made ready before, headers and all.
	 * @param {boolean} known the asker has it already
	 * @param {{ body: Buffer, head: string[] }} form
	 */
	sendReady(known, { body, head }) {
		const headers = [...head, 'x-request-id', this.requestId];
		if (this.surroundings.isDraining()) headers.push('connection', 'close');
		if (known) super.writeHead(304, headers);
		else super.writeHead(200, headers);
		super.end(known ? undefined : body);
	}

	/** @param {Headers | string[] | undefined} headers */
	#take(headers = {}) {
		if (Array.isArray(headers)) {
			for (let i = 0; i + 1 < headers.length; i += 2)
				this.setHeader(String(headers[i]), String(headers[i + 1]));
			return;
		}
		for (const [name, value] of Object.entries(headers))
			if (value !== undefined) this.setHeader(name, value);
	}

	/** Node, the adapter and the framework refuse in plain text or with nothing at all. */
	#replaceBareRefusal() {
		if (this.statusCode < 400) return;
		const type = String(this.getHeader('content-type') ?? '');
		const isApi = isApiPath(this.req.url);
		const bare = type === '' || type.startsWith('text/plain') || isApi;
		if (!bare || type.startsWith(PROBLEM_TYPE)) return;
		this.#instead = problemBody(this.statusCode);
		for (const name of ['content-encoding', 'etag', 'last-modified']) this.removeHeader(name);
		this.setHeader('content-type', PROBLEM_TYPE);
		this.setHeader('content-length', Buffer.byteLength(this.#instead));
		this.setHeader('cache-control', 'no-store');
		if (isApi) this.setHeader('access-control-allow-origin', '*');
	}

	#guard() {
		const { secure, pagePolicy, isDraining } = this.surroundings;
		const [path, query] = splitAddress(this.req.url);
		const headers = securityHeaders({
			isApi: isApiPath(path),
			namesStamp: namesStamp(query),
			secure,
			type: String(this.getHeader('content-type') ?? ''),
			pagePolicy: pagePolicy(path)
		});
		for (const [name, value] of headers) {
			// A browser puts the headers of a 304 over those that it kept: the page would lose its own policy.
			if (this.statusCode === 304 && name === 'content-security-policy') continue;
			if (!this.hasHeader(name)) this.setHeader(name, value);
		}
		if (this.requestId) this.setHeader('x-request-id', this.requestId);
		if (isDraining()) this.setHeader('connection', 'close');
	}

	/** @param {string} name */
	appendVary(name) {
		const now = String(this.getHeader('vary') ?? '');
		if (
			now === '*' ||
			now
				.toLowerCase()
				.split(/\s*,\s*/)
				.includes(name)
		)
			return;
		this.setHeader('vary', now ? `${now}, ${name}` : name);
	}

	#compress() {
		if (this.req.method === 'HEAD' || [204, 206, 304].includes(this.statusCode)) return;
		if (this.hasHeader('content-encoding')) return;
		if (/\bno-transform\b/.test(String(this.getHeader('cache-control') ?? ''))) return;
		const length = this.getHeader('content-length');
		const size = length === undefined ? undefined : Number(length);
		if (size !== undefined && size < SMALLEST) return;
		const encoding = chooseEncoding(this.req.headers['accept-encoding']);
		if (!encoding) return;
		this.setHeader('content-encoding', encoding);
		this.removeHeader('content-length');
		const tag = this.getHeader('etag');
		if (tag !== undefined) this.setHeader('etag', weakTag(String(tag)));
		this.#encoder = this.#connect(makeEncoder(encoding, size));
	}

	/** @param {import('node:stream').Transform} encoder */
	#connect(encoder) {
		encoder.on('data', (piece) => {
			if (super.write(piece)) return;
			encoder.pause();
			this.once('drain', () => encoder.resume());
		});
		encoder.on('drain', () => this.emit('drain'));
		encoder.on('end', () => super.end());
		encoder.on('error', (error) => this.destroy(error));
		this.once('close', () => encoder.destroy());
		return encoder;
	}

	/**
	 * @override
	 * @param {any} chunk
	 * @param {...any} rest encoding and callback, as Node takes them
	 * @returns {boolean}
	 */
	write(chunk, ...rest) {
		if (!this.headersSent) this.writeHead(this.statusCode);
		if (this.#instead !== null) return true;
		this.#copy?.pieces.push(Buffer.from(chunk));
		return this.#encoder ? this.#encoder.write(chunk, ...rest) : super.write(chunk, ...rest);
	}

	/**
	 * @override
	 * @param {...any} rest chunk, encoding and callback, as Node takes them
	 * @returns {this}
	 */
	end(...rest) {
		const callback = rest.find((value) => typeof value === 'function');
		const [chunk, encoding] = rest.filter((value) => typeof value !== 'function');
		const bytes = chunk === undefined || chunk === null ? null : Buffer.from(chunk, encoding);
		if (!this.headersSent) {
			if (!this.hasHeader('content-length') && ![204, 304].includes(this.statusCode))
				this.setHeader('content-length', bytes?.length ?? 0);
			this.writeHead(this.statusCode);
		}
		if (callback) this.once('finish', callback);
		if (this.#instead !== null) return super.end(this.#instead);
		if (this.#copy) {
			if (bytes) this.#copy.pieces.push(bytes);
			this.keep?.(this.statusCode, this.#copy.headers, Buffer.concat(this.#copy.pieces));
			this.#copy = null;
		}
		if (!this.#encoder) return bytes ? super.end(bytes) : super.end();
		if (bytes) this.#encoder.end(bytes);
		else this.#encoder.end();
		return this;
	}
}

/** @param {string | undefined} address @returns {[path: string, query: string]} */
export function splitAddress(address = '') {
	const mark = address.indexOf('?');
	return mark < 0 ? [address, ''] : [address.slice(0, mark), address.slice(mark + 1)];
}

/** @param {string | undefined} address */
export const isApiPath = (address = '') => address.startsWith('/api/');
