import type { SchemaStep } from '../migrator';

/** A deleted account keeps its row without name and address: corrections stand under "a former member". */
export const step: SchemaStep = {
	up: `
		CREATE TABLE IF NOT EXISTS users (
			id VARCHAR(32) NOT NULL,
			name VARCHAR(120) CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_520_ci NULL,
			email VARCHAR(254) NULL,
			email_verified_at DATETIME(3) NULL,
			password_hash VARCHAR(255) NULL,
			role ENUM('member', 'moderator', 'administrator') NOT NULL DEFAULT 'member',
			version INT UNSIGNED NOT NULL DEFAULT 1,
			created_at DATETIME(3) NOT NULL,
			deleted_at DATETIME(3) NULL,
			PRIMARY KEY (id),
			UNIQUE KEY email (email)
		) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin
	`,
	down: 'DROP TABLE IF EXISTS users'
};
