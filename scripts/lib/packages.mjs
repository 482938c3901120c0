// The packages of package-lock.json.
import { existsSync, readFileSync } from 'node:fs';
import { findProgram } from './debian.mjs';
import { run, succeed } from './commands.mjs';
import { inProject } from './project.mjs';

/** @typedef {Record<string, { version?: string, integrity?: string, optional?: boolean }>} Packages */

/** @param {string} name @returns {Packages} */
const packagesIn = (name) => JSON.parse(readFileSync(inProject(name), 'utf8')).packages;

/** Whether node_modules holds what the lock asks for; npm writes its own account at the end of its work. */
export function packagesAreThere() {
	const account = 'node_modules/.package-lock.json';
	if (!existsSync(inProject(account))) return false;
	const [wanted, there] = [packagesIn('package-lock.json'), packagesIn(account)];
	delete wanted[''];
	return (
		Object.keys(there).every((path) => path in wanted) &&
		Object.entries(wanted).every(([path, { version, integrity, optional }]) => {
			const found = there[path];
			// Of packages for other systems there is no trace.
			if (!found) return optional === true;
			return found.version === version && found.integrity === integrity;
		})
	);
}

/**
 * Installs the packages when they are missing or the lock has changed.
 * @returns {Promise<boolean>} whether anything was installed
 * @throws {import('./commands.mjs').CommandError}
 */
export async function ensurePackages() {
	if (packagesAreThere()) return false;
	// The build needs what serves development too, whatever NODE_ENV says.
	const args = ['ci', '--include=dev', '--no-audit', '--no-fund'];
	await succeed(`npm ${args.join(' ')}`, run(findProgram('npm') ?? 'npm', args));
	return true;
}
