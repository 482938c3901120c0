import { TABLE_NAMES, type TableName } from '$lib/types/tables';

/** The name of a table. */
export const match = (param: string): param is TableName =>
	(TABLE_NAMES as readonly string[]).includes(param);
