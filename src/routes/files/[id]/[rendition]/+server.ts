import { Readable } from 'node:stream';
import { fileGround, openFile } from '$lib/server/files';
import { endpoint } from '$lib/server/http';
import type { RequestHandler } from './$types';

/** Nothing in a file runs or loads, whatever a browser takes it for. */
const POLICY = "default-src 'none'; frame-ancestors 'none'; sandbox";

const attributeOf = (name: string): string =>
	`filename="${name.replace(/[^\x20-\x7e]|["\\]/g, '_')}"; filename*=UTF-8''${encodeURIComponent(name).replace(/['()*]/g, (sign) => `%${sign.charCodeAt(0).toString(16)}`)}`;

/** The bytes of a file: pictures for the page as they are, whole files to be saved. */
export const GET: RequestHandler = endpoint(async ({ params, url, locals }) => {
	const file = await openFile(fileGround(), await locals.actor(), {
		...params,
		until: url.searchParams.get('until') ?? '',
		key: url.searchParams.get('key') ?? ''
	});
	const disposition = params.rendition === 'whole' ? 'attachment' : 'inline';
	return new Response(Readable.toWeb(file.body) as ReadableStream, {
		headers: {
			'content-type': file.type,
			'content-length': String(file.bytes),
			'content-disposition': `${disposition}; ${attributeOf(file.name)}`,
			'content-security-policy': POLICY,
			'x-content-type-options': 'nosniff',
			'cache-control': `private, max-age=${file.seconds}`
		}
	});
});
