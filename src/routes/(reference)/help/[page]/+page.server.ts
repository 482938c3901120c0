import { error } from '@sveltejs/kit';
import { HELP_PAGES, helpPage } from '$lib/help';
import { helpText } from '$lib/text/en/help';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = ({ params }) => {
	const page = helpPage(params.page);
	if (page === undefined) error(404, helpText.missing(params.page));
	return {
		page,
		more: HELP_PAGES.filter(({ slug }) => slug !== page.slug).map(({ slug, title }) => ({
			slug,
			title
		}))
	};
};
