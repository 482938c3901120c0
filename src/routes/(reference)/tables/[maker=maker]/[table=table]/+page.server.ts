import { error } from '@sveltejs/kit';
import { admit, counted } from '$lib/server/http';
import { current, tableOf } from '$lib/server/reference';
import { tablesText } from '$lib/text/en/tables';
import { MAKER_NAMES, tableDefinition } from '$lib/types';
import type { PageServerLoad } from './$types';
import { tablePage } from './table-page.server';

export const load: PageServerLoad = ({ params, url, getClientAddress }) => {
	const address = getClientAddress();
	admit(address);
	const edition = current();
	const table = tableOf(edition.tables, params.maker, params.table);
	if (table === undefined) {
		const { label } = tableDefinition(params.table);
		error(404, tablesText.table.missing(label, MAKER_NAMES[params.maker]));
	}
	return counted(address, () => tablePage(url, edition, table));
};
