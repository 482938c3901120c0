// The built application, as the server takes it in.
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { UPLOAD_LIMIT } from './body-limits.mjs';
import { VISITOR_HEADERS } from './visitor.mjs';

/**
 * What the application hands over once it is loaded (src/lib/server/handover.ts).
 * @typedef {import('../../src/lib/server/handover').Handover} Handover
 * @typedef {import('./create-server.mjs').Handler} Handler
 */

/** Known on both sides of the bundle's border. */
const HANDOVER = Symbol.for('tallyplate.handover');

/**
 * Loads the build. Its configuration is read from the environment and checked on the way.
 * @param {string} build
 * @returns {Promise<Handover & { handler: Handler }>}
 */
export async function loadApplication(build) {
	const entry = join(build, 'handler.js');
	if (!existsSync(entry)) throw new Error(`There is no build in ${build}. Run: npm run build`);
	// The adapter takes these from where the server leaves them. It is not told ORIGIN: which name this
	// server is called by is decided for each request, as on loopback there are several.
	process.env.ADAPTER_ADDRESS_HEADER = VISITOR_HEADERS.address;
	process.env.ADAPTER_PROTOCOL_HEADER = VISITOR_HEADERS.protocol;
	process.env.ADAPTER_HOST_HEADER = VISITOR_HEADERS.host;
	// The server holds each address to a limit of its own.
	process.env.ADAPTER_BODY_SIZE_LIMIT = String(UPLOAD_LIMIT);
	// The versions of packages are pinned until a newer Node is what we run on.
	process.env.AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED = 'true';
	const { handler } = await import(pathToFileURL(entry).href);
	/** @type {Handover | undefined} */
	const handover = /** @type {any} */ (globalThis)[HANDOVER];
	if (!handover) throw new Error('The build does not hand over its configuration.');
	return { ...handover, handler };
}
