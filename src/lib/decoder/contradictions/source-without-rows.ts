import { contradictionText as text } from '../../text/en/contradictions';
import type { Check } from './check';

/** A source that no row and no claim cites, and that none is a copy of. */
export const sourceWithoutRows: Check = ({ rows, claims, sources }) => {
	const cited = new Set([
		...[...rows.values()].flatMap(({ citations }) => citations.map(({ source }) => source)),
		...claims.map(({ source }) => source),
		...[...sources.values()].flatMap(({ repeats }) => repeats ?? [])
	]);
	return [...sources.values()]
		.filter(({ key }) => !cited.has(key))
		.map(({ key, title }) => ({
			check: 'source_without_rows',
			rows: [],
			sources: [key],
			message: text.source_without_rows(title)
		}));
};
