import type { SchemaStep } from '../migrator';

/** What a saved reading asked the tables; `row_key` is null for a look-up that found nothing. */
export const step: SchemaStep = {
	up: `
		CREATE TABLE IF NOT EXISTS saved_reading_uses (
			reading_id VARCHAR(32) NOT NULL,
			position SMALLINT UNSIGNED NOT NULL,
			table_name VARCHAR(32) NOT NULL,
			code VARCHAR(64) NOT NULL,
			row_key VARCHAR(80) NULL,
			PRIMARY KEY (reading_id, position),
			KEY looked_up (table_name, code),
			KEY rested_on (row_key),
			CONSTRAINT saved_reading_uses_reading FOREIGN KEY (reading_id) REFERENCES saved_readings (id) ON DELETE CASCADE
		) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin
	`,
	down: 'DROP TABLE IF EXISTS saved_reading_uses'
};
