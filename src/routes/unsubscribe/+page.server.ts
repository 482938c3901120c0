import { ground } from '$lib/server/ground';
import { admit } from '$lib/server/http';
import { lookAtUnsubscription, unsubscribe } from '$lib/server/inbox';
import type { Actions, PageServerLoad } from './$types';

const tokenOf = ({ searchParams }: URL): string => searchParams.get('token') ?? '';

/** Looking changes nothing: programs that follow the links of a mail must not unsubscribe anybody. */
export const load: PageServerLoad = ({ url }) => ({
	kind: lookAtUnsubscription(tokenOf(url))?.kind ?? null
});

export const actions: Actions = {
	/** Also what a mail program sends by itself when its own button is pressed (RFC 8058). */
	default: async ({ url, getClientAddress }) => {
		admit(getClientAddress());
		return { done: await unsubscribe(ground(), tokenOf(url)) };
	}
};
