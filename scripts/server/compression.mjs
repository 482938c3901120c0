// Compression of answers, as the request accepts it.
import { brotliCompress, constants, createBrotliCompress, createGzip, gzip } from 'node:zlib';
import { promisify } from 'node:util';

/** Below this, headers outweigh what is saved. */
export const SMALLEST = 1024;

/** @typedef {'br' | 'gzip'} Encoding */

const COMPRESSIBLE =
	/^(?:text\/(?!event-stream)|application\/(?:[\w.-]+\+)?(?:json|xml|javascript|manifest)|image\/svg)/;

/** @param {string} type media type @returns {boolean} */
export const isCompressible = (type) => COMPRESSIBLE.test(type);

/**
 * The encoding to use: brotli before gzip where both are welcome.
 * @param {string | string[] | undefined} accept the Accept-Encoding header
 * @returns {Encoding | null} null: as it is
 */
export function chooseEncoding(accept) {
	if (!accept) return null;
	/** @type {Map<string, number>} */
	const wishes = new Map();
	for (const part of String(accept).toLowerCase().split(',')) {
		const [name = '', ...parameters] = part.split(';').map((piece) => piece.trim());
		const quality = parameters.find((parameter) => parameter.startsWith('q='));
		wishes.set(name, quality ? Number(quality.slice(2)) || 0 : 1);
	}
	const wish = (/** @type {string} */ name) => wishes.get(name) ?? wishes.get('*') ?? 0;
	const [br, gz] = [wish('br'), wish('gzip')];
	if (br === 0 && gz === 0) return null;
	return br >= gz ? 'br' : 'gzip';
}

const QUALITY = { br: 4, gzip: 6 };
/** For what is compressed once and sent many times. */
const KEPT_QUALITY = { br: 6, gzip: 9 };
const WINDOW_BITS = 18;

/** @param {number} quality @param {number} [size] */
const brotliParameters = (quality, size) => ({
	[constants.BROTLI_PARAM_MODE]: constants.BROTLI_MODE_TEXT,
	[constants.BROTLI_PARAM_QUALITY]: quality,
	[constants.BROTLI_PARAM_LGWIN]: WINDOW_BITS,
	...(size !== undefined && { [constants.BROTLI_PARAM_SIZE_HINT]: size })
});

/**
 * A stream that compresses one answer.
 * @param {Encoding} encoding
 * @param {number | undefined} size bytes to come; unknown: each piece is sent on as it comes
 * @returns {import('node:stream').Transform}
 */
export function makeEncoder(encoding, size) {
	if (encoding === 'gzip')
		return createGzip({
			level: QUALITY.gzip,
			flush: size === undefined ? constants.Z_SYNC_FLUSH : constants.Z_NO_FLUSH
		});
	return createBrotliCompress({
		params: brotliParameters(QUALITY.br, size),
		flush:
			size === undefined ? constants.BROTLI_OPERATION_FLUSH : constants.BROTLI_OPERATION_PROCESS
	});
}

const brotliWhole = promisify(brotliCompress);
const gzipWhole = promisify(gzip);

/**
 * Compresses a whole body, off the main thread.
 * @param {Buffer} body @param {Encoding} encoding @returns {Promise<Buffer>}
 */
export const compressWhole = (body, encoding) =>
	encoding === 'br'
		? brotliWhole(body, { params: brotliParameters(KEPT_QUALITY.br, body.length) })
		: gzipWhole(body, { level: KEPT_QUALITY.gzip });

/**
 * An entity tag that may stand on a compressed form of what it names.
 * @param {string} tag
 */
export const weakTag = (tag) => (tag.startsWith('W/') ? tag : `W/${tag}`);
