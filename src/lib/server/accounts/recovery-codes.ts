import { createHmac, randomBytes } from 'node:crypto';
import { installationSecret } from './secrets';

const HOW_MANY = 10;
/** Base 32 without letters that look like figures. */
const LETTERS = 'ABCDEFGHIJKLMNOPQRSTUVWXYZ234567';
const LENGTH = 10;

/** New codes, each of ten letters: fifty bits. */
export const newRecoveryCodes = (): readonly string[] =>
	Array.from({ length: HOW_MANY }, () =>
		Array.from(randomBytes(LENGTH), (byte) => LETTERS[byte % LETTERS.length]).join('')
	);

/** How a code is kept: with the secret of the installation, as fifty bits could be tried out. */
export const hashOfRecoveryCode = (code: string): string =>
	createHmac('sha256', installationSecret()).update(`recovery\0${code}`).digest('hex');
