import { fault, Refusal } from './refusal';

/** Domain errors that are answers to the asker, by their code: which parameter, and which status. */
const KNOWN: Readonly<
	Record<
		string,
		readonly [status: 400 | 401 | 403 | 404 | 409 | 413 | 422 | 429 | 503, field: string]
	>
> = {
	sign_in_needed: [401, 'session'],
	not_allowed: [403, 'session'],
	second_factor_needed: [403, 'session'],
	paused: [403, 'session'],
	unknown_person: [404, 'id'],
	unknown_session: [404, 'id'],
	changed_meanwhile: [409, 'version'],
	too_often: [429, 'address'],
	unknown_edition: [404, 'edition'],
	unknown_row: [404, 'row_key'],
	unknown_source: [404, 'key'],
	unknown_file: [404, 'id'],
	unknown_job: [404, 'id'],
	unknown_mail: [404, 'id'],
	unknown_notice: [404, 'id'],
	broken_form: [400, 'file'],
	file_refused: [422, 'file'],
	wrong_place: [409, 'file'],
	body_too_large: [413, 'body'],
	storage_away: [503, 'file'],
	no_tables_yet: [503, 'edition'],
	service_busy: [503, 'edition'],
	database_away: [503, 'edition']
};
const RETRY_AFTER_SECONDS = 2;

/** The refusal that an error stands for, or null when it is no answer to anybody. */
export function refusalOf(error: unknown): Refusal | null {
	if (error instanceof Refusal) return error;
	if (!(error instanceof Error) || !('code' in error) || typeof error.code !== 'string')
		return null;
	const known = Object.hasOwn(KNOWN, error.code) ? KNOWN[error.code] : undefined;
	if (known === undefined) return null;
	const [status, field] = known;
	const errors = [fault(field, error.code, error.message)];
	if (status < 429) return new Refusal(status, errors);
	const wait = 'retryAfterSeconds' in error ? Number(error.retryAfterSeconds) : RETRY_AFTER_SECONDS;
	return new Refusal(status, errors, { 'retry-after': String(wait) });
}
