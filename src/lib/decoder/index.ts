/**
 * The decoder's public face: pure functions over tables that come in as an argument.
 * No I/O, no framework; would run unchanged in a browser.
 */
export { examineText, mostCharacters, normalise, type TextFault } from './engine/characters';
export {
	checkDigitOf,
	VALUES as CHECK_DIGIT_VALUES,
	WEIGHTS as CHECK_DIGIT_WEIGHTS
} from './engine/check-digit';
export { compareRows, overlaps, sameContent, saysTheSame } from './engine/compare';
export { compile, compileInSteps } from './engine/compile';
export { scopeText } from './engine/field';
export type { Layout } from './engine/layout';
export { strengthOf } from './engine/strength';
export {
	rowsInYear,
	tableId,
	type CodeEntry,
	type CompiledRow,
	type CompiledTable,
	type TableSet
} from './engine/table-set';
export { LAYOUTS } from './layouts';
export { LINED_LAYOUTS } from './layouts/lined';
export type { LinedKind, LinedLayout } from './engine/lined-layout';
export { hasLines, linesOf } from './engine/lines';
export { read, type ReadRequest } from './read';
export { readStamps, type StampsRequest } from './read-stamps';
export { candidatesOf } from './serial-reading';
