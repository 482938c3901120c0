import type { SchemaStep } from '../migrator';

/** Codes that stand in for a lost second factor, each once. Only their hashes are kept. */
export const step: SchemaStep = {
	up: `
		CREATE TABLE IF NOT EXISTS recovery_codes (
			user_id VARCHAR(32) NOT NULL,
			hash CHAR(64) NOT NULL,
			used_at DATETIME(3) NULL,
			PRIMARY KEY (user_id, hash),
			CONSTRAINT recovery_codes_user FOREIGN KEY (user_id) REFERENCES users (id) ON DELETE CASCADE
		) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin
	`,
	down: 'DROP TABLE IF EXISTS recovery_codes'
};
