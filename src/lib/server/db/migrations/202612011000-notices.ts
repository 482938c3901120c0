import type { SchemaStep } from '../migrator';

/** What somebody is told. The words are made from template and data each time they are shown. */
export const step: SchemaStep = {
	up: `
		CREATE TABLE IF NOT EXISTS notices (
			id VARCHAR(32) NOT NULL,
			user_id VARCHAR(32) NOT NULL,
			kind VARCHAR(32) NOT NULL,
			template VARCHAR(64) NOT NULL,
			data JSON NOT NULL,
			mail ENUM('each', 'digest', 'off') NOT NULL,
			created_at DATETIME(3) NOT NULL,
			read_at DATETIME(3) NULL,
			archived_at DATETIME(3) NULL,
			digested_at DATETIME(3) NULL,
			PRIMARY KEY (id),
			KEY of_user (user_id, archived_at, created_at),
			KEY for_digest (mail, digested_at, user_id),
			CONSTRAINT notices_user FOREIGN KEY (user_id) REFERENCES users (id) ON DELETE CASCADE
		) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin
	`,
	down: 'DROP TABLE IF EXISTS notices'
};
