import type { SchemaStep } from '../migrator';

/** Not a default of the table: the row has to be there to be locked. */
export const step: SchemaStep = {
	up: 'INSERT IGNORE INTO edition_counter (id, number) VALUES (1, 0)',
	down: 'DELETE FROM edition_counter WHERE id = 1'
};
