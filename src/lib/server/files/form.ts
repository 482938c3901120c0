import { requireWriter, type Actor } from '../actor';
import { endFile, expectFile, takePart } from './arrivals';
import { BrokenFormError, UnknownFileError } from './errors';
import type { FileGround } from './ground';
import { deleteFile, settledFileFor, type OwnFile } from './mine';
import { firstFileOf } from './multipart';

/** How long a form waits for the check of its file; most take a second. */
const PATIENCE_MS = 15_000;

/** Reads on to the end of what is sent: a browser looks at no answer before it has sent all. */
async function drain(parts: AsyncIterator<Uint8Array>): Promise<void> {
	while (!(await parts.next()).done);
}

/**
 * Takes the file of a form that was sent without script, and waits a while for its check.
 * @throws {BrokenFormError} no file, or it breaks off; then nothing of it is kept
 * @throws {FileRefusedError} by its first bytes, or by its size @throws {SignInNeededError} @throws {PausedError}
 * @throws {StorageAwayError} @throws {DatabaseAwayError}
 */
export async function takeFileOfForm(
	ground: FileGround,
	actor: Actor,
	{ headers, body }: Request
): Promise<OwnFile> {
	requireWriter(actor);
	// One that is read in two places: what is refused half-way is read to its end.
	const parts = (body as AsyncIterable<Uint8Array> | null)?.[Symbol.asyncIterator]();
	const readable = parts && { [Symbol.asyncIterator]: () => ({ next: () => parts.next() }) };
	try {
		const sent = await firstFileOf(headers.get('content-type'), readable ?? null);
		const id = await expectFile(ground, actor, { name: sent.name, bytes: null });
		await takeWhole(ground, actor, id, sent.body);
		return await settledFileFor(ground, actor, id, PATIENCE_MS);
	} finally {
		if (parts) await drain(parts);
	}
}

async function takeWhole(
	ground: FileGround,
	actor: Actor,
	id: string,
	body: AsyncIterable<Uint8Array>
): Promise<void> {
	requireWriter(actor);
	try {
		await takePart(ground, actor, id, 0, body);
		await endFile(ground, actor, id);
	} catch (error) {
		await deleteFile(ground, actor, id).catch((again: unknown) => {
			// What was refused is gone already.
			if (!(again instanceof UnknownFileError)) throw again;
		});
		// The form was there; what failed on its way is the line.
		if ((error as { code?: string }).code === 'ECONNRESET') throw new BrokenFormError('breaks_off');
		throw error;
	}
}
