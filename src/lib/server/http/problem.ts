import type { FieldError, ProblemDetails } from '../../types';
import type { Refusal } from './refusal';

const TITLES: Readonly<Record<number, string>> = {
	400: 'Bad Request',
	401: 'Unauthorized',
	403: 'Forbidden',
	404: 'Not Found',
	405: 'Method Not Allowed',
	406: 'Not Acceptable',
	409: 'Conflict',
	413: 'Content Too Large',
	415: 'Unsupported Media Type',
	422: 'Unprocessable Content',
	429: 'Too Many Requests',
	431: 'Request Header Fields Too Large',
	500: 'Internal Server Error',
	503: 'Service Unavailable'
};

const PROBLEM_TYPE = 'application/problem+json';

/** Problem details (RFC 9457) of a status. */
const problemDetails = (
	status: number,
	detail: string,
	errors: readonly FieldError[] = []
): ProblemDetails => ({
	type: 'about:blank',
	title: TITLES[status] ?? 'Error',
	status,
	detail,
	errors: [...errors]
});

/** A response that says what is wrong. Never kept by a cache; readable by any origin. */
export const problemResponse = (
	status: number,
	detail: string,
	errors: readonly FieldError[] = [],
	headers: Readonly<Record<string, string>> = {}
): Response =>
	new Response(JSON.stringify(problemDetails(status, detail, errors)), {
		status,
		headers: {
			'content-type': PROBLEM_TYPE,
			'cache-control': 'no-store',
			'access-control-allow-origin': '*',
			...headers
		}
	});

/** The response of a refusal. */
export const refuse = (refusal: Refusal): Response =>
	problemResponse(refusal.status, refusal.message, refusal.errors, refusal.headers);
