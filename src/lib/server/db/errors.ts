import {
	ConnectionAcquireTimeoutError,
	ConnectionError,
	DatabaseError,
	TimeoutError
} from 'sequelize';

/** The database cannot be reached; what is kept in memory still answers. */
export class DatabaseAwayError extends Error {
	readonly code = 'database_away';
	constructor(cause: unknown) {
		super('The database cannot be reached.', { cause });
		this.name = 'DatabaseAwayError';
	}
}

/** The server closed or lost the connection, or is shutting down. */
const LOST = new Set([
	'ECONNREFUSED',
	'ECONNRESET',
	'EPIPE',
	'ER_CMD_CONNECTION_CLOSED',
	'ER_CONNECTION_KILLED',
	'ER_CONNECTION_TIMEOUT',
	'ER_SERVER_SHUTDOWN',
	'ER_SOCKET_BAD_PORT',
	'ER_SOCKET_TIMEOUT',
	'ER_SOCKET_UNEXPECTED_CLOSE'
]);

/** Whether an error says that the database is not there, as opposed to a statement that it refuses. */
export function isAway(error: unknown): boolean {
	if (error instanceof DatabaseAwayError) return true;
	if (error instanceof ConnectionError || error instanceof ConnectionAcquireTimeoutError)
		return true;
	if (!(error instanceof DatabaseError) || error instanceof TimeoutError) return false;
	return LOST.has((error.parent as { code?: string }).code ?? '');
}

/** Runs something that asks the database; the many errors of a lost one become one. */
export async function asking<T>(ask: () => Promise<T>): Promise<T> {
	try {
		return await ask();
	} catch (error) {
		if (isAway(error)) throw new DatabaseAwayError(error);
		throw error;
	}
}
