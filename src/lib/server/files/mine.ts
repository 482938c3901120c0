import { setTimeout as pause } from 'node:timers/promises';
import type { FileRefusal, FileState, KeptType } from '../../types';
import { requireMember, type Actor } from '../actor';
import { asking, inTransaction } from '../db';
import { files } from '../db/repositories';
import { UnknownFileError } from './errors';
import type { FileGround } from './ground';
import { queueRemoval } from './removal';

/** A file of somebody's, as they see it. */
export interface OwnFile {
	readonly id: string;
	/** As it was named where it came from: text, never a path. */
	readonly name: string;
	readonly state: FileState;
	readonly refusal: FileRefusal | null;
	/** Of what is kept; null before. */
	readonly type: KeptType | null;
	/** Of what is kept, or of what was sent while it is not kept yet. */
	readonly bytes: number | null;
	readonly width: number | null;
	readonly height: number | null;
	/** What the camera's clock said, in ISO 8601. */
	readonly takenAt: string | null;
	/** SHA-256 of what was sent, in hexadecimal. */
	readonly sha256: string | null;
	readonly createdAt: Date;
}

type FileRecord = NonNullable<Awaited<ReturnType<typeof files.fileById>>>;

const shown = (file: FileRecord): OwnFile => ({
	id: file.id,
	name: file.name,
	state: file.state,
	refusal: file.refusal,
	type: file.media_type,
	bytes: file.kept_bytes ?? file.bytes,
	width: file.width,
	height: file.height,
	takenAt: file.taken_at,
	sha256: file.sha256,
	createdAt: file.created_at
});

/** The files of who asks, newest first. @throws {SignInNeededError} @throws {DatabaseAwayError} */
export async function filesFor({ database }: FileGround, actor: Actor): Promise<OwnFile[]> {
	requireMember(actor);
	return (await asking(() => files.filesOf(database, actor.id))).map(shown);
}

/** One file of who asks. @throws {SignInNeededError} @throws {UnknownFileError} @throws {DatabaseAwayError} */
export async function fileFor(
	{ database }: FileGround,
	actor: Actor,
	id: string
): Promise<OwnFile> {
	requireMember(actor);
	const file = await asking(() => files.fileById(database, id));
	if (file === null || file.owner !== actor.id) throw new UnknownFileError();
	return shown(file);
}

const LOOK_MS = 150;

/**
 * One file of who asks, waited for until it is kept or refused, or for as long as told.
 * @throws as `fileFor`
 */
export async function settledFileFor(
	ground: FileGround,
	actor: Actor,
	id: string,
	patienceMs: number
): Promise<OwnFile> {
	requireMember(actor);
	for (const until = performance.now() + patienceMs; ; await pause(LOOK_MS)) {
		const file = await fileFor(ground, actor, id);
		if (file.state === 'ready' || file.state === 'refused' || performance.now() >= until)
			return file;
	}
}

/** Deletes a file of who asks; its bytes go within minutes. @throws {SignInNeededError} @throws {UnknownFileError} @throws {DatabaseAwayError} */
export async function deleteFile(ground: FileGround, actor: Actor, id: string): Promise<void> {
	requireMember(actor);
	const { database, clock } = ground;
	await inTransaction(database, async (transaction) => {
		if (!(await files.deleteFile(database, { id, owner: actor.id }, clock(), transaction)))
			throw new UnknownFileError();
		await queueRemoval({ database, clock, transaction });
	});
}
