import type { SchemaStep } from '../migrator';

/**
 * What a moderator decides for, until when somebody writes nothing and why, to which license they
 * agreed; and who was made up for a demonstration, so that nobody gets in as them elsewhere.
 */
export const step: SchemaStep = {
	up: `
		ALTER TABLE users
			ADD COLUMN IF NOT EXISTS areas JSON NOT NULL DEFAULT '[]' AFTER role,
			ADD COLUMN IF NOT EXISTS paused_until DATETIME(3) NULL AFTER areas,
			ADD COLUMN IF NOT EXISTS pause_reason VARCHAR(300) NULL AFTER paused_until,
			ADD COLUMN IF NOT EXISTS consented_to VARCHAR(32) NULL AFTER pause_reason,
			ADD COLUMN IF NOT EXISTS consented_at DATETIME(3) NULL AFTER consented_to,
			ADD COLUMN IF NOT EXISTS demo BOOLEAN NOT NULL DEFAULT FALSE AFTER consented_at
	`,
	down: `
		ALTER TABLE users
			DROP COLUMN IF EXISTS demo,
			DROP COLUMN IF EXISTS consented_at,
			DROP COLUMN IF EXISTS consented_to,
			DROP COLUMN IF EXISTS pause_reason,
			DROP COLUMN IF EXISTS paused_until,
			DROP COLUMN IF EXISTS areas
	`
};
