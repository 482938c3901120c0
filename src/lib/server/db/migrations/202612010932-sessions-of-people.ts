import type { SchemaStep } from '../migrator';

/**
 * What somebody knows a session by in the list of theirs, and whether the second factor was given in
 * it. The role goes: it is asked of the person, so that a change counts from the next request on.
 */
export const step: SchemaStep = {
	up: `
		ALTER TABLE sessions
			DROP COLUMN IF EXISTS role,
			ADD COLUMN IF NOT EXISTS device VARCHAR(120) NOT NULL AFTER user_id,
			ADD COLUMN IF NOT EXISTS way VARCHAR(16) NOT NULL AFTER device,
			ADD COLUMN IF NOT EXISTS code_given_at DATETIME(3) NULL AFTER way,
			ADD COLUMN IF NOT EXISTS seen_at DATETIME(3) NOT NULL AFTER created_at
	`,
	down: `
		ALTER TABLE sessions
			DROP COLUMN IF EXISTS seen_at,
			DROP COLUMN IF EXISTS code_given_at,
			DROP COLUMN IF EXISTS way,
			DROP COLUMN IF EXISTS device,
			ADD COLUMN IF NOT EXISTS role ENUM('member', 'moderator', 'administrator') NOT NULL AFTER user_id
	`
};
