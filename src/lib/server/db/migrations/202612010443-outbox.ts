import type { SchemaStep } from '../migrator';

/** Mail to send. `once_key` keeps one notice from being sent twice. */
export const step: SchemaStep = {
	up: `
		CREATE TABLE IF NOT EXISTS outbox (
			id VARCHAR(32) NOT NULL,
			user_id VARCHAR(32) NULL,
			recipient VARCHAR(254) NOT NULL,
			kind VARCHAR(64) NOT NULL,
			subject VARCHAR(300) NOT NULL,
			body_text MEDIUMTEXT NOT NULL,
			body_html MEDIUMTEXT NULL,
			once_key VARCHAR(160) NULL,
			created_at DATETIME(3) NOT NULL,
			due_at DATETIME(3) NOT NULL,
			attempts SMALLINT UNSIGNED NOT NULL DEFAULT 0,
			last_error VARCHAR(500) NULL,
			sent_at DATETIME(3) NULL,
			PRIMARY KEY (id),
			UNIQUE KEY once (once_key),
			KEY to_send (sent_at, due_at),
			CONSTRAINT outbox_user FOREIGN KEY (user_id) REFERENCES users (id) ON DELETE CASCADE
		) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin
	`,
	down: 'DROP TABLE IF EXISTS outbox'
};
