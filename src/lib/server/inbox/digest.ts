import { z } from 'zod';
import { noticeWords, type NoticeTemplate } from '../../text/en/notices';
import { config } from '../config';
import { inTransaction } from '../db';
import { notices, users } from '../db/repositories';
import type { Ground } from '../ground';
import type { JobKind, Repeated } from '../jobs';
import { queueMail } from '../mail';

const KIND = 'digest';
const HOUR_MS = 3_600_000;

const payload = z.object({ due: z.iso.datetime() });

/** Makes one mail of the notices of a day, for each who wants them so and has not read them all by then. */
export const digestKind: JobKind<z.output<typeof payload>> = {
	kind: KIND,
	payload,
	async run({ database, clock, payload: { due }, report }) {
		const before = new Date(due);
		const people = await notices.waitingForDigest(database, before);
		for (const [index, user_id] of people.entries()) {
			await mailDigest({ database, clock }, user_id, before);
			await report({ done: index + 1, of: people.length });
		}
	}
};

/** At seven in the morning, UTC. */
export const EVERY_MORNING: Repeated = { kind: KIND, every: 24 * HOUR_MS, at: 7 * HOUR_MS };

/** Taking the notices and queuing the mail is one transaction: a worker that dies in between has done neither. */
const mailDigest = (ground: Ground, user_id: string, before: Date): Promise<void> =>
	inTransaction(ground.database, async (transaction) => {
		const { database, clock } = ground;
		const taken = await notices.takeForDigest(database, user_id, before, clock(), transaction);
		const unread = taken.filter(({ read_at }) => read_at === null);
		const user = await users.userById(database, user_id, transaction);
		if (unread.length === 0 || user === null || user.email === null) return;
		const { origin } = config();
		await queueMail(
			{ ...ground, transaction },
			{
				to: { address: user.email, user_id },
				template: 'digest',
				data: {
					name: user.name,
					notices: unread.map(({ id, template, data }) => ({
						...noticeWords(template as NoticeTemplate, data),
						link: `${origin}/inbox/${id}`
					})),
					inbox: `${origin}/inbox`
				},
				kind: 'digest'
			}
		);
	});
