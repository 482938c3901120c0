import type { SchemaStep } from '../migrator';

/** Uploads; the bytes are in the file store under `storage_key`. */
export const step: SchemaStep = {
	up: `
		CREATE TABLE IF NOT EXISTS files (
			id VARCHAR(32) NOT NULL,
			owner VARCHAR(32) NULL,
			storage_key VARCHAR(160) NOT NULL,
			media_type VARCHAR(100) NOT NULL,
			bytes INT UNSIGNED NOT NULL,
			sha256 CHAR(64) NOT NULL,
			width SMALLINT UNSIGNED NULL,
			height SMALLINT UNSIGNED NULL,
			created_at DATETIME(3) NOT NULL,
			deleted_at DATETIME(3) NULL,
			PRIMARY KEY (id),
			UNIQUE KEY storage_key (storage_key),
			KEY of_owner (owner),
			CONSTRAINT files_owner FOREIGN KEY (owner) REFERENCES users (id) ON DELETE SET NULL
		) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin
	`,
	down: 'DROP TABLE IF EXISTS files'
};
