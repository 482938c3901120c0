import { error } from '@sveltejs/kit';
import { admit } from '$lib/server/http';
import { current, tableOf } from '$lib/server/reference';
import { tablesText } from '$lib/text/en/tables';
import { MAKER_NAMES, tableDefinition } from '$lib/types';
import type { PageServerLoad } from './$types';
import { tablePage } from './table-page.server';

/** What a search costs beside a reading. */
const SEARCH = 3;

export const load: PageServerLoad = ({ params, url, getClientAddress }) => {
	admit(getClientAddress(), url.searchParams.get('q') ? SEARCH : 1);
	const edition = current();
	const table = tableOf(edition.tables, params.maker, params.table);
	if (table === undefined) {
		const { label } = tableDefinition(params.table);
		error(404, tablesText.table.missing(label, MAKER_NAMES[params.maker]));
	}
	return tablePage(url, edition, table);
};
