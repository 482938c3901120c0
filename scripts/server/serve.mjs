// Serves the build: load, listen, log, and close in order.
import { once } from 'node:events';
import { createServer as createProbe } from 'node:net';
import { setTimeout as pause } from 'node:timers/promises';
import { loadApplication } from './application.mjs';
import { readClientFiles } from './client-files.mjs';
import { createServer } from './create-server.mjs';
import { FixedReadings } from './fixed-readings.mjs';
import { localOrigin } from './origin.mjs';
import { visitorAddress } from './visitor.mjs';

/** Said when the address cannot be listened on. */
export class ListenError extends Error {
	/** @param {string} host @param {number} port @param {string | undefined} code */
	constructor(host, port, code) {
		const reason =
			code === 'EADDRINUSE'
				? `Port ${port} is taken on ${host}. Stop what uses it, or choose another: PORT=${port + 1} npm start`
				: code === 'EACCES'
					? `Port ${port} may not be used by this account. Choose one above 1023: PORT=3000 npm start`
					: `${host}:${port} cannot be listened on (${code}).`;
		super(reason);
		this.name = 'ListenError';
	}
}

/**
 * Finds out whether an address can be listened on.
 * @param {string} host @param {number} port 0: any free one
 * @returns {Promise<number>} the port
 * @throws {ListenError}
 */
export async function checkPort(host, port) {
	const probe = createProbe();
	probe.listen(port, host);
	try {
		await once(probe, 'listening');
	} catch (error) {
		throw new ListenError(host, port, /** @type {NodeJS.ErrnoException} */ (error).code);
	}
	const address = probe.address();
	await new Promise((done) => probe.close(done));
	return address && typeof address === 'object' ? address.port : port;
}

/**
 * @typedef {object} Running
 * @property {string} origin where to open
 * @property {number} port
 * @property {(reason?: string) => Promise<void>} close stops accepting, lets requests under way end
 *   within bounds, closes what the application holds; a second call waits for the first
 */

/**
 * Serves a build as the environment says.
 * @param {{ build: string }} options
 * @returns {Promise<Running>}
 */
export async function serve({ build }) {
	// Links rest on the port, so a free one is chosen before the application reads its configuration.
	if (process.env.PORT === '0') {
		const host = process.env.HOST || '127.0.0.1';
		process.env.PORT = String(await checkPort(host, 0));
		// Nobody can have named an origin on a port that was not known.
		process.env.ORIGIN ||= localOrigin(host, process.env.PORT);
	}
	// The sign-in library would take the name it is called by from the request.
	if (process.env.ORIGIN) process.env.AUTH_URL ||= process.env.ORIGIN;
	const application = await loadApplication(build);
	const { config, log, handler, maskAddress, present } = application;
	const { server, drain } = createServer({
		handler,
		settings: config,
		files: readClientFiles(build),
		readings: new FixedReadings({ present }),
		events: {
			answered: log.isLevelEnabled('info')
				? (request, response, started) =>
						log.info({
							request_id: response.requestId,
							method: request.method,
							url: maskAddress(request.url ?? ''),
							status: response.statusCode,
							ms: Math.round((performance.now() - started) * 10) / 10,
							address: visitorAddress(request, config.trustProxy),
							...(!response.writableFinished && { aborted: true })
						})
				: null,
			failed: (error, requestId) => log.error({ err: error, request_id: requestId }, 'not answered')
		}
	});
	server.listen(config.port, config.host);
	try {
		await once(server, 'listening');
	} catch (error) {
		await application.stop();
		throw new ListenError(
			config.host,
			config.port,
			/** @type {NodeJS.ErrnoException} */ (error).code
		);
	}
	// One request's forgotten promise is no reason to leave all others without an answer.
	process.on('unhandledRejection', (error) => log.error({ err: error }, 'unhandled rejection'));
	log.info({ origin: config.origin, port: config.port }, 'listening');

	/** @param {string} reason */
	async function shut(reason) {
		log.info({ reason }, 'draining');
		drain();
		await pause(config.drainSeconds * 1000);
		const closed = new Promise((done) => server.close(done));
		server.closeIdleConnections();
		const bound = setTimeout(() => {
			log.warn('requests still under way are cut off');
			server.closeAllConnections();
		}, config.shutdownSeconds * 1000);
		await closed;
		clearTimeout(bound);
		process.emit(/** @type {any} */ ('sveltekit:shutdown'), /** @type {any} */ (reason));
		await application.stop();
		log.info('stopped');
		await new Promise((done) => log.flush(done));
	}
	/** @type {Promise<void> | undefined} */
	let closing;
	return {
		origin: config.origin,
		port: config.port,
		close: (reason = 'asked') => (closing ??= shut(reason))
	};
}
