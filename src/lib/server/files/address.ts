import type { Readable } from 'node:stream';
import { RENDITIONS, type Rendition } from '../../types';
import { requireMember, type Actor } from '../actor';
import { asking } from '../db';
import { files } from '../db/repositories';
import { isSignature, signatureOf } from '../signature';
import { UnknownFileError } from './errors';
import type { FileGround } from './ground';

const HOUR_MS = 3_600_000;

const signed = (id: string, rendition: string, until: number, viewer: string): string =>
	[id, rendition, until, viewer].join('.');

/**
 * Where who asks can see a file of theirs, for one to two hours. The address is good for nobody else, and the same for an
 * hour, so that a browser need not load it again.
 */
export function fileAddress(
	{ clock, secret }: Pick<FileGround, 'clock' | 'secret'>,
	actor: Actor,
	id: string,
	rendition: Rendition
): string {
	requireMember(actor);
	const until = (Math.floor(clock().getTime() / HOUR_MS) + 2) * HOUR_MS;
	const key = signatureOf(secret, 'file', signed(id, rendition, until, actor.id));
	return `/files/${id}/${rendition}?until=${until}&key=${key}`;
}

/** The bytes of a file, and what has to stand beside them. */
export interface FileBytes {
	readonly body: Readable;
	readonly bytes: number;
	readonly type: string;
	/** The name to save it under. */
	readonly name: string;
	/** Seconds for which the address stays good. */
	readonly seconds: number;
}

const ENDINGS: Readonly<Record<string, string>> = {
	'image/jpeg': '.jpg',
	'image/png': '.png',
	'application/pdf': '.pdf'
};

/** A name whose ending says what the file is, whatever it said before. */
const nameOf = (name: string, type: string): string =>
	name.replace(/\.[^.]{1,8}$/u, '') + (ENDINGS[type] ?? '');

/**
 * What stands at an address: only for whom it was made, and only until it runs out.
 * @throws {SignInNeededError} @throws {UnknownFileError} forged, run out, somebody else's, deleted, or not kept
 * @throws {StorageAwayError} @throws {DatabaseAwayError}
 */
export async function openFile(
	{ database, clock, store, secret }: FileGround,
	actor: Actor,
	{ id, rendition, until, key }: { id: string; rendition: string; until: string; key: string }
): Promise<FileBytes> {
	requireMember(actor);
	const form = RENDITIONS.find((one) => one === rendition);
	const end = Number(until);
	const seconds = Math.floor((end - clock().getTime()) / 1000);
	if (
		form === undefined ||
		!isSignature(secret, 'file', signed(id, form, end, actor.id), key) ||
		seconds <= 0
	)
		throw new UnknownFileError();
	const file = await asking(() => files.fileById(database, id));
	if (file?.state !== 'ready' || file.owner !== actor.id || file.media_type === null)
		throw new UnknownFileError();
	if (form !== 'whole' && file.media_type === 'application/pdf') throw new UnknownFileError();
	const type = form === 'whole' ? file.media_type : 'image/jpeg';
	const { body, bytes } = await store.get(`${file.storage_key}/${form}`);
	return { body, bytes, type, name: nameOf(file.name, type), seconds };
}
