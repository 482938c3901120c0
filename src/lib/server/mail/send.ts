import { outbox } from '../db/repositories';
import type { Ground } from '../ground';
import { RefusedMailError, SEND_TIMEOUT_MS, type Post } from './post';

/** Longer than a mail may take, so that it is not begun twice. */
const LEASE_MS = 2 * SEND_TIMEOUT_MS;
const MINUTE_MS = 60_000;
const MOST_ATTEMPTS = 12;
const LONGEST_WAIT_MINUTES = 12 * 60;
const ERROR_LENGTH = 500;

/** How long a mail waits after so many attempts in vain: 1, 2, 4 … minutes, half a day at most. */
export const waitAfter = (attempts: number): number =>
	Math.min(2 ** (attempts - 1), LONGEST_WAIT_MINUTES) * MINUTE_MS;

export interface Sending extends Ground {
	readonly post: Post;
	/** Names this worker among all others. */
	readonly worker: string;
}

/** What became of one mail. */
export type Sent =
	| { readonly id: string; readonly result: 'sent' }
	| { readonly id: string; readonly result: 'later' | 'failed'; readonly error: unknown };

/**
 * Sends the mail that has been due longest. A worker that dies after the other side has taken a mail
 * and before that is on record leaves it to be sent once more, under the same Message-ID: SMTP knows
 * no way to ask.
 * @returns null when nothing is due
 */
export async function sendNext({ database, clock, post, worker }: Sending): Promise<Sent | null> {
	const now = clock();
	const lease = { worker, until: new Date(now.getTime() + LEASE_MS) };
	const mail = await outbox.takeMail(database, now, lease);
	if (mail === null) return null;
	const { id } = mail;
	try {
		await post.send({
			to: mail.recipient,
			messageId: mail.message_id,
			subject: mail.subject,
			text: mail.body_text,
			html: mail.body_html,
			unsubscribe: mail.unsubscribe_url,
			date: mail.created_at
		});
	} catch (error) {
		const refused = error instanceof RefusedMailError || mail.attempts >= MOST_ATTEMPTS;
		const at = clock();
		await outbox.giveBackMail(database, id, worker, {
			last_error: String((error as Error).message).slice(0, ERROR_LENGTH),
			...(refused
				? { failed_at: at, body_text: '', body_html: null }
				: { due_at: new Date(at.getTime() + waitAfter(mail.attempts)) })
		});
		return { id, result: refused ? 'failed' : 'later', error };
	}
	// Mails carry links that open an account: once they are out, no copy is kept.
	const done = { sent_at: clock(), last_error: null, body_text: '', body_html: null };
	await outbox.giveBackMail(database, id, worker, done);
	return { id, result: 'sent' };
}
