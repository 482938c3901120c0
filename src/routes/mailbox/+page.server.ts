import { demoMailbox, keptMails } from '$lib/server/mail';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async () => ({ mails: await keptMails(demoMailbox()) });
