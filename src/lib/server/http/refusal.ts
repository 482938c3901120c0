import type { FieldError } from '../../types';

/** Statuses with which the interface refuses. */
export type RefusalStatus = 400 | 401 | 403 | 404 | 405 | 406 | 409 | 413 | 415 | 422 | 429 | 503;

/** A request that is not answered, and why, parameter by parameter. */
export class Refusal extends Error {
	override readonly name = 'Refusal';
	readonly status: RefusalStatus;
	readonly errors: readonly FieldError[];
	/** Headers that belong to the refusal: Allow, Retry-After. */
	readonly headers: Readonly<Record<string, string>>;

	constructor(
		status: RefusalStatus,
		errors: readonly FieldError[],
		headers: Readonly<Record<string, string>> = {}
	) {
		super(errors.map(({ message }) => message).join(' '));
		this.status = status;
		this.errors = errors;
		this.headers = headers;
	}
}

/** One thing wrong with a request. */
export const fault = (
	field: string,
	code: string,
	message: string,
	accepted: readonly string[] = []
): FieldError => ({ field, code, message, accepted: [...accepted] });

/** The request cannot be understood as written. */
export const malformed = (...errors: FieldError[]): Refusal => new Refusal(400, errors);

/** The request is understood, and asks for something that cannot be. */
export const invalid = (...errors: FieldError[]): Refusal => new Refusal(422, errors);

/** What is asked for does not stand here. */
export const notFound = (...errors: FieldError[]): Refusal => new Refusal(404, errors);
