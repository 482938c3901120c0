import type { SchemaStep } from '../migrator';

/**
 * What a version of a row rests on. One source may be cited in several places of it: hence `position`.
 * The source may be in any version, which InnoDB allows a foreign key to say.
 */
export const step: SchemaStep = {
	up: `
		CREATE TABLE IF NOT EXISTS citations (
			row_key VARCHAR(80) NOT NULL,
			version INT UNSIGNED NOT NULL,
			position SMALLINT UNSIGNED NOT NULL,
			source VARCHAR(80) NOT NULL,
			stance ENUM('for', 'against') NOT NULL,
			\`read\` ENUM('whole', 'page', 'excerpt', 'title') NULL,
			locator VARCHAR(200) NOT NULL,
			quotation VARCHAR(400) NOT NULL,
			seen_on DATE NULL,
			PRIMARY KEY (row_key, version, position),
			KEY source (source),
			CONSTRAINT citations_row FOREIGN KEY (row_key, version) REFERENCES reference_rows (row_key, version),
			CONSTRAINT citations_source FOREIGN KEY (source) REFERENCES sources (source_key)
		) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin
	`,
	down: 'DROP TABLE IF EXISTS citations'
};
