import { noticeWords, type NoticeTemplate, type NoticeWords } from '../../text/en/notices';
import type { NoticeKind } from '../../types';
import { requireMember, type Actor } from '../actor';
import { asking } from '../db';
import { notices } from '../db/repositories';
import type { Ground } from '../ground';
import { UnknownNoticeError } from './errors';

/** A notice, as whom it is for sees it. */
export interface OwnNotice extends NoticeWords {
	readonly id: string;
	readonly kind: NoticeKind;
	readonly at: Date;
	readonly read: boolean;
	readonly archived: boolean;
}

const MOST = 200;

type NoticeRecord = NonNullable<Awaited<ReturnType<typeof notices.noticeOf>>>;

const shown = ({ id, kind, template, data, ...notice }: NoticeRecord): OwnNotice => ({
	...noticeWords(template as NoticeTemplate, data),
	id,
	kind,
	at: notice.created_at,
	read: notice.read_at !== null,
	archived: notice.archived_at !== null
});

/** What who asks was told: in the inbox, or in the archive; newest first. @throws {SignInNeededError} @throws {DatabaseAwayError} */
export async function noticesFor(
	{ database }: Ground,
	actor: Actor,
	{ archived }: { archived: boolean }
): Promise<OwnNotice[]> {
	requireMember(actor);
	const found = await asking(() =>
		notices.noticesOf(database, actor.id, { archived, limit: MOST })
	);
	return found.map(shown);
}

/**
 * Opens a notice: it is read from now on.
 * @throws {SignInNeededError} @throws {UnknownNoticeError} @throws {DatabaseAwayError}
 */
export async function openNotice(
	{ database, clock }: Ground,
	actor: Actor,
	id: string
): Promise<OwnNotice> {
	requireMember(actor);
	return asking(async () => {
		const found = await notices.noticeOf(database, { id, user_id: actor.id });
		if (found === null) throw new UnknownNoticeError();
		await notices.markRead(database, actor.id, id, clock());
		return { ...shown(found), read: true };
	});
}

/** Marks all in the inbox as read. @throws {SignInNeededError} @throws {DatabaseAwayError} */
export async function readAllNotices({ database, clock }: Ground, actor: Actor): Promise<void> {
	requireMember(actor);
	await asking(() => notices.markRead(database, actor.id, 'all', clock()));
}

/**
 * Moves a notice to the archive, or back to the inbox.
 * @throws {SignInNeededError} @throws {UnknownNoticeError} @throws {DatabaseAwayError}
 */
export async function archiveNotice(
	{ database, clock }: Ground,
	actor: Actor,
	id: string,
	archived: boolean
): Promise<void> {
	requireMember(actor);
	const at = archived ? clock() : null;
	if (!(await asking(() => notices.moveNotice(database, { id, user_id: actor.id }, at))))
		throw new UnknownNoticeError();
}
