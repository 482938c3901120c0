import type { SchemaStep } from '../migrator';

/** One row: whoever makes an edition takes its number here, so that two nodes conflict instead of skipping. */
export const step: SchemaStep = {
	up: `
		CREATE TABLE IF NOT EXISTS edition_counter (
			id TINYINT UNSIGNED NOT NULL,
			number INT UNSIGNED NOT NULL,
			PRIMARY KEY (id),
			CONSTRAINT one_row CHECK (id = 1)
		) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin
	`,
	down: 'DROP TABLE IF EXISTS edition_counter'
};
