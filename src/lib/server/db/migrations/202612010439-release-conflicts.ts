import type { SchemaStep } from '../migrator';

/** What a release and a correction made here both changed. What stands here stays until a moderator decides. */
export const step: SchemaStep = {
	up: `
		CREATE TABLE IF NOT EXISTS release_conflicts (
			load_number INT UNSIGNED NOT NULL,
			kind ENUM('row', 'source', 'claim') NOT NULL,
			entry_key VARCHAR(80) NOT NULL,
			reason ENUM('added_in_both', 'changed_in_both', 'retired_here', 'retired_in_release', 'still_cited') NOT NULL,
			base JSON NULL,
			theirs JSON NULL,
			ours JSON NULL,
			resolved_at DATETIME(3) NULL,
			resolved_by VARCHAR(32) NULL,
			PRIMARY KEY (load_number, kind, entry_key),
			KEY open_ones (resolved_at),
			CONSTRAINT release_conflicts_load FOREIGN KEY (load_number) REFERENCES release_loads (number),
			CONSTRAINT release_conflicts_user FOREIGN KEY (resolved_by) REFERENCES users (id)
		) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin
	`,
	down: 'DROP TABLE IF EXISTS release_conflicts'
};
