// Digests of sources, to know whether what was made from them is still good.
import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { inProject } from './project.mjs';

/** @param {string} path @returns {string[]} files, in the order of their paths */
function filesUnder(path) {
	if (!existsSync(path)) return [];
	if (!statSync(path).isDirectory()) return [path];
	return readdirSync(path, { recursive: true, withFileTypes: true })
		.filter((entry) => entry.isFile() && !/\.test\.\w+$/.test(entry.name))
		.map((entry) => join(entry.parentPath ?? entry.path, entry.name))
		.sort();
}

/**
 * SHA-256 over path and content of files and folders of the project; tests do not count.
 * @param {string[]} names @returns {string}
 */
export function digestOf(names) {
	const hash = createHash('sha256');
	for (const name of names)
		for (const file of filesUnder(inProject(name)))
			hash.update(`${file}\0`).update(readFileSync(file)).update('\0');
	return hash.digest('hex');
}

/** Whether a stamp file holds this digest. @param {string} file @param {string} digest */
export const isStamped = (file, digest) =>
	existsSync(file) && readFileSync(file, 'utf8') === digest;

/** @param {string} file @param {string} digest */
export function stamp(file, digest) {
	mkdirSync(dirname(file), { recursive: true });
	writeFileSync(file, digest);
}
