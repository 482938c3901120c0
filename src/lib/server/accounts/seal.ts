import { createCipheriv, createDecipheriv, hkdfSync, randomBytes } from 'node:crypto';

const CIPHER = 'aes-256-gcm';
const IV_BYTES = 12;
const TAG_BYTES = 16;

const keyOf = (secret: string): Buffer =>
	Buffer.from(hkdfSync('sha256', secret, '', 'tallyplate second factor', 32));

/** Seals a text, so that whoever reads the database alone does not read it. */
export function seal(secret: string, text: string): string {
	const iv = randomBytes(IV_BYTES);
	const cipher = createCipheriv(CIPHER, keyOf(secret), iv);
	const sealed = Buffer.concat([cipher.update(text, 'utf8'), cipher.final()]);
	return Buffer.concat([iv, cipher.getAuthTag(), sealed]).toString('base64url');
}

/** Opens what was sealed. @throws when it was changed, or sealed with another secret */
export function unseal(secret: string, sealed: string): string {
	const bytes = Buffer.from(sealed, 'base64url');
	const decipher = createDecipheriv(CIPHER, keyOf(secret), bytes.subarray(0, IV_BYTES));
	decipher.setAuthTag(bytes.subarray(IV_BYTES, IV_BYTES + TAG_BYTES));
	const text = decipher.update(bytes.subarray(IV_BYTES + TAG_BYTES));
	return Buffer.concat([text, decipher.final()]).toString('utf8');
}
