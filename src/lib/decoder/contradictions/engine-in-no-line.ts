import { contradictionText as text } from '../../text/en/contradictions';
import { rowsNamed, type Check } from './check';
import { lineKey, linesOf } from './lines';

/** An engine for lines that no table of lines, series or bodies sets: it is never found there. */
export const engineInNoLine: Check = (tables) => {
	const lines = linesOf(tables);
	return rowsNamed(tables, 'engine').flatMap((row) => {
		const unknown = row.line.filter((name) => !lines.has(lineKey(row.maker, name)));
		return unknown.length === 0
			? []
			: [
					{
						check: 'engine_in_no_line' as const,
						rows: [row.row_key],
						sources: [],
						message: text.engine_in_no_line(unknown.sort())
					}
				];
	});
};
