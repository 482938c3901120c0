import type { SchemaStep } from '../migrator';

/** Looked up once in a request, and only when the cookie is there. */
export const step: SchemaStep = {
	up: `
		CREATE TABLE IF NOT EXISTS sessions (
			id VARCHAR(64) NOT NULL,
			user_id VARCHAR(32) NOT NULL,
			role ENUM('member', 'moderator', 'administrator') NOT NULL,
			created_at DATETIME(3) NOT NULL,
			expires_at DATETIME(3) NOT NULL,
			revoked_at DATETIME(3) NULL,
			PRIMARY KEY (id),
			KEY of_user (user_id),
			KEY expiry (expires_at),
			CONSTRAINT sessions_user FOREIGN KEY (user_id) REFERENCES users (id) ON DELETE CASCADE
		) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin
	`,
	down: 'DROP TABLE IF EXISTS sessions'
};
