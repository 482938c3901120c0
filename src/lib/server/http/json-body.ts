import { interfaceText } from '../../text/en/interface';
import { fault, malformed, Refusal } from './refusal';

/** Largest JSON body: many times the longest stamp with every context beside it. */
export const MOST_BYTES = 65_536;

/** The connection closes with it: the rest of the body is not worth reading. */
const tooLarge = () =>
	new Refusal(413, [fault('body', 'too_large', interfaceText.tooLarge(MOST_BYTES))], {
		connection: 'close'
	});
const mediaType = () =>
	new Refusal(415, [
		fault('Content-Type', 'media_type', interfaceText.mediaType, ['application/json'])
	]);

/** Whether an error says that a body went over the server's own limit. */
const saysTooLarge = (error: unknown): boolean =>
	error instanceof Error && 'status' in error && error.status === 413;

/** Cancelling the stream would destroy the connection before the refusal is sent, so it is left as it stands. */
async function readBytes(body: ReadableStream<Uint8Array>): Promise<Uint8Array> {
	const chunks: Uint8Array[] = [];
	const reader = body.getReader();
	let size = 0;
	for (;;) {
		const { done, value } = await reader.read();
		if (done) return Buffer.concat(chunks);
		size += value.byteLength;
		if (size > MOST_BYTES) throw tooLarge();
		chunks.push(value);
	}
}

function parse(bytes: Uint8Array): unknown {
	try {
		return JSON.parse(new TextDecoder('utf-8', { fatal: true }).decode(bytes));
	} catch (error) {
		if (error instanceof SyntaxError || error instanceof TypeError)
			throw malformed(fault('body', 'not_json', interfaceText.malformed.json));
		throw error;
	}
}

/**
 * The JSON object of a request's body.
 * @throws {Refusal} 415 for another media type, charset or coding; 413 above 64 kB; 400 for no JSON object
 */
export async function readJsonObject(request: Request): Promise<Readonly<Record<string, unknown>>> {
	const [type = '', ...parameters] = (request.headers.get('content-type') ?? '')
		.toLowerCase()
		.split(';')
		.map((part) => part.trim());
	const charset = parameters.find((part) => part.startsWith('charset='))?.slice(8) ?? 'utf-8';
	const coding = request.headers.get('content-encoding') ?? 'identity';
	if (type !== 'application/json' || !/^"?utf-?8"?$/.test(charset)) throw mediaType();
	if (coding.toLowerCase() !== 'identity') throw mediaType();
	if (Number(request.headers.get('content-length') ?? 0) > MOST_BYTES) throw tooLarge();
	let bytes: Uint8Array = new Uint8Array();
	try {
		if (request.body) bytes = await readBytes(request.body);
	} catch (error) {
		throw saysTooLarge(error) ? tooLarge() : error;
	}
	const value = parse(bytes);
	if (typeof value !== 'object' || value === null || Array.isArray(value))
		throw malformed(fault('body', 'not_an_object', interfaceText.malformed.notAnObject));
	return value as Readonly<Record<string, unknown>>;
}
