import type { SchemaStep } from '../migrator';

/** Work to be done later or in the background. `once_key` keeps one piece from being queued twice. */
export const step: SchemaStep = {
	up: `
		CREATE TABLE IF NOT EXISTS jobs (
			id VARCHAR(32) NOT NULL,
			kind VARCHAR(64) NOT NULL,
			payload JSON NOT NULL,
			once_key VARCHAR(160) NULL,
			state ENUM('due', 'running', 'done', 'failed') NOT NULL DEFAULT 'due',
			due_at DATETIME(3) NOT NULL,
			taken_by VARCHAR(64) NULL,
			taken_until DATETIME(3) NULL,
			attempts SMALLINT UNSIGNED NOT NULL DEFAULT 0,
			progress SMALLINT UNSIGNED NOT NULL DEFAULT 0,
			last_error VARCHAR(500) NULL,
			created_at DATETIME(3) NOT NULL,
			finished_at DATETIME(3) NULL,
			PRIMARY KEY (id),
			UNIQUE KEY once (once_key),
			KEY next_due (state, due_at)
		) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin
	`,
	down: 'DROP TABLE IF EXISTS jobs'
};
