/** What asking for reference data can end in, beside an answer. Each has a stable `code`. */
export { DatabaseAwayError } from '../db';

/** There is no edition of that number. */
export class UnknownEditionError extends Error {
	readonly code = 'unknown_edition';
	override readonly name = 'UnknownEditionError';
	constructor(readonly edition: number) {
		super(`There is no edition ${edition}.`);
	}
}

/** No edition has a row of that key, or the edition asked about has not. */
export class UnknownRowError extends Error {
	readonly code = 'unknown_row';
	override readonly name = 'UnknownRowError';
	constructor(readonly row_key: string) {
		super(`There is no row ${row_key}.`);
	}
}

/** The edition has no source of that key. */
export class UnknownSourceError extends Error {
	readonly code = 'unknown_source';
	override readonly name = 'UnknownSourceError';
	constructor(readonly key: string) {
		super(`There is no source ${key}.`);
	}
}

/** Nothing was compiled yet: the process has just started, or no release was ever loaded. */
export class NoTablesYetError extends Error {
	readonly code = 'no_tables_yet';
	override readonly name = 'NoTablesYetError';
	constructor() {
		super('No tables are loaded yet.');
	}
}

/** More older editions are being compiled than can be waited for. */
export class ServiceBusyError extends Error {
	readonly code = 'service_busy';
	override readonly name = 'ServiceBusyError';
	/** For a Retry-After header. */
	readonly retryAfterSeconds = 2;
	constructor() {
		super('Other editions are being made ready; try again shortly.');
	}
}

/** A release contradicts itself and cannot become an edition. */
export class InvalidReleaseError extends Error {
	readonly code = 'invalid_release';
	override readonly name = 'InvalidReleaseError';
}
