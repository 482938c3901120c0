import type { SchemaStep } from '../migrator';

/** How somebody wants a kind of notice by mail, where they want it otherwise than usual. */
export const step: SchemaStep = {
	up: `
		CREATE TABLE IF NOT EXISTS notice_preferences (
			user_id VARCHAR(32) NOT NULL,
			kind VARCHAR(32) NOT NULL,
			mail ENUM('each', 'digest', 'off') NOT NULL,
			PRIMARY KEY (user_id, kind),
			CONSTRAINT notice_preferences_user FOREIGN KEY (user_id) REFERENCES users (id) ON DELETE CASCADE
		) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin
	`,
	down: 'DROP TABLE IF EXISTS notice_preferences'
};
