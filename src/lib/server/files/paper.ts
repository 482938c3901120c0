import { open } from 'node:fs/promises';
import { FileRefusedError } from './errors';

/** Readers look for the end mark in the last so many bytes. */
const TAIL_BYTES = 2_048;

/**
 * Looks whether a PDF begins and ends as one. It is kept as it came: what stands in it runs nowhere, as it is only
 * ever handed out to be saved.
 * @throws {FileRefusedError} it breaks off
 */
export async function checkPaper(path: string): Promise<void> {
	const file = await open(path);
	try {
		const { size } = await file.stat();
		const length = Math.min(size, TAIL_BYTES);
		const { buffer } = await file.read(Buffer.alloc(length), 0, length, size - length);
		if (!buffer.includes('%%EOF')) throw new FileRefusedError('broken');
	} finally {
		await file.close();
	}
}
