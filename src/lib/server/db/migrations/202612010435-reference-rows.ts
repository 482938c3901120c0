import type { SchemaStep } from '../migrator';

/**
 * All rows of all tables, in all versions: live from `edition_from` until before `edition_to` (null: live now).
 * Scope columns hold the cells of the released tables: empty is all, several values are joined by `|`.
 * `live_key` is null on closed versions, so that a row is live once at most.
 */
export const step: SchemaStep = {
	up: `
		CREATE TABLE IF NOT EXISTS reference_rows (
			row_key VARCHAR(80) NOT NULL,
			version INT UNSIGNED NOT NULL,
			maker VARCHAR(16) NOT NULL,
			table_name VARCHAR(32) NOT NULL,
			division VARCHAR(400) NOT NULL,
			line VARCHAR(400) NOT NULL,
			body VARCHAR(400) NOT NULL,
			engine VARCHAR(400) NOT NULL,
			plant VARCHAR(400) NOT NULL,
			market VARCHAR(400) NOT NULL,
			years_from SMALLINT UNSIGNED NULL,
			years_to SMALLINT UNSIGNED NULL,
			code VARCHAR(64) NOT NULL,
			meaning VARCHAR(600) CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_520_ci NOT NULL,
			\`values\` JSON NOT NULL,
			note VARCHAR(1200) NOT NULL,
			edition_from INT UNSIGNED NOT NULL,
			edition_to INT UNSIGNED NULL,
			live_key VARCHAR(80) GENERATED ALWAYS AS (CASE WHEN edition_to IS NULL THEN row_key END) VIRTUAL,
			PRIMARY KEY (row_key, version),
			UNIQUE KEY one_live (live_key),
			KEY table_code (maker, table_name, code),
			CONSTRAINT rows_from FOREIGN KEY (edition_from) REFERENCES editions (number),
			CONSTRAINT rows_to FOREIGN KEY (edition_to) REFERENCES editions (number),
			CONSTRAINT rows_span CHECK (edition_to > edition_from),
			CONSTRAINT rows_years CHECK ((years_from IS NULL) = (years_to IS NULL) AND (years_from IS NULL OR years_from <= years_to))
		) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin
	`,
	down: 'DROP TABLE IF EXISTS reference_rows'
};
