import { asking, type Transaction } from '../db';
import { files, jobs, notices, outbox, savedReadings } from '../db/repositories';
import type { Ground } from '../ground';

/** Something that a person has here beside the account itself: it is theirs to take along, and goes with them. */
export interface Belonging {
	/** As it stands in the copy of their data. */
	readonly name: string;
	readonly of: (ground: Ground, user_id: string) => Promise<unknown>;
	readonly remove: (ground: Ground, transaction: Transaction, user_id: string) => Promise<void>;
}

const MOST = 1000;

/** All there are. Whoever keeps something for people enters it here. */
export const BELONGINGS: readonly Belonging[] = [
	{
		name: 'saved_readings',
		of: ({ database }, user_id) => asking(() => savedReadings.readingsOf(database, user_id)),
		remove: ({ database }, transaction, user_id) =>
			savedReadings.forgetReadingsOf(database, user_id, transaction)
	},
	{
		name: 'files',
		of: async ({ database }, user_id) =>
			(await asking(() => files.filesOf(database, user_id))).map(
				({ id, name, state, media_type, bytes, sha256, taken_at, created_at }) => ({
					id,
					name,
					state,
					media_type,
					bytes,
					sha256,
					taken_at,
					created_at
				})
			),
		// Nobody reaches them from now on; what is stored goes with the next clean-up.
		remove: ({ database, clock }, transaction, user_id) =>
			files.deleteFilesOf(database, user_id, clock(), transaction)
	},
	{
		name: 'inbox',
		of: async ({ database }, user_id) => ({
			notices: (await asking(() => notices.allNoticesOf(database, user_id))).map(
				({ kind, template, data, created_at, read_at, archived_at }) => ({
					kind,
					template,
					data,
					created_at,
					read_at,
					archived_at
				})
			),
			preferences: (await asking(() => notices.preferencesOf(database, user_id))).map(
				({ kind, mail }) => ({ kind, mail })
			)
		}),
		remove: ({ database }, transaction, user_id) =>
			notices.forgetNoticesOf(database, user_id, transaction)
	},
	{
		name: 'background_work',
		of: async ({ database }, user_id) =>
			(await asking(() => jobs.jobsFor(database, user_id, MOST))).map(
				({ kind, state, created_at, finished_at }) => ({ kind, state, created_at, finished_at })
			),
		remove: ({ database }, transaction, user_id) =>
			jobs.forgetJobsOf(database, user_id, transaction)
	},
	{
		name: 'mails',
		of: ({ database }, user_id) => asking(() => outbox.mailsTo(database, user_id)),
		remove: ({ database }, transaction, user_id) =>
			outbox.forgetMailsTo(database, user_id, transaction)
	}
];
