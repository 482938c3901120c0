import { createHmac, timingSafeEqual } from 'node:crypto';

/**
 * What a signature is good for. One made for one purpose is worth nothing for another.
 * - `session`: a session's cookie
 * - `unsubscribe`: no more mails of a kind
 * - `file`: the bytes of a file, until a time
 */
export type Purpose = 'session' | 'unsubscribe' | 'file';

/** Signs a text: HMAC-SHA-256 in base64url, 43 characters. */
export const signatureOf = (secret: string, purpose: Purpose, text: string): string =>
	createHmac('sha256', secret).update(`${purpose}\0${text}`).digest('base64url');

/** Whether a signature is ours, told in the same time however much of it is right. */
export function isSignature(
	secret: string,
	purpose: Purpose,
	text: string,
	signature: string
): boolean {
	const expected = Buffer.from(signatureOf(secret, purpose, text));
	const given = Buffer.from(signature);
	return given.length === expected.length && timingSafeEqual(given, expected);
}
