import { isSignature, signatureOf } from '../signature';

const PURPOSE = 'session';

/**
 * What the cookie of a session carries: the session's own secret, until when, and our signature over both.
 * @param expires seconds since 1970
 */
export function writeSessionToken(secret: string, sid: string, expires: number): string {
	const what = `${sid}.${expires}`;
	return `${what}.${signatureOf(secret, PURPOSE, what)}`;
}

/**
 * The session that a cookie names. Forged and lapsed ones end here, without a query.
 * @returns the session's own secret, or null
 */
export function readSessionToken(secret: string, token: string, now: Date): string | null {
	const [sid, expires, signature, ...more] = token.split('.');
	if (!sid || !expires || !signature || more.length > 0) return null;
	if (!isSignature(secret, PURPOSE, `${sid}.${expires}`, signature)) return null;
	return Number(expires) * 1000 > now.getTime() ? sid : null;
}
