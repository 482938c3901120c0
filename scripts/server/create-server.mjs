// The product's own HTTP server, around the handler that the build made.
import { randomBytes } from 'node:crypto';
import { createServer as createHttpServer } from 'node:http';
import { holdToLimit, limitOf } from './body-limits.mjs';
import { chooseEncoding } from './compression.mjs';
import { FixedReadings, mayBeFixed } from './fixed-readings.mjs';
import { GuardedResponse, splitAddress } from './guarded-response.mjs';
import { answerClientError, refuseEarly } from './refusals.mjs';
import { introduce, originsOf, visitorAddress } from './visitor.mjs';

/**
 * @typedef {import('node:http').IncomingMessage} Request
 * @typedef {(request: Request, response: import('node:http').ServerResponse, next: () => void) => unknown} Handler
 *
 * @typedef {object} Settings
 * @property {string} origin
 * @property {number} trustProxy how many proxies stand in front
 * @property {number} bodyLimit bytes; addresses that take files have a larger one
 *
 * @typedef {object} Events what becomes of each request, for the log
 * @property {((request: Request, response: GuardedResponse, started: number) => void) | null} answered
 * @property {(error: unknown, requestId: string) => void} failed
 *
 * @typedef {object} Options
 * @property {Handler} handler
 * @property {Settings} settings
 * @property {Events} [events]
 * @property {import('./client-files.mjs').ClientFiles} [files]
 * @property {FixedReadings} [readings]
 */

const MAX_HEADER_BYTES = 64 * 1024;
/** A little longer than the balancers in front keep theirs, so that it is they who close. */
const KEEP_ALIVE_MS = 65_000;
const HEADERS_TIMEOUT_MS = 20_000;
/** A photograph over a slow line takes its time. */
const REQUEST_TIMEOUT_MS = 300_000;

/** @type {import('./client-files.mjs').ClientFiles} */
const NO_FILES = { paths: new Set(), policies: new Map() };

/** @type {Events} */
const UNHEARD = {
	answered: null,
	failed: (error) => {
		throw error;
	}
};

/** Ids that are told apart within and between processes. */
function requestIds() {
	const start = randomBytes(6).toString('hex');
	let count = 0;
	return () => `${start}-${(count++).toString(36)}`;
}

const PASSED_ID = /^[\w-]{8,64}$/;

/**
 * Makes a server that does not listen yet.
 * @param {Options} options
 * @returns {{ server: import('node:http').Server, drain: () => void }} `drain`: /readyz says so from
 *   now on, and connections close after their answer
 */
export function createServer({
	handler,
	settings,
	events = UNHEARD,
	files = NO_FILES,
	readings = new FixedReadings()
}) {
	const { origin, trustProxy, bodyLimit } = settings;
	const secure = origin.startsWith('https:');
	const originOf = originsOf(origin);
	const nextId = requestIds();
	const isFile = (/** @type {string} */ path) => files.paths.has(path);
	let draining = false;

	const surroundings = {
		secure,
		pagePolicy: (/** @type {string} */ path) => files.policies.get(path),
		isDraining: () => draining
	};
	class Response extends GuardedResponse {
		/** @override */
		get surroundings() {
			return surroundings;
		}
	}

	/** @param {Request} request @param {GuardedResponse} response */
	function receive(request, response) {
		const passed = request.headers['x-request-id'];
		response.requestId =
			trustProxy > 0 && typeof passed === 'string' && PASSED_ID.test(passed) ? passed : nextId();
		if (events.answered) {
			const started = performance.now();
			response.once('close', () => events.answered?.(request, response, started));
		}
		answer(request, response)?.catch((error) => {
			if (response.headersSent) response.destroy();
			else response.writeHead(500).end();
			events.failed(error, response.requestId);
		});
	}

	/**
	 * Answers at once where no application is needed.
	 * @param {Request} request @param {GuardedResponse} response
	 * @returns {Promise<void> | undefined}
	 */
	function answer(request, response) {
		const address = request.url ?? '';
		const kept = mayBeFixed(request);
		const entry = kept ? readings.get(address) : undefined;
		if (entry) return sendKept(entry, request, response);
		if (draining && splitAddress(address)[0] === '/readyz') {
			sayDraining(response);
			return;
		}
		const limit = limitOf(splitAddress(address)[0], bodyLimit);
		if (refuseEarly(request, response, { bodyLimit: limit, isFile })) return;
		holdToLimit(request, limit);
		if (kept) response.keep = (...answered) => void readings.keep(address, ...answered);
		request.headers['x-request-id'] = response.requestId;
		introduce(request, originOf(request.headers.host), visitorAddress(request, trustProxy));
		return ask(request, response);
	}

	/** @param {Request} request @param {GuardedResponse} response */
	async function ask(request, response) {
		await handler(request, response, () => response.writeHead(404).end());
	}

	/**
	 * @param {import('./fixed-readings.mjs').Entry} entry
	 * @param {Request} request @param {GuardedResponse} response
	 * @returns {Promise<void> | undefined}
	 */
	function sendKept(entry, { headers }, response) {
		const known = isKnown(headers['if-none-match'], entry.etag);
		const encoding = chooseEncoding(headers['accept-encoding']) ?? 'identity';
		const ready = entry.forms.get(encoding);
		if (!ready)
			return readings.formOf(entry, encoding).then((form) => response.sendReady(known, form));
		response.sendReady(known, ready);
	}

	const server = createHttpServer(
		{
			ServerResponse: Response,
			maxHeaderSize: MAX_HEADER_BYTES,
			keepAliveTimeout: KEEP_ALIVE_MS,
			headersTimeout: HEADERS_TIMEOUT_MS,
			requestTimeout: REQUEST_TIMEOUT_MS
		},
		receive
	);
	server.on('clientError', (error, socket) => answerClientError(error, socket, secure));
	return { server: /** @type {any} */ (server), drain: () => void (draining = true) };
}

/** Whether the asker has what a tag names. @param {string | undefined} asked @param {string | undefined} tag */
const isKnown = (asked, tag) =>
	asked !== undefined && tag !== undefined && asked.includes(tag.replace(/^W\//, ''));

/** @param {GuardedResponse} response */
function sayDraining(response) {
	response.setHeader('content-type', 'application/json');
	response.setHeader('cache-control', 'no-store');
	response.writeHead(503).end(JSON.stringify({ status: 'draining' }));
}
