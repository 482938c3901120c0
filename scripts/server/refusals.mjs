// What is refused before the application sees it.
import { STATUS_CODES } from 'node:http';
import { isApiPath, splitAddress } from './guarded-response.mjs';
import { PROBLEM_TYPE, problemBody } from './problems.mjs';
import { securityHeaders } from './security-headers.mjs';

const METHODS = ['GET', 'HEAD', 'POST', 'PUT', 'PATCH', 'DELETE', 'OPTIONS'];

const FORM = /^(?:text\/plain|multipart\/form-data|application\/x-www-form-urlencoded)\b/i;

/** @type {Readonly<Record<string, number>>} */
const STATUS_OF_CODE = {
	HPE_HEADER_OVERFLOW: 431,
	HPE_CHUNK_EXTENSIONS_OVERFLOW: 413,
	ERR_HTTP_REQUEST_TIMEOUT: 408
};

/**
 * Answers a connection on which no request could be made out.
 * @param {NodeJS.ErrnoException} error
 * @param {import('node:stream').Duplex} socket
 * @param {boolean} secure visitors come by https
 */
export function answerClientError(error, socket, secure) {
	// Something else is already on its way, or nobody listens any more.
	const busy = /** @type {any} */ (socket)._httpMessage?.headersSent;
	if (error.code === 'ECONNRESET' || !socket.writable || busy) {
		socket.destroy();
		return;
	}
	const status = STATUS_OF_CODE[error.code ?? ''] ?? 400;
	const body = problemBody(status);
	const headers = [
		['content-type', PROBLEM_TYPE],
		['content-length', String(Buffer.byteLength(body))],
		['cache-control', 'no-store'],
		['connection', 'close'],
		...securityHeaders({
			isApi: false,
			namesStamp: false,
			secure,
			type: PROBLEM_TYPE,
			pagePolicy: undefined
		})
	];
	const head = headers.map(([name, value]) => `${name}: ${value}\r\n`).join('');
	socket.end(`HTTP/1.1 ${status} ${STATUS_CODES[status]}\r\n${head}\r\n${body}`);
}

/**
 * Answers a request that need not reach the application.
 * @param {import('node:http').IncomingMessage} request
 * @param {import('node:http').ServerResponse} response
 * @param {{ bodyLimit: number, isFile: (path: string) => boolean }} given
 * @returns {boolean} whether it was answered
 */
export function refuseEarly(request, response, { bodyLimit, isFile }) {
	const { method = '', url, headers } = request;
	const [path] = splitAddress(url);
	if (!path.startsWith('/')) return refuse(response, 400);
	const taken = isFile(path) ? ['GET', 'HEAD'] : METHODS;
	if (!taken.includes(method)) return refuse(response, 405, { allow: taken.join(', ') });
	// The framework would take it for a form from another site, and say 403.
	if (isApiPath(path) && FORM.test(headers['content-type'] ?? '')) return refuse(response, 415);
	if (Number(headers['content-length']) > bodyLimit) {
		request.resume();
		return refuse(response, 413, { connection: 'close' });
	}
	return false;
}

/**
 * @param {import('node:http').ServerResponse} response
 * @param {number} status @param {Record<string, string>} [headers]
 */
function refuse(response, status, headers = {}) {
	response.writeHead(status, headers).end();
	return true;
}
