import { createHash, randomBytes } from 'node:crypto';
import { config } from '../config';

/** An id of a record. */
export const newId = (): string => randomBytes(16).toString('hex');

/** Something that only who holds it can know. In figures of hexadecimal, which a log masks. */
export const newSecret = (): string => randomBytes(32).toString('hex');

/** How a secret is kept: it is long and random, so that no slow hash is needed. */
export const hashOfSecret = (secret: string): string =>
	createHash('sha256').update(secret).digest('hex');

/** The secret of this installation. @throws when none is configured */
export function installationSecret(): string {
	const { authSecret } = config();
	if (authSecret === undefined)
		throw new Error('AUTH_SECRET is not set: nobody can sign in and nothing can be signed.');
	return authSecret;
}
