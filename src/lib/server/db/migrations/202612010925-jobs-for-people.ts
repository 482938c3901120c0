import type { SchemaStep } from '../migrator';

/** For whom a piece of work is done, how far it is and of how much, where to go on, and that it shall stop. */
export const step: SchemaStep = {
	up: `
		ALTER TABLE jobs
			ADD COLUMN IF NOT EXISTS user_id VARCHAR(32) NULL AFTER payload,
			MODIFY COLUMN state ENUM('due', 'running', 'done', 'failed', 'stopped') NOT NULL DEFAULT 'due',
			MODIFY COLUMN progress INT UNSIGNED NOT NULL DEFAULT 0,
			ADD COLUMN IF NOT EXISTS total INT UNSIGNED NULL AFTER progress,
			ADD COLUMN IF NOT EXISTS checkpoint JSON NULL AFTER total,
			ADD COLUMN IF NOT EXISTS stop_asked_at DATETIME(3) NULL AFTER checkpoint,
			ADD KEY IF NOT EXISTS of_user (user_id, created_at),
			ADD CONSTRAINT FOREIGN KEY IF NOT EXISTS jobs_user (user_id) REFERENCES users (id) ON DELETE CASCADE
	`,
	down: `
		ALTER TABLE jobs
			DROP FOREIGN KEY IF EXISTS jobs_user,
			DROP KEY IF EXISTS of_user,
			DROP COLUMN IF EXISTS stop_asked_at,
			DROP COLUMN IF EXISTS checkpoint,
			DROP COLUMN IF EXISTS total,
			MODIFY COLUMN progress SMALLINT UNSIGNED NOT NULL DEFAULT 0,
			MODIFY COLUMN state ENUM('due', 'running', 'done', 'failed') NOT NULL DEFAULT 'due',
			DROP COLUMN IF EXISTS user_id
	`
};
