import type { SchemaStep } from '../migrator';

/** Claims of completeness, versioned like rows. */
export const step: SchemaStep = {
	up: `
		CREATE TABLE IF NOT EXISTS claims (
			claim_key VARCHAR(80) NOT NULL,
			version INT UNSIGNED NOT NULL,
			maker VARCHAR(16) NOT NULL,
			table_name VARCHAR(32) NOT NULL,
			division VARCHAR(400) NOT NULL,
			line VARCHAR(400) NOT NULL,
			years_from SMALLINT UNSIGNED NULL,
			years_to SMALLINT UNSIGNED NULL,
			source VARCHAR(80) NOT NULL,
			note VARCHAR(600) NOT NULL,
			edition_from INT UNSIGNED NOT NULL,
			edition_to INT UNSIGNED NULL,
			live_key VARCHAR(80) GENERATED ALWAYS AS (CASE WHEN edition_to IS NULL THEN claim_key END) VIRTUAL,
			PRIMARY KEY (claim_key, version),
			UNIQUE KEY one_live (live_key),
			KEY source (source),
			CONSTRAINT claims_from FOREIGN KEY (edition_from) REFERENCES editions (number),
			CONSTRAINT claims_to FOREIGN KEY (edition_to) REFERENCES editions (number),
			CONSTRAINT claims_source FOREIGN KEY (source) REFERENCES sources (source_key),
			CONSTRAINT claims_span CHECK (edition_to > edition_from),
			CONSTRAINT claims_years CHECK ((years_from IS NULL) = (years_to IS NULL) AND (years_from IS NULL OR years_from <= years_to))
		) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin
	`,
	down: 'DROP TABLE IF EXISTS claims'
};
