import type { SchemaStep } from '../migrator';

/**
 * The secret that somebody's app makes codes from, sealed; in force once a first code was given. The
 * step of the last code is kept, so that no code is taken twice.
 */
export const step: SchemaStep = {
	up: `
		CREATE TABLE IF NOT EXISTS second_factors (
			user_id VARCHAR(32) NOT NULL,
			sealed_secret VARCHAR(255) NOT NULL,
			created_at DATETIME(3) NOT NULL,
			confirmed_at DATETIME(3) NULL,
			last_step INT UNSIGNED NOT NULL DEFAULT 0,
			PRIMARY KEY (user_id),
			CONSTRAINT second_factors_user FOREIGN KEY (user_id) REFERENCES users (id) ON DELETE CASCADE
		) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin
	`,
	down: 'DROP TABLE IF EXISTS second_factors'
};
