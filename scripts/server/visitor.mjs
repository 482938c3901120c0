// Who asks, and by which name they call this server: as the application is told.

/**
 * The application's adapter reads these; what comes from outside under these names is overwritten.
 */
export const VISITOR_HEADERS = {
	address: 'x-visitor-address',
	protocol: 'x-visitor-protocol',
	host: 'x-visitor-host'
};

/**
 * The visitor's address. Each trusted proxy adds one entry at the end of X-Forwarded-For, so the
 * visitor stands so many from the end; entries further left are the visitor's own words.
 * @param {import('node:http').IncomingMessage} request
 * @param {number} proxies how many stand in front
 * @returns {string}
 */
export function visitorAddress(request, proxies) {
	const peer = request.socket.remoteAddress ?? 'unknown';
	const forwarded = request.headers['x-forwarded-for'];
	if (proxies === 0 || !forwarded) return peer;
	const entries = String(forwarded)
		.split(',')
		.map((entry) => entry.trim())
		.filter(Boolean);
	return entries[Math.max(0, entries.length - proxies)] ?? peer;
}

const LOOPBACK = ['127.0.0.1', 'localhost', '[::1]'];

/**
 * By which origin requests are answered: the configured one whatever the Host header says, save
 * that on loopback the other names of this machine are as good.
 * @param {string} origin
 * @returns {(host: string | undefined) => URL} from the Host header
 */
export function originsOf(origin) {
	const own = new URL(origin);
	const names = LOOPBACK.includes(own.hostname) ? LOOPBACK : [];
	const aliases = new Map(
		names.map((name) => {
			const alias = new URL(origin);
			alias.hostname = name;
			return [alias.host, alias];
		})
	);
	return (host) => aliases.get(host ?? '') ?? own;
}

/**
 * Tells the application who asks and how.
 * @param {import('node:http').IncomingMessage} request
 * @param {URL} origin @param {string} address
 */
export function introduce({ headers }, origin, address) {
	headers[VISITOR_HEADERS.address] = address;
	headers[VISITOR_HEADERS.protocol] = origin.protocol.slice(0, -1);
	headers[VISITOR_HEADERS.host] = origin.host;
	// A form on a page that sends no referrer has the origin "null". The browser's own word that the
	// request stays within the site is taken in its place; no script can set that header.
	if (headers.origin === 'null' && headers['sec-fetch-site'] === 'same-origin')
		headers.origin = origin.origin;
}
