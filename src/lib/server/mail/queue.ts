import { randomBytes } from 'node:crypto';
import { letterFrame, letterOf, type MailData, type MailTemplate } from '../../text/en/mail';
import type { MailKind } from '../../types';
import { config } from '../config';
import type { Transaction } from '../db';
import { outbox } from '../db/repositories';
import type { Ground } from '../ground';
import { formsOf } from './form';
import { unsubscribeToken } from './unsubscribe';

/** The transaction that causes a mail: without its commit there is none. */
export interface Causing extends Ground {
	readonly transaction: Transaction;
}

export interface Mail<Template extends MailTemplate> {
	/** `user_id` is null for an address without an account. */
	readonly to: { readonly address: string; readonly user_id: string | null };
	readonly template: Template;
	readonly data: MailData<Template>;
	/** `access` always comes; every other kind carries a way to unsubscribe from it. */
	readonly kind: MailKind;
	/** Not before; at once when left out. */
	readonly dueAt?: Date;
	/** Two mails of one key are one, for ever. */
	readonly onceKey?: string;
}

/**
 * Writes a mail to the outbox, in the transaction that causes it. Never speaks to a mail server, so
 * that it fails only as the database does; the worker sends it.
 */
export async function queueMail<Template extends MailTemplate>(
	{ database, transaction, clock }: Causing,
	{ to, template, data, kind, dueAt, onceKey }: Mail<Template>
): Promise<void> {
	const now = clock();
	const id = randomBytes(16).toString('hex');
	const unsubscribe =
		kind === 'access' || to.user_id === null ? null : addressFor(to.user_id, kind);
	const { subject, text, html } = formsOf(letterOf(template, data), {
		why: to.user_id === null ? letterFrame.whyAsked : letterFrame.whyNotice,
		unsubscribe
	});
	await outbox.addMail(
		database,
		{
			id,
			user_id: to.user_id,
			recipient: to.address,
			kind,
			message_id: `<${id}@${new URL(config().origin).hostname}>`,
			subject,
			body_text: text,
			body_html: html,
			unsubscribe_url: unsubscribe,
			once_key: onceKey ?? null,
			created_at: now,
			due_at: dueAt ?? now
		},
		transaction
	);
}

function addressFor(user_id: string, kind: Exclude<MailKind, 'access'>): string {
	const { origin, authSecret } = config();
	if (authSecret === undefined) throw new Error('AUTH_SECRET is not set: mails cannot be signed.');
	return `${origin}/unsubscribe?token=${unsubscribeToken(authSecret, { user_id, kind })}`;
}
