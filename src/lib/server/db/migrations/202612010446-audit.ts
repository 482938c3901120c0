import type { SchemaStep } from '../migrator';

/** Append-only. Each entry carries the hash of the one before, and no two entries follow the same one. */
export const step: SchemaStep = {
	up: `
		CREATE TABLE IF NOT EXISTS audit (
			number INT UNSIGNED NOT NULL,
			hash_before CHAR(64) NOT NULL,
			hash CHAR(64) NOT NULL,
			actor VARCHAR(32) NULL,
			action VARCHAR(64) NOT NULL,
			subject_kind VARCHAR(32) NOT NULL,
			subject_id VARCHAR(96) NOT NULL,
			detail JSON NOT NULL,
			at DATETIME(3) NOT NULL,
			PRIMARY KEY (number),
			UNIQUE KEY one_after (hash_before),
			UNIQUE KEY hash (hash),
			KEY of_subject (subject_kind, subject_id),
			CONSTRAINT audit_actor FOREIGN KEY (actor) REFERENCES users (id)
		) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin
	`,
	down: 'DROP TABLE IF EXISTS audit'
};
