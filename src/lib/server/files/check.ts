import { createHash } from 'node:crypto';
import { createWriteStream } from 'node:fs';
import { mkdtemp, open, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pipeline } from 'node:stream/promises';
import { z } from 'zod';
import type { FileRefusal } from '../../types';
import { inTransaction } from '../db';
import { files } from '../db/repositories';
import type { Ground } from '../ground';
import { giveNotice } from '../inbox';
import { NotNowError, type JobKind, type JobRun } from '../jobs';
import { contentOf, HEAD_BYTES } from './content';
import { FileRefusedError } from './errors';
import { CHECK } from './kinds';
import { checkPaper } from './paper';
import { pictureOf } from './picture';
import { queueRemoval } from './removal';
import { StorageAwayError, type Store } from './store';

const payload = z.object({ file: z.string() });
type Payload = z.output<typeof payload>;
type FileRecord = NonNullable<Awaited<ReturnType<typeof files.fileById>>>;

const STEPS = 4;

/**
 * Looks at a file that is whole, and keeps or refuses it. Begins anew after a break: until the end nothing has
 * changed but objects that are written over.
 */
export const checkFileKind = (store: Store): JobKind<Payload> => ({
	kind: CHECK,
	payload,
	async run(run) {
		const file = await files.fileById(run.database, run.payload.file);
		// Deleted meanwhile, or a worker before was killed after the end of its work.
		if (file === null || file.state !== 'checking') return;
		const folder = await mkdtemp(join(tmpdir(), 'tallyplate-file-'));
		try {
			await check(store, run, file, join(folder, 'sent'));
		} catch (error) {
			if (error instanceof StorageAwayError) throw new NotNowError(error.message, { cause: error });
			if (!(error instanceof FileRefusedError)) throw error;
			await refuse(run, file, error.refusal);
		} finally {
			await rm(folder, { recursive: true, force: true });
		}
	},
	async broken(how, run) {
		const file = await files.fileById(run.database, run.payload.file);
		if (file !== null) await refuse(run, file, how === 'stopped' ? 'stopped' : 'unchecked');
	}
});

/** What was sent goes in any case: a picture may say where it was taken. */
async function settle(
	{ database, clock }: Ground,
	{ id, owner, name }: FileRecord,
	changes: Parameters<typeof files.changeFile>[3]
): Promise<void> {
	await inTransaction(database, async (transaction) => {
		if (!(await files.changeFile(database, id, 'checking', changes, transaction))) return;
		const causing = { database, clock, transaction };
		await queueRemoval(causing);
		// Whoever has stopped the check knows of it.
		const { refusal } = changes;
		if (owner === null || !refusal || refusal === 'stopped') return;
		await giveNotice(causing, {
			user_id: owner,
			template: 'file_refused',
			data: { name, refusal }
		});
	});
}

const refuse = (ground: Ground, file: FileRecord, refusal: FileRefusal): Promise<void> =>
	settle(ground, file, { state: 'refused', refusal });

async function check(
	store: Store,
	run: JobRun<Payload>,
	file: FileRecord,
	path: string
): Promise<void> {
	const { report, signal } = run;
	const sha256 = await collect(store, run, file, path);
	await report({ done: 1, of: STEPS });
	const content = await contentOf(await headOf(path));
	if ('refusal' in content) throw new FileRefusedError(content.refusal);
	const kept =
		content.type === 'application/pdf'
			? await keepPaper(store, file, path)
			: await keepPicture(store, run, file, path);
	signal.throwIfAborted();
	await settle(run, file, { ...kept, sha256, state: 'ready' });
	await report({ done: STEPS, of: STEPS });
}

/** Puts the pieces together on disk. Answers the SHA-256 of the whole. */
async function collect(
	store: Store,
	{ database, signal }: JobRun<Payload>,
	{ id }: FileRecord,
	path: string
): Promise<string> {
	const hash = createHash('sha256');
	for (const { object_key } of await files.piecesOf(database, id)) {
		const { body } = await store.get(object_key);
		await pipeline(
			body,
			async function* (part: AsyncIterable<Buffer>) {
				for await (const bytes of part) {
					hash.update(bytes);
					yield bytes;
				}
			},
			createWriteStream(path, { flags: 'a', mode: 0o600 }),
			{ signal }
		);
	}
	return hash.digest('hex');
}

async function headOf(path: string): Promise<Buffer> {
	const file = await open(path);
	try {
		const { buffer, bytesRead } = await file.read(Buffer.alloc(HEAD_BYTES), 0, HEAD_BYTES, 0);
		return buffer.subarray(0, bytesRead);
	} finally {
		await file.close();
	}
}

type Kept = Pick<FileRecord, 'media_type' | 'kept_bytes' | 'width' | 'height' | 'taken_at'>;

async function keepPaper(store: Store, file: FileRecord, path: string): Promise<Kept> {
	await checkPaper(path);
	const handle = await open(path);
	try {
		// 25 MB at most, and two files at a time.
		const whole = await handle.readFile();
		await store.put(`${file.storage_key}/whole`, whole, 'application/pdf');
		return {
			media_type: 'application/pdf',
			kept_bytes: whole.length,
			width: null,
			height: null,
			taken_at: null
		};
	} finally {
		await handle.close();
	}
}

async function keepPicture(
	store: Store,
	{ report }: JobRun<Payload>,
	file: FileRecord,
	path: string
): Promise<Kept> {
	const picture = await pictureOf(path);
	await report({ done: 2, of: STEPS });
	const key = file.storage_key;
	await store.put(`${key}/whole`, picture.whole, picture.type);
	await store.put(`${key}/view`, picture.view, 'image/jpeg');
	await store.put(`${key}/thumb`, picture.thumb, 'image/jpeg');
	await report({ done: 3, of: STEPS });
	return {
		media_type: picture.type,
		kept_bytes: picture.whole.length,
		width: picture.width,
		height: picture.height,
		taken_at: picture.takenAt
	};
}
