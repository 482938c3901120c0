// What stands in the build as files: which paths they have, and the policies of prerendered pages.
import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { join, relative, sep } from 'node:path';

/** @param {string} folder @returns {string[]} paths from the folder on, beginning with a slash */
function filesIn(folder) {
	if (!existsSync(folder)) return [];
	return readdirSync(folder, { recursive: true, withFileTypes: true })
		.filter((entry) => entry.isFile() && !/\.(?:br|gz)$/.test(entry.name))
		.map((entry) => {
			const path = join(entry.parentPath ?? entry.path, entry.name);
			return `/${relative(folder, path).split(sep).join('/')}`;
		});
}

const META_POLICY = /<meta http-equiv="content-security-policy" content="([^"]*)"/i;

/** @param {string} attribute */
const unescaped = (attribute) =>
	attribute.replaceAll('&#39;', "'").replaceAll('&quot;', '"').replaceAll('&amp;', '&');

/**
 * @typedef {object} ClientFiles
 * @property {ReadonlySet<string>} paths of files that are sent as they are
 * @property {ReadonlyMap<string, string>} policies by path of a prerendered page
 */

/**
 * Walks a build once.
 * @param {string} build the folder that the build was written to
 * @returns {ClientFiles}
 */
export function readClientFiles(build) {
	/** @type {Map<string, string>} */
	const policies = new Map();
	const prerendered = join(build, 'prerendered');
	for (const path of filesIn(prerendered)) {
		if (!path.endsWith('.html')) continue;
		const [, policy] = META_POLICY.exec(readFileSync(join(prerendered, path), 'utf8')) ?? [];
		if (policy === undefined) continue;
		// A policy in the page cannot forbid framing; the header that repeats it can.
		const header = `${unescaped(policy)}; frame-ancestors 'none'`;
		const page = path.replace(/(?:index)?\.html$/, '');
		for (const form of [path, page, page.replace(/\/$/, ''), `${page}/`])
			policies.set(form, header);
	}
	return { paths: new Set(filesIn(join(build, 'client'))), policies };
}
