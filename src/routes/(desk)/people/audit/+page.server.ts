import { trail } from '$lib/server/audit';
import { ground } from '$lib/server/ground';
import { signedIn } from '$lib/server/sign-in';
import { z } from 'zod';
import { entryLine } from '../entry-lines';
import type { PageServerLoad } from './$types';

const askedSchema = z.object({
	about: z.string().max(32).optional().catch(undefined),
	below: z.coerce.number().int().positive().optional().catch(undefined)
});

export const load: PageServerLoad = async (event) => {
	const actor = await signedIn(event);
	const asked = askedSchema.parse(Object.fromEntries(event.url.searchParams));
	const { entries, next } = await trail(ground(), actor, asked);
	const about = asked.about === undefined ? '' : `about=${encodeURIComponent(asked.about)}&`;
	return {
		entries: entries.map(entryLine),
		older: next === null ? null : `/people/audit?${about}below=${next}`,
		newest: asked.below === undefined ? null : `/people/audit?${about}`.replace(/[?&]$/, '')
	};
};
