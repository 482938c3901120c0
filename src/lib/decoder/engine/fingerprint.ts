/** A 106-bit fingerprint of text: tells whether a table changed between two editions. Not for security. */
function hash53(text: string, seed: number): number {
	let a = 0xdeadbeef ^ seed;
	let b = 0x41c6ce57 ^ seed;
	for (let index = 0; index < text.length; index += 1) {
		const unit = text.charCodeAt(index);
		a = Math.imul(a ^ unit, 2654435761);
		b = Math.imul(b ^ unit, 1597334677);
	}
	a = Math.imul(a ^ (a >>> 16), 2246822507) ^ Math.imul(b ^ (b >>> 13), 3266489909);
	b = Math.imul(b ^ (b >>> 16), 2246822507) ^ Math.imul(a ^ (a >>> 13), 3266489909);
	return 4294967296 * (2097151 & b) + (a >>> 0);
}

export const fingerprint = (text: string): string =>
	`${hash53(text, 0).toString(36)}-${hash53(text, 1).toString(36)}`;
