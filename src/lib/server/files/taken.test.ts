import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { takenAt } from './taken';

type Order = 'II' | 'MM';

/** An Exif block with two fields, laid out as cameras do. */
function exif(order: Order, taken: string, offset?: string): Buffer {
	const block = Buffer.alloc(200);
	const u16 = (value: number, at: number) =>
		order === 'II' ? block.writeUInt16LE(value, at) : block.writeUInt16BE(value, at);
	const u32 = (value: number, at: number) =>
		order === 'II' ? block.writeUInt32LE(value, at) : block.writeUInt32BE(value, at);
	const entry = (at: number, tag: number, kind: number, count: number, value: number) => {
		u16(tag, at);
		u16(kind, at + 2);
		u32(count, at + 4);
		u32(value, at + 8);
	};
	block.write(order, 0);
	u16(42, 2);
	u32(8, 4);
	u16(1, 8);
	entry(10, 0x8769, 4, 1, 30);
	u16(offset === undefined ? 1 : 2, 30);
	entry(32, 0x9003, 2, taken.length + 1, 100);
	block.write(`${taken}\0`, 100);
	if (offset !== undefined) {
		entry(44, 0x9011, 2, offset.length + 1, 140);
		block.write(`${offset}\0`, 140);
	}
	return block;
}

describe('when a picture was taken', () => {
	it.each(['II', 'MM'] as const)(
		'is what the camera’s clock said, in either byte order: %s',
		(order) => {
			expect(takenAt(exif(order, '2026:06:12 10:31:07'))).toBe('2026-06-12T10:31:07');
			expect(takenAt(exif(order, '2026:06:12 10:31:07', '+02:00'))).toBe(
				'2026-06-12T10:31:07+02:00'
			);
		}
	);

	it('is found behind the mark that the block has in a JPEG', () => {
		const block = Buffer.concat([Buffer.from('Exif\0\0'), exif('MM', '2026:06:12 10:31:07')]);
		expect(takenAt(block)).toBe('2026-06-12T10:31:07');
	});

	it.each([
		'0000:00:00 00:00:00',
		'2026:02:30 10:00:00',
		'2026-06-12T10:31:07',
		'',
		'    :  :     :  :  '
	])('is not made up from %j', (taken) => {
		expect(takenAt(exif('II', taken))).toBeNull();
	});

	it('leaves out an offset that is none', () => {
		expect(takenAt(exif('II', '2026:06:12 10:31:07', 'local'))).toBe('2026-06-12T10:31:07');
	});

	it('is null for anything else, and never an error', () => {
		fc.assert(
			fc.property(fc.uint8Array({ maxLength: 300 }), (bytes) => {
				expect(takenAt(Buffer.from(bytes))).toBeNull();
			})
		);
		const whole = exif('II', '2026:06:12 10:31:07', '+02:00');
		fc.assert(
			fc.property(fc.nat({ max: 199 }), fc.integer({ min: 0, max: 255 }), (at, value) => {
				const bent = Buffer.from(whole);
				bent[at] = value;
				const taken = takenAt(bent.subarray(0, 150));
				expect(taken === null || /^\d{4}-\d\d-\d\dT/.test(taken)).toBe(true);
			})
		);
	});
});
