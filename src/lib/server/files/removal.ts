import { z } from 'zod';
import type { Transaction } from '../db';
import { inTransaction } from '../db';
import { files } from '../db/repositories';
import type { Ground } from '../ground';
import { NotNowError, queueJob, type JobKind } from '../jobs';
import { REMOVE } from './kinds';
import { StorageAwayError, type Store } from './store';

const DAY_MS = 86_400_000;
const AT_ONCE = 100;

/** Has objects that nobody needs any more removed, soon. */
export async function queueRemoval(
	ground: Ground & { readonly transaction?: Transaction }
): Promise<void> {
	await queueJob(ground, { kind: REMOVE, payload: {}, user_id: null });
}

/** Marks files as deleted that have not gone on arriving for a day. Answers how many. */
export const giveUpAbandoned = ({ database, clock }: Ground): Promise<number> =>
	files.deleteAbandoned(database, new Date(clock().getTime() - DAY_MS), clock());

/** Removes the objects of deleted files and, of those that were checked, whatever was sent. */
export const removeFilesKind = (store: Store): JobKind => ({
	kind: REMOVE,
	payload: z.unknown(),
	async run({ database, signal }) {
		try {
			for (const { id, storage_key } of await files.deletedFiles(database, AT_ONCE)) {
				signal.throwIfAborted();
				await store.removeUnder(`${storage_key}/`);
				await files.forgetFile(database, id);
			}
			for (const { id, state, storage_key } of await files.filesWithLeftovers(database, AT_ONCE)) {
				signal.throwIfAborted();
				await store.removeUnder(state === 'refused' ? `${storage_key}/` : `${storage_key}/pieces/`);
				await inTransaction(database, (transaction) =>
					files.forgetPieces(database, id, transaction)
				);
			}
		} catch (error) {
			if (error instanceof StorageAwayError) throw new NotNowError(error.message, { cause: error });
			throw error;
		}
	}
});
