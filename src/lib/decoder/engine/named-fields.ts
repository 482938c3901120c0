/** A body tag of which each field is given by name. */
import type { FieldName } from '../../types';
import type { LinedLayout } from './lined-layout';
import type { LinedMatch } from './lined-match';
import { COSTS, nothingPlaced, type LineMatch } from './line-match';
import { linesOf, type Lines } from './lines';

export type NamedFields = Readonly<Partial<Record<FieldName, string>>>;

/** Names and texts of the fields in which something can be read, each as one line. */
const given = (fields: NamedFields): [name: string, text: string][] =>
	Object.entries(fields)
		.map(([name, text]): [string, string] => [name, linesOf(text, true).normalised])
		.filter(([, text]) => text !== '');

/** The text that the named fields make, one a line. */
export const textOfFields = (fields: NamedFields): string =>
	given(fields)
		.map(([, text]) => text)
		.join(' / ');

/** Lays each named field under the first field of that name; one that the layout lacks is kept as unknown. */
export function matchFields(layout: LinedLayout, fields: NamedFields, typed: Lines): LinedMatch {
	const names = given(fields).map(([name]) => name);
	const all = layout.lines.flatMap((form) => form.fields);
	const lines = typed.lines.map((line, index): LineMatch => {
		const field = all.find(({ name }) => name === names[index]);
		if (field === undefined) return nothingPlaced(line);
		const placed = [{ field, line, from: 0, to: line.cells.length }];
		return { line, cost: 0, placed, unplaced: [], missing: [] };
	});
	return {
		layout,
		cost: lines.filter(({ placed }) => placed.length === 0).length * COSTS.token,
		lines,
		forms: lines.map(() => null),
		missing: [],
		order: 'as_listed',
		sorted: [],
		doubled: []
	};
}
