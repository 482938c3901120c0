// Readings kept ready: those that can never change, as they name both edition and reader, and the
// pages of readings for as long as what they were made from is the present.
import { compressWhole, SMALLEST, weakTag } from './compression.mjs';

const READINGS = '/api/v1/readings?';
/** The reading page is the one at the top. */
const PAGE = '/?';
/** With this the application says of a page for how long it holds; it stays inside. */
export const KEPT_WHILE = 'x-kept-while';
/** Larger answers are rare, and would push out many small ones. */
const LARGEST = 256 * 1024;
/** The longest text that is read has 600 characters. */
const LONGEST_ADDRESS = 2048;
const MOST_ADDRESSES = 8192;
/** What an entry costs beside its bodies: key, headers, bookkeeping. */
const OVERHEAD = 1024;

/**
 * @typedef {'identity' | import('./compression.mjs').Encoding} Form
 *
 * @typedef {object} Entry
 * @property {[name: string, value: string][]} headers as the application and the server set them
 * @property {string | undefined} etag
 * @property {string | undefined} while what must be the present; undefined for what never changes
 * @property {Map<Form, { body: Buffer, head: string[] }>} forms ready to be sent
 * @property {number} bytes
 * @property {boolean} held false once pushed out, perhaps while a form is being made
 */

/**
 * Whether an answer to a request could be kept, or come from what is kept.
 * @param {import('node:http').IncomingMessage} request
 */
export function mayBeFixed({ method, url = '', headers }) {
	if (method !== 'GET' || url.length > LONGEST_ADDRESS) return false;
	if (headers.cookie !== undefined || headers.authorization !== undefined) return false;
	const { accept } = headers;
	if (url.startsWith(PAGE)) return accept === undefined || /\*\/\*|text\/(?:html|\*)/.test(accept);
	if (!url.startsWith(READINGS)) return false;
	if (!url.includes('edition=') || !url.includes('reader=')) return false;
	return accept === undefined || /\*\/\*|application\/(?:json|\*)/.test(accept);
}

/**
 * One key for all ways to write an address: parameters in order of their names, decoded. Of a page
 * there is one way only: others are led to it.
 * @param {string} address
 */
function keyOf(address) {
	if (address.startsWith(PAGE)) return address;
	const parameters = [...new URLSearchParams(address.slice(READINGS.length))];
	// Order of equal names is kept: which of them counts is the application's decision.
	parameters.sort(([a], [b]) => (a < b ? -1 : a > b ? 1 : 0));
	return JSON.stringify(parameters);
}

/** Headers that belong to one answer and not to what is kept. */
const OWN_TO_ONE = new Set(['connection', 'content-length', 'date', 'x-request-id', KEPT_WHILE]);

/** A bounded store; what was not asked for longest goes first. */
export class FixedReadings {
	/** @type {Map<string, Entry>} oldest use first */
	#entries = new Map();
	/** Keys of addresses as they were written, to be spared the reading of them. @type {Map<string, string>} */
	#keys = new Map();
	#bytes = 0;
	#most;
	#mostBytes;
	#present;

	/**
	 * @param {{ most?: number, mostBytes?: number, present?: () => string }} [options] `present` answers
	 *   what pages are made from now
	 */
	constructor({ most = 20_000, mostBytes = 64 * 1024 * 1024, present = () => '' } = {}) {
		this.#present = present;
		this.#most = most;
		this.#mostBytes = mostBytes;
	}

	get size() {
		return this.#entries.size;
	}

	get bytes() {
		return this.#bytes;
	}

	/** @param {string} address path and query @returns {Entry | undefined} */
	get(address) {
		const written = this.#keys.get(address);
		const key = written ?? keyOf(address);
		const entry = this.#entries.get(key);
		if (entry?.while !== undefined && entry.while !== this.#present()) {
			this.#drop(key);
			return undefined;
		}
		if (entry && written === undefined) this.#remember(address, key);
		if (entry) {
			this.#entries.delete(key);
			this.#entries.set(key, entry);
		}
		return entry;
	}

	/** @param {string} address @param {string} key */
	#remember(address, key) {
		if (this.#keys.size >= MOST_ADDRESSES) this.#keys.clear();
		this.#keys.set(address, key);
	}

	/**
	 * Keeps an answer when it says of itself that it cannot change, or for how long it holds.
	 * @param {string} address path and query
	 * @param {number} status
	 * @param {import('node:http').OutgoingHttpHeaders} headers
	 * @param {Buffer} body as it was before compression
	 * @returns {boolean} whether it was kept
	 */
	keep(address, status, headers, body) {
		const key = keyOf(address);
		if (!isFixed(status, headers) || body.length > LARGEST) return false;
		/** @type {[string, string][]} */
		const kept = [];
		for (const [name, value] of Object.entries(headers)) {
			if (!OWN_TO_ONE.has(name) && value !== undefined) kept.push([name, String(value)]);
		}
		const etag = headers.etag === undefined ? undefined : String(headers.etag);
		/** @type {Entry} */
		const entry = {
			headers: kept,
			etag,
			while: headers[KEPT_WHILE] === undefined ? undefined : String(headers[KEPT_WHILE]),
			forms: new Map(),
			bytes: OVERHEAD,
			held: true
		};
		this.#drop(key);
		this.#entries.set(key, entry);
		this.#bytes += entry.bytes;
		this.#addForm(entry, 'identity', body);
		return true;
	}

	/**
	 * The body in a form, made at the first request for it.
	 * @param {Entry} entry @param {Form} form
	 */
	async formOf(entry, form) {
		const ready = entry.forms.get(form);
		if (ready) return ready;
		const plain = entry.forms.get('identity');
		if (!plain) throw new Error('a kept reading has no body');
		if (form === 'identity' || plain.body.length < SMALLEST) return plain;
		return this.#addForm(entry, form, await compressWhole(plain.body, form));
	}

	/** @param {Entry} entry @param {Form} form @param {Buffer} body */
	#addForm(entry, form, body) {
		// Two first requests may have compressed at the same time.
		const ready = entry.forms.get(form);
		if (ready) return ready;
		const head = entry.headers.flatMap(([name, value]) => [
			name,
			name === 'etag' && form !== 'identity' ? weakTag(value) : value
		]);
		if (form !== 'identity') head.push('content-encoding', form);
		head.push('content-length', String(body.length));
		const made = { body, head };
		entry.forms.set(form, made);
		entry.bytes += body.length;
		if (entry.held) this.#bytes += body.length;
		this.#shrink();
		return made;
	}

	#shrink() {
		for (const key of this.#entries.keys()) {
			if (this.#entries.size <= this.#most && this.#bytes <= this.#mostBytes) return;
			this.#drop(key);
		}
	}

	/** @param {string} key */
	#drop(key) {
		const entry = this.#entries.get(key);
		if (!entry) return;
		this.#entries.delete(key);
		entry.held = false;
		this.#bytes -= entry.bytes;
	}
}

/**
 * Whether an answer says of itself that it will never change, or for how long it holds.
 * @param {number} status @param {import('node:http').OutgoingHttpHeaders} headers
 */
export const isFixed = (status, headers) =>
	status === 200 &&
	headers['set-cookie'] === undefined &&
	(headers[KEPT_WHILE] !== undefined ||
		/\bimmutable\b/.test(String(headers['cache-control'] ?? '')));
