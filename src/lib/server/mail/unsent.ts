import { requireAdministrator, type Actor } from '../actor';
import { asking } from '../db';
import { outbox } from '../db/repositories';
import type { Ground } from '../ground';

/** A mail that did not go out: tried again later, or given up. */
export interface UnsentMail {
	readonly id: string;
	readonly to: string;
	readonly subject: string;
	readonly at: Date;
	readonly attempts: number;
	/** What the mail server said, in its own words. */
	readonly why: string;
	/** When it is tried next; null once it was given up. */
	readonly next: Date | null;
}

const MOST = 100;

/**
 * Mails that are in trouble, newest first, without their text: it carries links that open an account.
 * @throws what `requireAdministrator` throws @throws {DatabaseAwayError}
 */
export async function unsentMails({ database }: Ground, actor: Actor): Promise<UnsentMail[]> {
	requireAdministrator(actor);
	const found = await asking(() => outbox.unsentMails(database, MOST));
	return found.map((mail) => ({
		id: mail.id,
		to: mail.recipient,
		subject: mail.subject,
		at: mail.created_at,
		attempts: mail.attempts,
		why: mail.last_error ?? '',
		next: mail.failed_at === null ? mail.due_at : null
	}));
}
