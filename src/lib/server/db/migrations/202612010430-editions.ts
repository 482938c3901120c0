import type { SchemaStep } from '../migrator';

/** The numbered states of all tables. No two editions have one parent: history never forks. */
export const step: SchemaStep = {
	up: `
		CREATE TABLE IF NOT EXISTS editions (
			number INT UNSIGNED NOT NULL,
			parent INT UNSIGNED NULL,
			digest CHAR(64) NOT NULL,
			cause ENUM('release', 'correction', 'undo') NOT NULL,
			cause_id VARCHAR(64) NULL,
			credits JSON NULL,
			made_at DATETIME(3) NOT NULL,
			PRIMARY KEY (number),
			UNIQUE KEY one_child (parent),
			CONSTRAINT editions_parent FOREIGN KEY (parent) REFERENCES editions (number)
		) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin
	`,
	down: 'DROP TABLE IF EXISTS editions'
};
