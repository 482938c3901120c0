import type { SchemaStep } from '../migrator';

/** Limits that hold across processes and nodes (sign-in, mail, writes). */
export const step: SchemaStep = {
	up: `
		CREATE TABLE IF NOT EXISTS shared_counters (
			counter_key VARCHAR(160) NOT NULL,
			window_from DATETIME(3) NOT NULL,
			used INT UNSIGNED NOT NULL,
			expires_at DATETIME(3) NOT NULL,
			PRIMARY KEY (counter_key, window_from),
			KEY expiry (expires_at)
		) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin
	`,
	down: 'DROP TABLE IF EXISTS shared_counters'
};
