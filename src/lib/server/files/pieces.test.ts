import fc from 'fast-check';
import { expect, it } from 'vitest';
import { inPieces } from './pieces';

async function* partsOf(parts: readonly Uint8Array[]) {
	yield* parts;
}

it('pieces are full but for the last, and make up what came', async () => {
	await fc.assert(
		fc.asyncProperty(
			fc.array(fc.uint8Array({ maxLength: 20 })),
			fc.integer({ min: 1, max: 16 }),
			async (parts, size) => {
				const pieces: Buffer[] = [];
				for await (const piece of inPieces(partsOf(parts), size)) pieces.push(piece);
				expect(Buffer.concat(pieces).equals(Buffer.concat(parts))).toBe(true);
				expect(pieces.slice(0, -1).every(({ length }) => length === size)).toBe(true);
				expect(pieces.every(({ length }) => length > 0 && length <= size)).toBe(true);
			}
		)
	);
});
