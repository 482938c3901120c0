import { holds, REVALIDATE } from './caching';

export interface Kept {
	readonly etag: string;
	readonly cacheControl?: string;
	/** Further headers, such as Vary and Link. */
	readonly headers?: Readonly<Record<string, string>>;
}

const ANY_ORIGIN = '*';

/**
 * Answers with JSON, or with 304 when the asker still holds it. The value is made only when it is
 * needed, and written once.
 */
export const answerJson = (request: Request, kept: Kept, make: () => unknown): Response =>
	answerWritten(request, kept, () => JSON.stringify(make()));

/** As `answerJson`, for what writes itself, as text or in UTF-8. */
export function answerWritten(
	request: Request,
	kept: Kept,
	write: () => string | Uint8Array<ArrayBuffer>
): Response {
	const { etag, cacheControl = REVALIDATE } = kept;
	if (holds(request.headers.get('if-none-match'), etag)) return notModified(kept);
	const body = write();
	return new Response(body, {
		headers: {
			'content-type': 'application/json',
			'content-length': String(Buffer.byteLength(body)),
			'cache-control': cacheControl,
			etag,
			'access-control-allow-origin': ANY_ORIGIN,
			...kept.headers
		}
	});
}

/** Answers a POST with JSON, which nobody keeps. */
export function answerPosted(value: unknown): Response {
	const body = JSON.stringify(value);
	return new Response(body, {
		headers: {
			'content-type': 'application/json',
			'content-length': String(Buffer.byteLength(body)),
			'cache-control': 'no-store',
			'access-control-allow-origin': ANY_ORIGIN
		}
	});
}

/** As `answerJson`, for a table as CSV with a name to save it under. */
export function answerCsv(
	request: Request,
	kept: Kept,
	filename: string,
	make: () => string
): Response {
	if (holds(request.headers.get('if-none-match'), kept.etag)) return notModified(kept);
	return new Response(make(), {
		headers: {
			'content-type': 'text/csv; charset=utf-8; header=present',
			'content-disposition': `attachment; filename="${filename}"`,
			'cache-control': kept.cacheControl ?? REVALIDATE,
			etag: kept.etag,
			'access-control-allow-origin': ANY_ORIGIN,
			...kept.headers
		}
	});
}

const notModified = ({ etag, cacheControl = REVALIDATE, headers }: Kept): Response =>
	new Response(null, {
		status: 304,
		headers: {
			'cache-control': cacheControl,
			etag,
			'access-control-allow-origin': ANY_ORIGIN,
			...(headers?.vary && { vary: headers.vary })
		}
	});
