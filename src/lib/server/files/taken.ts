/**
 * When a picture was taken, from its Exif block (CIPA DC-008): the fields DateTimeOriginal and
 * OffsetTimeOriginal. Whatever else stands in the block, positions above all, is not looked at.
 */

const EXIF_HEAD = Buffer.from('Exif\0\0', 'latin1');
const EXIF_POINTER = 0x8769;
const DATE_TIME_ORIGINAL = 0x9003;
const OFFSET_TIME_ORIGINAL = 0x9011;
const ASCII = 2;
const ENTRY_BYTES = 12;
const MOST_ENTRIES = 500;

const DATE_TIME = /^(\d{4}):(\d\d):(\d\d) (\d\d):(\d\d):(\d\d)$/;
const OFFSET = /^[+-]\d\d:\d\d$/;

/** A block as TIFF lays it out; every place is checked against its end before it is read. */
class Tiff {
	readonly #little: boolean;

	constructor(private readonly block: Buffer) {
		this.#little = block.toString('latin1', 0, 2) === 'II';
	}

	/** Where the first directory begins. */
	get first(): number {
		return this.u32(4);
	}

	private u16(at: number): number {
		if (at < 0 || at + 2 > this.block.length) return 0;
		return this.#little ? this.block.readUInt16LE(at) : this.block.readUInt16BE(at);
	}

	private u32(at: number): number {
		if (at < 0 || at + 4 > this.block.length) return 0;
		return this.#little ? this.block.readUInt32LE(at) : this.block.readUInt32BE(at);
	}

	/** Where the entry of a tag stands in a directory; null when it has none. */
	private entry(directory: number, tag: number): number | null {
		const entries = Math.min(this.u16(directory), MOST_ENTRIES);
		for (let n = 0; n < entries; n += 1) {
			const at = directory + 2 + n * ENTRY_BYTES;
			if (this.u16(at) === tag) return at;
		}
		return null;
	}

	pointer(directory: number, tag: number): number | null {
		const at = this.entry(directory, tag);
		return at === null ? null : this.u32(at + 8);
	}

	text(directory: number, tag: number): string | null {
		const at = this.entry(directory, tag);
		if (at === null || this.u16(at + 2) !== ASCII) return null;
		const length = this.u32(at + 4);
		const from = length > 4 ? this.u32(at + 8) : at + 8;
		if (length > 64 || from + length > this.block.length) return null;
		return this.block.toString('latin1', from, from + length).replace(/\0[^]*$/, '');
	}
}

/** As a day and a time that there are; cameras whose clock was never set say zeros. */
function isoOf(text: string): string | null {
	const [, year, month, day, hour, minute, second] = DATE_TIME.exec(text) ?? [];
	if (year === undefined) return null;
	const iso = `${year}-${month}-${day}T${hour}:${minute}:${second}`;
	const date = new Date(`${iso}Z`);
	return !Number.isNaN(date.getTime()) && date.toISOString().startsWith(iso) ? iso : null;
}

/**
 * What the camera's clock said: ISO 8601, with an offset where the camera knew one; null when it does
 * not say, or says what cannot be.
 * @param exif the block, with or without the six bytes that it begins with in a JPEG
 * @example takenAt(exif) // '2026-06-12T10:31:07+02:00'
 */
export function takenAt(exif: Buffer): string | null {
	const block = exif.subarray(0, 6).equals(EXIF_HEAD) ? exif.subarray(6) : exif;
	if (!/^(?:II|MM)/.test(block.toString('latin1', 0, 2))) return null;
	const tiff = new Tiff(block);
	const directory = tiff.pointer(tiff.first, EXIF_POINTER);
	if (directory === null) return null;
	const iso = isoOf(tiff.text(directory, DATE_TIME_ORIGINAL) ?? '');
	const offset = tiff.text(directory, OFFSET_TIME_ORIGINAL) ?? '';
	return iso === null ? null : iso + (OFFSET.test(offset) ? offset : '');
}
