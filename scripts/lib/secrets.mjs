// Secrets of this machine, made once and kept, so that a new start signs nobody out.
import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { LOCAL } from './project.mjs';

/** @returns {string} */
export function authSecret() {
	const file = join(LOCAL, 'auth-secret');
	if (existsSync(file)) return readFileSync(file, 'utf8').trim();
	const secret = randomBytes(32).toString('base64url');
	mkdirSync(dirname(file), { recursive: true });
	writeFileSync(file, secret, { mode: 0o600 });
	return secret;
}
