import type { SchemaStep } from '../migrator';

/**
 * What a link in a mail is good for, once and until a time. Only its hash is kept. A sign-up has no
 * person yet: its name and consent wait in the detail until the address is confirmed.
 */
export const step: SchemaStep = {
	up: `
		CREATE TABLE IF NOT EXISTS account_tokens (
			hash CHAR(64) NOT NULL,
			purpose VARCHAR(16) NOT NULL,
			user_id VARCHAR(32) NULL,
			address VARCHAR(254) NOT NULL,
			detail JSON NOT NULL,
			created_at DATETIME(3) NOT NULL,
			expires_at DATETIME(3) NOT NULL,
			PRIMARY KEY (hash),
			KEY expiry (expires_at),
			KEY of_user (user_id, purpose),
			CONSTRAINT account_tokens_user FOREIGN KEY (user_id) REFERENCES users (id) ON DELETE CASCADE
		) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin
	`,
	down: 'DROP TABLE IF EXISTS account_tokens'
};
