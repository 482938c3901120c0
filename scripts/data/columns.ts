/** The columns of every file of the data folder, in the order in which they stand. */
export const ROW_COLUMNS = [
	'row_key',
	'division',
	'line',
	'body',
	'engine',
	'plant',
	'market',
	'years_from',
	'years_to',
	'code',
	'meaning',
	'values',
	'note'
] as const;

export const CITATION_COLUMNS = [
	'row_key',
	'source',
	'stance',
	'read',
	'locator',
	'quotation',
	'seen_on'
] as const;

export const SOURCE_COLUMNS = [
	'key',
	'title',
	'publisher',
	'year',
	'kind',
	'seen_at',
	'licence',
	'repeats'
] as const;

export const CLAIM_COLUMNS = [
	'claim_key',
	'maker',
	'table',
	'division',
	'line',
	'years_from',
	'years_to',
	'source',
	'note'
] as const;

export const MAPPING_COLUMNS = ['family', 'area', 'field', 'table'] as const;

export const CANDIDATE_COLUMNS = [
	'candidate',
	'area',
	'field',
	'digest',
	'outcome',
	'targets'
] as const;

export const REJECTED_COLUMNS = [
	'candidate',
	'division',
	'years',
	'area',
	'field',
	'code',
	'meaning',
	'reason'
] as const;

export const EXCEPTION_COLUMNS = ['check', 'rows', 'digest', 'source', 'reason'] as const;

export const SOURCES_FILE = 'sources.csv';
export const CLAIMS_FILE = 'claims.csv';
export const MAPPING_FILE = 'mapping.csv';
export const CANDIDATES_FILE = 'candidates.csv';
export const REJECTED_FILE = 'REJECTED.csv';

/** Questions that are closed; a folder without any goes without the file. */
export const EXCEPTIONS_FILE = 'exceptions.csv';

/** The other files beside the makers' folders. Each of them has to be there. */
export const ROOT_FILES = [
	SOURCES_FILE,
	CLAIMS_FILE,
	MAPPING_FILE,
	CANDIDATES_FILE,
	REJECTED_FILE
] as const;

export const rowsFile = (maker: string, table: string): string => `${maker}/${table}.csv`;
export const citationsFile = (maker: string, table: string): string =>
	`${maker}/${table}.citations.csv`;
