import type { SchemaStep } from '../migrator';

/**
 * Who sends a mail just now and until when it is theirs; when it was given up; and what has to be the
 * same each time that it is tried: its Message-ID, and where it can be unsubscribed from.
 */
export const step: SchemaStep = {
	up: `
		ALTER TABLE outbox
			ADD COLUMN IF NOT EXISTS message_id VARCHAR(320) NOT NULL DEFAULT '' AFTER kind,
			ADD COLUMN IF NOT EXISTS unsubscribe_url VARCHAR(500) NULL AFTER body_html,
			ADD COLUMN IF NOT EXISTS taken_by VARCHAR(64) NULL AFTER due_at,
			ADD COLUMN IF NOT EXISTS taken_until DATETIME(3) NULL AFTER taken_by,
			ADD COLUMN IF NOT EXISTS failed_at DATETIME(3) NULL AFTER sent_at
	`,
	down: `
		ALTER TABLE outbox
			DROP COLUMN IF EXISTS failed_at,
			DROP COLUMN IF EXISTS taken_until,
			DROP COLUMN IF EXISTS taken_by,
			DROP COLUMN IF EXISTS unsubscribe_url,
			DROP COLUMN IF EXISTS message_id
	`
};
