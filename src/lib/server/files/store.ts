import type { Readable } from 'node:stream';
import { filesText } from '../../text/en/files';

/** Keeps the bytes of files, under keys. */
export interface Store {
	/** @throws {StorageAwayError} */
	put(key: string, body: Buffer, type: string): Promise<void>;
	/** @throws {StorageAwayError} @throws {MissingObjectError} */
	get(key: string): Promise<StoredObject>;
	/** Removes all whose keys begin so; what is not there is no error. @throws {StorageAwayError} */
	removeUnder(prefix: string): Promise<void>;
}

export interface StoredObject {
	readonly bytes: number;
	readonly body: Readable;
}

/** The store does not answer, lets us not in, or there is none. What is kept in it is not lost. */
export class StorageAwayError extends Error {
	readonly code = 'storage_away';
	override readonly name = 'StorageAwayError';
	constructor(cause: unknown) {
		super(filesText.away, { cause });
	}
}

/** The store has no object of that key. */
export class MissingObjectError extends Error {
	readonly code = 'missing_object';
	override readonly name = 'MissingObjectError';
	constructor(readonly key: string) {
		super(`The store has no object ${key}.`);
	}
}

const nowhere = async (): Promise<never> => {
	throw new StorageAwayError(new Error('S3_BUCKET is not set.'));
};

/** For an installation that has none. */
export const NO_STORE: Store = { put: nowhere, get: nowhere, removeUnder: nowhere };
