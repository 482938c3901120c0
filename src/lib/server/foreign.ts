const READS = new Set(['GET', 'HEAD', 'OPTIONS']);
/** What a page elsewhere can have a browser send without asking first. */
const FORM = /^(?:application\/x-www-form-urlencoded|multipart\/form-data|text\/plain)\b/i;
/** Mail programs send this form by themselves (RFC 8058); what is signed in its address is all that counts. */
const ONE_CLICK = '/unsubscribe';

/**
 * Whether a request that changes something comes from a page elsewhere, in the name of whoever looks at it.
 * Browsers say where such a request comes from; one that does not say is a program's, which sends no form.
 */
export function isForeign({ method, headers }: Request, url: URL): boolean {
	if (READS.has(method)) return false;
	const origin = headers.get('origin');
	if (origin !== null) return origin !== url.origin;
	return FORM.test(headers.get('content-type') ?? '') && url.pathname !== ONE_CLICK;
}
