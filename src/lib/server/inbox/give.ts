import { randomBytes } from 'node:crypto';
import { KIND_OF, noticeWords, type NoticeData, type NoticeTemplate } from '../../text/en/notices';
import { config } from '../config';
import { notices, users } from '../db/repositories';
import { queueMail, type Causing } from '../mail';
import { preferencesOf } from './preferences';

export interface Notice<Template extends NoticeTemplate> {
	/** Whom it is for. */
	readonly user_id: string;
	readonly template: Template;
	/** Its particulars, as JSON. */
	readonly data: NoticeData<Template>;
}

/**
 * Tells somebody something, in the transaction that causes it: in the inbox, and by mail as they want it. Whoever has
 * no account any more is told nothing.
 */
export async function giveNotice<Template extends NoticeTemplate>(
	causing: Causing,
	{ user_id, template, data }: Notice<Template>
): Promise<void> {
	const { database, transaction, clock } = causing;
	const user = await users.userById(database, user_id, transaction);
	if (user === null || user.email === null) return;
	const kind = KIND_OF[template];
	const { [kind]: mail } = await preferencesOf(causing, user_id, transaction);
	const id = randomBytes(16).toString('hex');
	const notice = { id, user_id, kind, template, data, mail, created_at: clock() };
	await notices.addNotice(database, notice, transaction);
	if (mail !== 'each') return;
	const { title, body } = noticeWords(template, data);
	await queueMail(causing, {
		to: { address: user.email, user_id },
		template: 'notice',
		data: { name: user.name, title, body, link: `${config().origin}/inbox/${id}` },
		kind
	});
}
