// What the server itself refuses, as problem details (RFC 9457), in the shape of the interface.

export const PROBLEM_TYPE = 'application/problem+json';

/** @type {Readonly<Record<number, [title: string, detail: string]>>} */
const KNOWN = {
	400: ['Bad Request', 'The request cannot be read.'],
	401: ['Unauthorized', 'Sign in first.'],
	403: ['Forbidden', 'This is not allowed from here.'],
	404: ['Not Found', 'Nothing stands at this address.'],
	405: ['Method Not Allowed', 'This address does not take that method.'],
	406: ['Not Acceptable', 'This address cannot answer in a format that the request accepts.'],
	408: ['Request Timeout', 'The request did not arrive in time.'],
	413: ['Content Too Large', 'The body of the request is too large.'],
	415: ['Unsupported Media Type', 'This address does not take a body of that type.'],
	417: ['Expectation Failed', 'No other expectation than 100-continue is met.'],
	429: ['Too Many Requests', 'Wait a little before the next request.'],
	431: ['Request Header Fields Too Large', 'Address and headers together exceed 64 kB.'],
	500: ['Internal Server Error', 'Something went wrong here.'],
	501: ['Not Implemented', 'The server does not know that method.'],
	503: ['Service Unavailable', 'Not ready. Try again shortly.']
};

/**
 * The body of a refusal.
 * @param {number} status
 * @param {string} [detail] in place of the usual sentence
 * @returns {string} JSON
 */
export function problemBody(status, detail) {
	const [title, usual] = KNOWN[status] ?? ['Error', 'The request was not answered.'];
	return JSON.stringify({
		type: 'about:blank',
		title,
		status,
		detail: detail ?? usual,
		errors: []
	});
}

/** @param {number} status */
export const titleOf = (status) => KNOWN[status]?.[0] ?? 'Error';
