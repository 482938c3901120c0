import { randomBytes } from 'node:crypto';
import { hash, verify } from '@node-rs/argon2';

/** Argon2id with 19 MiB and two passes, as OWASP advises. */
const COST = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

/** A password as it is kept. */
export const hashPassword = (password: string): Promise<string> => hash(password, COST);

/** What is compared with where there is no password: it takes as long, and is never right. */
let nobodys: Promise<string> | undefined;

/**
 * Whether a password is the one that is kept. Takes as long where none is kept.
 * @param kept null where nobody has the address, or has no password
 */
export async function isPassword(password: string, kept: string | null): Promise<boolean> {
	const other = await (nobodys ??= hashPassword(randomBytes(32).toString('hex')));
	const right = await verify(kept ?? other, password);
	return right && kept !== null;
}
