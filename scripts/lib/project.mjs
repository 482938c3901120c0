// Where things stand in this project.
import { fileURLToPath } from 'node:url';
import { join } from 'node:path';

export const ROOT = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '');

/** What this machine alone keeps: databases, secrets, pictures of tests. Ignored by git. */
export const LOCAL = join(ROOT, '.local');
export const BUILD = join(ROOT, 'build');

/** @param {...string} names a path under the project */
export const inProject = (...names) => join(ROOT, ...names);
