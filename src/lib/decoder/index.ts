/**
 * The decoder's public face: pure functions over tables that come in as an argument.
 * No I/O, no framework; would run unchanged in a browser.
 */
export type { CompiledRow, CompiledTable, TableSet } from './engine/table-set';
export { tableId } from './engine/table-set';
