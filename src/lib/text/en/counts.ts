/** 12345 as 12,345. */
export const grouped = (n: number): string => String(n).replace(/\B(?=(\d{3})+$)/g, ',');

/** @example counted(1, 'row', 'rows') // '1 row' */
export const counted = (n: number, one: string, many: string): string =>
	`${grouped(n)} ${n === 1 ? one : many}`;
