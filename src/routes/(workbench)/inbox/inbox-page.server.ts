/** What the inbox and its archive show, and what can be done with a notice there. */
import { redirect } from '@sveltejs/kit';
import { moment } from '$lib/format/moments';
import type { Actor } from '$lib/server/actor';
import { readForm } from '$lib/server/forms';
import { ground } from '$lib/server/ground';
import { archiveNotice, noticesFor, openNotice } from '$lib/server/inbox';
import { inboxText } from '$lib/text/en/inbox';
import { idFormSchema } from '$lib/types';
import type { RequestEvent } from '@sveltejs/kit';

/** @throws {SignInNeededError} @throws {DatabaseAwayError} */
export async function noticesPage(actor: Actor, archived: boolean) {
	const notices = await noticesFor(ground(), actor, { archived });
	return notices.map(({ id, kind, title, body, read, at }) => ({
		id,
		kind: inboxText.kinds[kind],
		title,
		body,
		read,
		at: moment(at.toISOString())
	}));
}

export type NoticeShown = Awaited<ReturnType<typeof noticesPage>>[number];

/** Marks a notice as read and leads to what it is about. */
export async function openFromForm({ request, locals }: RequestEvent) {
	const form = await readForm(request, 'open', idFormSchema);
	if (!form.ok) return form.refusal;
	const { link } = await openNotice(ground(), await locals.actor(), form.data.id);
	redirect(303, link);
}

/** Puts a notice away, or back, and shows the list that it was in. */
export async function moveFromForm({ request, locals, url }: RequestEvent, archived: boolean) {
	const form = await readForm(request, 'move', idFormSchema);
	if (!form.ok) return form.refusal;
	await archiveNotice(ground(), await locals.actor(), form.data.id, archived);
	redirect(303, url.pathname);
}
