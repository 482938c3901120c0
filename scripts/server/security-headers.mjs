// The headers that stand on every answer: pages, files, interface and refusals alike.

/** For what is no page: nothing in it may load or run anything. */
const DATA_POLICY =
	"default-src 'none'; base-uri 'none'; form-action 'none'; frame-ancestors 'none'";

/** For a page that brings no policy of its own. */
const PAGE_POLICY = [
	"default-src 'self'",
	"script-src 'self'",
	"style-src 'self'",
	"img-src 'self' data:",
	"font-src 'self'",
	"connect-src 'self'",
	"object-src 'none'",
	"base-uri 'self'",
	"form-action 'self'",
	"frame-ancestors 'none'"
].join('; ');

/** What a page could ask the visitor for and ours never do. */
const UNUSED_FEATURES = [
	'camera',
	'display-capture',
	'geolocation',
	'microphone',
	'midi',
	'payment',
	'serial',
	'usb'
]
	.map((feature) => `${feature}=()`)
	.join(', ');

const TWO_YEARS_S = 63_072_000;

/**
 * What the headers depend on.
 * @typedef {object} Subject
 * @property {boolean} isApi the address lies under /api/
 * @property {boolean} namesStamp the address carries what somebody typed off a car
 * @property {boolean} secure visitors come by https
 * @property {string} type media type of the answer, or empty
 * @property {string | undefined} pagePolicy policy known for this very page
 */

/**
 * @param {Subject} subject
 * @returns {[name: string, value: string][]} names in lower case
 */
export function securityHeaders({ isApi, namesStamp, secure, type, pagePolicy }) {
	/** @type {[string, string][]} */
	const headers = [
		[
			'content-security-policy',
			type.startsWith('text/html') ? (pagePolicy ?? PAGE_POLICY) : DATA_POLICY
		],
		['x-content-type-options', 'nosniff'],
		['x-frame-options', 'DENY'],
		// A serial number in the address is nobody else's business.
		['referrer-policy', namesStamp ? 'no-referrer' : 'same-origin'],
		['permissions-policy', UNUSED_FEATURES],
		['cross-origin-opener-policy', 'same-origin'],
		['cross-origin-resource-policy', isApi ? 'cross-origin' : 'same-origin']
	];
	if (isApi || namesStamp) headers.push(['x-robots-tag', 'noindex']);
	if (secure) headers.push(['strict-transport-security', `max-age=${TWO_YEARS_S}`]);
	return headers;
}

/**
 * Whether an address carries a stamp, however its parameter's name is written.
 * @param {string} query what follows the question mark
 */
export function namesStamp(query) {
	return /text|%/i.test(query) && new URLSearchParams(query).has('text');
}
