import type { SchemaStep } from '../migrator';

/** Versioned like rows. `live_key` is null on closed versions, so that a work is live once at most. */
export const step: SchemaStep = {
	up: `
		CREATE TABLE IF NOT EXISTS sources (
			source_key VARCHAR(80) NOT NULL,
			version INT UNSIGNED NOT NULL,
			title VARCHAR(300) CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_520_ci NOT NULL,
			publisher VARCHAR(200) CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_520_ci NOT NULL,
			year SMALLINT UNSIGNED NULL,
			kind VARCHAR(32) NOT NULL,
			seen_at VARCHAR(500) NOT NULL,
			licence VARCHAR(200) NOT NULL,
			repeats VARCHAR(80) NULL,
			edition_from INT UNSIGNED NOT NULL,
			edition_to INT UNSIGNED NULL,
			live_key VARCHAR(80) GENERATED ALWAYS AS (CASE WHEN edition_to IS NULL THEN source_key END) VIRTUAL,
			PRIMARY KEY (source_key, version),
			UNIQUE KEY one_live (live_key),
			KEY repeats (repeats),
			CONSTRAINT sources_from FOREIGN KEY (edition_from) REFERENCES editions (number),
			CONSTRAINT sources_to FOREIGN KEY (edition_to) REFERENCES editions (number),
			CONSTRAINT sources_span CHECK (edition_to > edition_from)
		) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin
	`,
	down: 'DROP TABLE IF EXISTS sources'
};
