import { drawnCoverage } from '$lib/format/coverage';
import { admit } from '$lib/server/http';
import { coverage, current } from '$lib/server/reference';
import { MAKER_NAMES, type Maker } from '$lib/types';
import type { PageServerLoad } from './$types';
import { tableEntries } from '../table-entries';

export const load: PageServerLoad = ({ params, getClientAddress }) => {
	admit(getClientAddress());
	const maker: Maker = params.maker;
	const { tables, head } = current();
	return {
		maker,
		name: MAKER_NAMES[maker],
		edition: head.number,
		coverage: drawnCoverage(coverage(tables).divisions.filter((one) => one.maker === maker)),
		tables: tableEntries(tables, { maker })
	};
};
