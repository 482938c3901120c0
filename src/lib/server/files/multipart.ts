import { BrokenFormError } from './errors';

/** A file that is sent with a form, as it comes. */
export interface SentFile {
	readonly name: string;
	readonly body: AsyncIterable<Uint8Array>;
}

const BOUNDARY = /^multipart\/form-data\s*;(?:.*;)?\s*boundary=(?:"([^"]{1,70})"|([^\s;"]{1,70}))/i;
const HEAD_BYTES = 8_192;
const HEAD_END = Buffer.from('\r\n\r\n');

/** Browsers write these signs so in a name; all others stand as they are. */
const unescaped = (name: string): string =>
	name.replace(/%22|%0D|%0A/gi, (sign) => (sign === '%22' ? '"' : ' '));

/** What comes, read up to marks in it. Never holds more than one part that came and one mark. */
class Marked {
	#held: Buffer;
	readonly #parts: AsyncIterator<Uint8Array>;

	constructor(parts: AsyncIterable<Uint8Array>, before: Buffer) {
		this.#parts = parts[Symbol.asyncIterator]();
		this.#held = before;
	}

	async #more(): Promise<void> {
		const { done, value } = await this.#parts.next();
		if (done) throw new BrokenFormError('breaks_off');
		this.#held = Buffer.concat([this.#held, value]);
	}

	/** All up to a mark, which is taken too. @throws {BrokenFormError} it does not come, or too late */
	async whole(mark: Buffer, most: number): Promise<Buffer> {
		for (;;) {
			const at = this.#held.indexOf(mark);
			if (at >= 0) {
				const found = this.#held.subarray(0, at);
				this.#held = this.#held.subarray(at + mark.length);
				return found;
			}
			if (this.#held.length > most) throw new BrokenFormError('breaks_off');
			await this.#more();
		}
	}

	/** All up to a mark, as it comes; the mark is taken too. @throws {BrokenFormError} it does not come */
	async *upTo(mark: Buffer): AsyncGenerator<Buffer> {
		for (;;) {
			const at = this.#held.indexOf(mark);
			if (at >= 0) {
				const last = this.#held.subarray(0, at);
				this.#held = this.#held.subarray(at + mark.length);
				if (last.length > 0) yield last;
				return;
			}
			// The mark may have begun.
			const sure = Math.max(0, this.#held.length - mark.length + 1);
			if (sure > 0) {
				yield this.#held.subarray(0, sure);
				this.#held = this.#held.subarray(sure);
			}
			await this.#more();
		}
	}
}

/**
 * The first file that a form brings, as it comes (RFC 7578). Fields before it are passed by; what comes after it is
 * not looked at. The framework's own way would hold all of it in memory.
 * @param contentType of the request
 * @throws {BrokenFormError} there is none, or it breaks off
 */
export async function firstFileOf(
	contentType: string | null,
	body: AsyncIterable<Uint8Array> | null
): Promise<SentFile> {
	const [, quoted, plain] = BOUNDARY.exec(contentType ?? '') ?? [];
	const boundary = quoted ?? plain;
	if (boundary === undefined || body === null) throw new BrokenFormError('no_file');
	const mark = Buffer.from(`\r\n--${boundary}`, 'latin1');
	const form = new Marked(body, Buffer.from('\r\n'));
	await form.whole(mark, HEAD_BYTES);
	for (;;) {
		// Two dashes behind the mark end the form.
		const line = await form.whole(Buffer.from('\n'), HEAD_BYTES);
		if (line.toString('latin1').startsWith('--')) throw new BrokenFormError('no_file');
		const head = (await form.whole(HEAD_END, HEAD_BYTES)).toString('utf8');
		const [, name] = /^content-disposition:.*?;\s*filename="([^"\r\n]*)"/im.exec(head) ?? [];
		if (name !== undefined && name !== '') return { name: unescaped(name), body: form.upTo(mark) };
		for await (const _part of form.upTo(mark));
	}
}
