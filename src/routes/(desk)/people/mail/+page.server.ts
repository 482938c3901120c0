import { moment } from '$lib/format/moments';
import { ground } from '$lib/server/ground';
import { unsentMails } from '$lib/server/mail';
import { signedIn } from '$lib/server/sign-in';
import { peopleText } from '$lib/text/en/people';
import type { PageServerLoad } from './$types';

const text = peopleText.mail;

export const load: PageServerLoad = async (event) => {
	const mails = await unsentMails(ground(), await signedIn(event));
	return {
		mails: mails.map(({ id, to, subject, at, attempts, why, next }) => ({
			id,
			to,
			subject,
			why,
			tries: `${text.tries(attempts)} ${moment(at.toISOString())}`,
			state: next === null ? text.givenUp : text.next(moment(next.toISOString()))
		}))
	};
};
