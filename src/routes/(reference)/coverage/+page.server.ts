import { LAYOUTS, LINED_LAYOUTS } from '$lib/decoder';
import { drawnCoverage } from '$lib/format/coverage';
import { yearSpan } from '$lib/format/years';
import { admit } from '$lib/server/http';
import { coverage, current, PUBLISHED_EXAMPLES } from '$lib/server/reference';
import type { PageServerLoad } from './$types';
import { coverageByTable } from './by-table';
import { questionsOf } from './questions';

export const load: PageServerLoad = ({ getClientAddress }) => {
	admit(getClientAddress());
	const { tables, head } = current();
	return {
		edition: head.number,
		coverage: drawnCoverage(coverage(tables).divisions),
		makers: coverageByTable(tables),
		claims: tables.claims.length,
		questions: questionsOf(tables),
		examples: PUBLISHED_EXAMPLES,
		lined: LINED_LAYOUTS.map(({ id, title, years, kind }) => ({
			id,
			title,
			kind,
			years: yearSpan(...years)
		})),
		layouts: LAYOUTS.filter(({ kind }) => kind === 'serial').map(
			({ id, title, years, length }) => ({
				id,
				title,
				years: yearSpan(...years),
				length
			})
		)
	};
};
