/** Scope in a column: empty is all, several values are joined as in the released tables. */
export const toCell = (values: readonly string[]): string => [...values].sort().join('|');
export const fromCell = (cell: string): string[] => (cell === '' ? [] : cell.split('|'));
