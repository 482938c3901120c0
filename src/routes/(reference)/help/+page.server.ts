import { HELP_PAGES } from '$lib/help';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = () => ({
	pages: HELP_PAGES.map(({ slug, title, summary }) => ({ slug, title, summary }))
});
