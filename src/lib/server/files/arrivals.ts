import { randomBytes } from 'node:crypto';
import { FILE_BYTES } from '../../types';
import { requireWriter, type Actor, type Person } from '../actor';
import { asking, inTransaction, type Transaction } from '../db';
import { files } from '../db/repositories';
import { queueJob } from '../jobs';
import { contentOf, HEAD_BYTES } from './content';
import { FileRefusedError, UnknownFileError, WrongPlaceError } from './errors';
import type { FileGround } from './ground';
import { CHECK } from './kinds';
import { deleteFile } from './mine';
import { fileName } from './name';
import { inPieces } from './pieces';

/** What one person may have: files, files on their way, and bytes. */
const MOST = { files: 1_000, arriving: 20, bytes: 2 * 1024 ** 3 };

type FileRecord = NonNullable<Awaited<ReturnType<typeof files.fileById>>>;

/** A file on its way: how much of it has come, of how much. */
export interface Arrival {
	readonly id: string;
	readonly name: string;
	readonly received: number;
	/** Null while it is not known. */
	readonly bytes: number | null;
	readonly begunAt: Date;
}

const arrivalOf = ({ id, name, received, bytes, created_at }: FileRecord): Arrival => ({
	id,
	name,
	received,
	bytes,
	begunAt: created_at
});

/** The file of who asks, while it is on its way or being checked. */
async function ownArrival({ database }: FileGround, actor: Person, id: string) {
	const file = await files.fileById(database, id);
	if (file === null || file.owner !== actor.id || file.state === 'ready')
		throw new UnknownFileError();
	return file;
}

/**
 * Makes room for a file that is about to come.
 * @param bytes null where it is not known how much will come
 * @throws {SignInNeededError} @throws {PausedError} @throws {FileRefusedError} empty, too large, no room
 * @throws {DatabaseAwayError}
 */
export async function expectFile(
	{ database, clock }: FileGround,
	actor: Actor,
	{ name, bytes }: { readonly name: string; readonly bytes: number | null }
): Promise<string> {
	requireWriter(actor);
	if (bytes === 0) throw new FileRefusedError('empty');
	if (bytes !== null && bytes > FILE_BYTES) throw new FileRefusedError('too_large');
	return asking(async () => {
		const taken = await files.roomTakenBy(database, actor.id);
		if (
			taken.files >= MOST.files ||
			taken.arriving >= MOST.arriving ||
			taken.bytes + (bytes ?? 0) > MOST.bytes
		)
			throw new FileRefusedError('full');
		const id = randomBytes(16).toString('hex');
		await files.addFile(database, {
			id,
			owner: actor.id,
			name: fileName(name),
			storage_key: `files/${id}`,
			bytes,
			created_at: clock()
		});
		return id;
	});
}

/** How far a file has come. @throws {SignInNeededError} @throws {UnknownFileError} @throws {DatabaseAwayError} */
export async function arrivalFor(ground: FileGround, actor: Actor, id: string): Promise<Arrival> {
	requireWriter(actor);
	return arrivalOf(await asking(() => ownArrival(ground, actor, id)));
}

/**
 * Takes what comes of a file, from a place on, in pieces that are each kept before the next is read. When it is
 * whole, it is checked. What is refused by its first bytes goes at once.
 * @returns where the file ends now
 * @throws {SignInNeededError} @throws {UnknownFileError} @throws {WrongPlaceError} @throws {FileRefusedError}
 * @throws {StorageAwayError} @throws {DatabaseAwayError} what came before stays, to go on from
 */
export async function takePart(
	ground: FileGround,
	actor: Actor,
	id: string,
	from: number,
	body: AsyncIterable<Uint8Array>
): Promise<number> {
	requireWriter(actor);
	const file = await asking(() => ownArrival(ground, actor, id));
	if (file.state !== 'arriving' || file.received !== from) throw new WrongPlaceError();
	let end = from;
	for await (const piece of inPieces(body)) {
		await lookAtPiece(ground, actor, file, end, piece);
		await keepPiece(ground, file, end, piece);
		end += piece.length;
	}
	return end;
}

async function lookAtPiece(
	ground: FileGround,
	actor: Person,
	{ id, bytes }: FileRecord,
	at: number,
	piece: Buffer
): Promise<void> {
	const tooMuch = at + piece.length > (bytes ?? FILE_BYTES);
	// A first piece that is too short to tell is told later, when the file is whole.
	const telling = at === 0 && (piece.length >= HEAD_BYTES || piece.length === bytes);
	const content = telling ? await contentOf(piece.subarray(0, HEAD_BYTES)) : null;
	const refusal = tooMuch ? 'too_large' : content && 'refusal' in content ? content.refusal : null;
	if (refusal === null) return;
	await deleteFile(ground, actor, id);
	throw new FileRefusedError(refusal);
}

async function keepPiece(
	ground: FileGround,
	file: FileRecord,
	at_byte: number,
	piece: Buffer
): Promise<void> {
	const { database, clock, store } = ground;
	const { id, bytes, storage_key } = file;
	// Two that send the same part do not write over each other.
	const object_key = `${storage_key}/pieces/${at_byte}-${randomBytes(6).toString('hex')}`;
	await store.put(object_key, piece, 'application/octet-stream');
	const kept = await inTransaction(database, async (transaction) => {
		const record = { file_id: id, at_byte, bytes: piece.length, object_key };
		if (!(await files.addPiece(database, record, clock(), transaction))) return false;
		if (at_byte + piece.length === bytes) await beginCheck(ground, transaction, file, bytes);
		return true;
	});
	if (kept) return;
	await store.removeUnder(object_key);
	throw new WrongPlaceError();
}

async function beginCheck(
	ground: FileGround,
	transaction: Transaction,
	{ id, owner }: FileRecord,
	bytes: number
): Promise<void> {
	const changes = { state: 'checking', bytes } as const;
	if (!(await files.changeFile(ground.database, id, 'arriving', changes, transaction)))
		throw new UnknownFileError();
	await queueJob(
		{ ...ground, transaction },
		{ kind: CHECK, payload: { file: id }, user_id: owner, onceKey: `${CHECK}:${id}` }
	);
}

/**
 * Says that all of a file has come whose size was not known before.
 * @throws {SignInNeededError} @throws {UnknownFileError} @throws {FileRefusedError} it is empty
 * @throws {DatabaseAwayError}
 */
export async function endFile(ground: FileGround, actor: Actor, id: string): Promise<void> {
	requireWriter(actor);
	const file = await asking(() => ownArrival(ground, actor, id));
	if (file.state !== 'arriving') return;
	if (file.received === 0) {
		await deleteFile(ground, actor, id);
		throw new FileRefusedError('empty');
	}
	await inTransaction(ground.database, (transaction) =>
		beginCheck(ground, transaction, file, file.received)
	);
}
