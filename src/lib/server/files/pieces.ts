/** Largest piece that is held in memory at a time. */
export const PIECE_BYTES = 4 * 1024 * 1024;

/** What comes, in pieces of `PIECE_BYTES`; the last may be shorter. Reads no further than the piece that is asked for. */
export async function* inPieces(
	body: AsyncIterable<Uint8Array>,
	size = PIECE_BYTES
): AsyncGenerator<Buffer> {
	let parts: Uint8Array[] = [];
	let length = 0;
	for await (const part of body) {
		let rest = part;
		while (length + rest.length >= size) {
			const room = size - length;
			yield Buffer.concat([...parts, rest.subarray(0, room)]);
			rest = rest.subarray(room);
			[parts, length] = [[], 0];
		}
		if (rest.length === 0) continue;
		parts.push(rest);
		length += rest.length;
	}
	if (length > 0) yield Buffer.concat(parts);
}
