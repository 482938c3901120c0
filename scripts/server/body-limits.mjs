// How large the body of a request may be, by its address.

/**
 * Addresses that take files. A file that is too large is refused there in words, on a page; what is larger
 * still does not come so far.
 */
const UPLOADS = /^\/(?:account\/files|files\/uploads)(?:\/|$)/;
export const UPLOAD_LIMIT = 64 * 1024 * 1024;

/**
 * @param {string} path
 * @param {number} usual bytes, for all other addresses
 * @returns {number} bytes
 */
export const limitOf = (path, usual) =>
	UPLOADS.test(path) ? Math.max(usual, UPLOAD_LIMIT) : usual;

/** Said to whoever reads a body when it goes on beyond its limit. */
export class BodyTooLargeError extends Error {
	code = 'body_too_large';
	status = 413;
	/** @param {number} limit bytes */
	constructor(limit) {
		super(`The body goes on beyond ${limit} bytes.`);
		this.name = 'BodyTooLargeError';
	}
}

/**
 * Holds a body whose length was not said beforehand to its limit: whoever reads it meets an error. The adapter has one
 * limit for all addresses, the largest of them.
 * @param {import('node:http').IncomingMessage} request
 * @param {number} limit bytes
 */
export function holdToLimit(request, limit) {
	if (request.headers['transfer-encoding'] === undefined) return;
	let bytes = 0;
	let told = false;
	request.on('data', (part) => {
		bytes += part.length;
		if (told || bytes <= limit) return;
		told = true;
		request.emit('error', new BodyTooLargeError(limit));
	});
	// Listening makes it flow; it flows when somebody reads it.
	request.pause();
}
