import type { SchemaStep } from '../migrator';

/** Releases that were loaded, each with its whole content (JSON, gzip): the base of the next merge. */
export const step: SchemaStep = {
	up: `
		CREATE TABLE IF NOT EXISTS release_loads (
			number INT UNSIGNED NOT NULL,
			edition INT UNSIGNED NOT NULL,
			digest CHAR(64) NOT NULL,
			content LONGBLOB NOT NULL,
			loaded_at DATETIME(3) NOT NULL,
			PRIMARY KEY (number),
			CONSTRAINT release_loads_edition FOREIGN KEY (edition) REFERENCES editions (number)
		) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin
	`,
	down: 'DROP TABLE IF EXISTS release_loads'
};
