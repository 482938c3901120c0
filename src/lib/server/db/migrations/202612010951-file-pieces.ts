import type { SchemaStep } from '../migrator';

/** What has arrived of a file, piece by piece, until it is whole. */
export const step: SchemaStep = {
	up: `
		CREATE TABLE IF NOT EXISTS file_pieces (
			file_id VARCHAR(32) NOT NULL,
			at_byte INT UNSIGNED NOT NULL,
			bytes INT UNSIGNED NOT NULL,
			object_key VARCHAR(160) NOT NULL,
			PRIMARY KEY (file_id, at_byte),
			CONSTRAINT file_pieces_file FOREIGN KEY (file_id) REFERENCES files (id) ON DELETE CASCADE
		) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin
	`,
	down: 'DROP TABLE IF EXISTS file_pieces'
};
