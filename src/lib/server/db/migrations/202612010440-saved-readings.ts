import type { SchemaStep } from '../migrator';

/** The result is kept whole: what was told is shown as told. */
export const step: SchemaStep = {
	up: `
		CREATE TABLE IF NOT EXISTS saved_readings (
			id VARCHAR(32) NOT NULL,
			owner VARCHAR(32) NULL,
			kind VARCHAR(16) NOT NULL,
			text VARCHAR(600) NOT NULL,
			context JSON NOT NULL,
			edition INT UNSIGNED NOT NULL,
			reader VARCHAR(64) NOT NULL,
			result JSON NOT NULL,
			version INT UNSIGNED NOT NULL DEFAULT 1,
			saved_at DATETIME(3) NOT NULL,
			PRIMARY KEY (id),
			KEY of_owner (owner, saved_at),
			CONSTRAINT saved_readings_owner FOREIGN KEY (owner) REFERENCES users (id) ON DELETE SET NULL,
			CONSTRAINT saved_readings_edition FOREIGN KEY (edition) REFERENCES editions (number)
		) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin
	`,
	down: 'DROP TABLE IF EXISTS saved_readings'
};
