import { Op, QueryTypes, UniqueConstraintError, type Transaction } from 'sequelize';
import type { Database } from '../connection';
import type { JobRecord } from '../models';
import { inTransaction } from '../transaction';
import type { Lease } from './lease';

export type NewJob = Pick<
	JobRecord,
	'id' | 'kind' | 'payload' | 'user_id' | 'once_key' | 'due_at' | 'created_at'
>;

const UNTOUCHED = {
	state: 'due',
	taken_by: null,
	taken_until: null,
	attempts: 0,
	progress: 0,
	total: null,
	checkpoint: null,
	stop_asked_at: null,
	last_error: null,
	finished_at: null
} as const;

/** Queues work. Answers false when work of the same `once_key` is on record already. */
export async function addJob(
	{ models }: Database,
	job: NewJob,
	transaction?: Transaction
): Promise<boolean> {
	try {
		await models.jobs.create({ ...job, ...UNTOUCHED }, { transaction });
		return true;
	} catch (error) {
		if (job.once_key === null || !(error instanceof UniqueConstraintError)) throw error;
		return false;
	}
}

/**
 * Takes the work that has been due longest, or whose worker was not heard of in time. Passes by what
 * others take at the same moment: the dialect leaves SKIP LOCKED out, so that the query is by hand.
 */
export const takeJob = (
	database: Database,
	kinds: readonly string[],
	now: Date,
	lease: Lease
): Promise<JobRecord | null> =>
	inTransaction(
		database,
		async (transaction) => {
			const [due] = await database.sequelize.query<{ id: string }>(
				`SELECT id FROM jobs
			WHERE state IN ('due', 'running') AND due_at <= :now AND kind IN (:kinds)
				AND (taken_until IS NULL OR taken_until <= :now)
			ORDER BY due_at LIMIT 1 FOR UPDATE SKIP LOCKED`,
				{ replacements: { now, kinds }, type: QueryTypes.SELECT, transaction }
			);
			if (!due) return null;
			const job = await database.models.jobs.findByPk(due.id, { rejectOnEmpty: true, transaction });
			await job.update(
				{
					state: 'running',
					taken_by: lease.worker,
					taken_until: lease.until,
					attempts: (job.get('attempts') as number) + 1
				},
				{ transaction }
			);
			return job.get({ plain: true });
		},
		{ gapsOpen: true }
	);

type Report = Partial<Pick<JobRecord, 'progress' | 'total' | 'checkpoint' | 'taken_until'>>;

/**
 * Writes how far work is, and holds the lease longer.
 * @returns whether it shall stop; null when it is no longer this worker's
 */
export async function reportJob(
	{ models }: Database,
	id: string,
	worker: string,
	report: Report
): Promise<{ readonly stop: boolean } | null> {
	const mine = { id, taken_by: worker, state: 'running' as const };
	await models.jobs.update(report, { where: mine });
	const found = await models.jobs.findOne({ attributes: ['stop_asked_at'], where: mine });
	return found && { stop: found.get('stop_asked_at') !== null };
}

type Outcome = Partial<
	Pick<JobRecord, 'state' | 'due_at' | 'attempts' | 'last_error' | 'finished_at' | 'checkpoint'>
>;

/** Ends a lease with what came of it. Answers false when the work is no longer this worker's. */
export async function giveBackJob(
	{ models }: Database,
	id: string,
	worker: string,
	outcome: Outcome,
	transaction?: Transaction
): Promise<boolean> {
	const [changed] = await models.jobs.update(
		{ ...outcome, taken_by: null, taken_until: null },
		{ where: { id, taken_by: worker, state: 'running' }, transaction }
	);
	return changed > 0;
}

/** Work done for somebody, newest first. */
export async function jobsFor(
	{ models }: Database,
	user_id: string,
	limit: number
): Promise<JobRecord[]> {
	const found = await models.jobs.findAll({
		where: { user_id },
		order: [
			['created_at', 'DESC'],
			['id', 'ASC']
		],
		limit
	});
	return found.map((one) => one.get({ plain: true }));
}

export async function jobById({ models }: Database, id: string): Promise<JobRecord | null> {
	const found = await models.jobs.findByPk(id);
	return found && found.get({ plain: true });
}

/** Asks for an end. A worker brings it about: of work that waits too, so that what hangs on it is put right. */
export async function askJobToStop({ models }: Database, id: string, now: Date): Promise<void> {
	await models.jobs.update({ stop_asked_at: now }, { where: { id, state: ['due', 'running'] } });
	await models.jobs.update(
		{ due_at: now },
		{ where: { id, state: 'due', due_at: { [Op.gt]: now } } }
	);
}

/** Throws away work that ended before a time. Answers how much. */
export const forgetJobs = ({ models }: Database, before: Date): Promise<number> =>
	models.jobs.destroy({ where: { finished_at: { [Op.lt]: before } } });

/** Throws away all work for somebody, done or not. */
export async function forgetJobsOf(
	{ models }: Database,
	user_id: string,
	transaction: Transaction
): Promise<void> {
	await models.jobs.destroy({ where: { user_id }, transaction });
}
