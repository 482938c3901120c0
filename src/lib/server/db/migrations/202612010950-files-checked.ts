import type { SchemaStep } from '../migrator';

/**
 * A file from its first byte to being kept or refused. `bytes` and `sha256` are those of what was sent, which is
 * thrown away once its picture is kept without position data; `kept_bytes` is what is kept.
 */
export const step: SchemaStep = {
	up: `
		ALTER TABLE files
			ADD COLUMN IF NOT EXISTS name VARCHAR(200) CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_520_ci NOT NULL DEFAULT '' AFTER owner,
			ADD COLUMN IF NOT EXISTS state ENUM('arriving', 'checking', 'ready', 'refused') NOT NULL DEFAULT 'arriving' AFTER name,
			ADD COLUMN IF NOT EXISTS refusal VARCHAR(32) NULL AFTER state,
			MODIFY COLUMN media_type VARCHAR(100) NULL,
			MODIFY COLUMN bytes INT UNSIGNED NULL,
			ADD COLUMN IF NOT EXISTS received INT UNSIGNED NOT NULL DEFAULT 0 AFTER bytes,
			ADD COLUMN IF NOT EXISTS kept_bytes INT UNSIGNED NULL AFTER received,
			MODIFY COLUMN sha256 CHAR(64) NULL,
			ADD COLUMN IF NOT EXISTS taken_at VARCHAR(32) NULL AFTER height,
			ADD COLUMN IF NOT EXISTS touched_at DATETIME(3) NULL AFTER created_at,
			DROP KEY IF EXISTS of_owner,
			ADD KEY IF NOT EXISTS files_of_owner (owner, created_at),
			ADD KEY IF NOT EXISTS unfinished (state, touched_at),
			ADD KEY IF NOT EXISTS to_remove (deleted_at)
	`,
	down: `
		ALTER TABLE files
			DROP KEY IF EXISTS to_remove,
			DROP KEY IF EXISTS unfinished,
			ADD KEY IF NOT EXISTS of_owner (owner),
			DROP KEY IF EXISTS files_of_owner,
			DROP COLUMN IF EXISTS touched_at,
			DROP COLUMN IF EXISTS taken_at,
			MODIFY COLUMN sha256 CHAR(64) NOT NULL,
			DROP COLUMN IF EXISTS kept_bytes,
			DROP COLUMN IF EXISTS received,
			MODIFY COLUMN bytes INT UNSIGNED NOT NULL,
			MODIFY COLUMN media_type VARCHAR(100) NOT NULL,
			DROP COLUMN IF EXISTS refusal,
			DROP COLUMN IF EXISTS state,
			DROP COLUMN IF EXISTS name
	`
};
