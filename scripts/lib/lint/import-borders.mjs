// An ESLint rule: which part of src may import which, and why not the others.
import { posix, relative, sep } from 'node:path';
import { ROOT } from '../project.mjs';

/**
 * @typedef {object} Border
 * @property {RegExp} from paths of the files that it binds
 * @property {RegExp} [except] files among them that it does not bind
 * @property {RegExp} into what they may not import: paths in the project, or names of packages
 * @property {RegExp} [allowed] what among it they may import all the same
 * @property {string} why
 */

const TESTS = /\.test\.\w+$/;
/** A subject of the server is a folder; what stands beside them is for all. */
const SUBJECT = 'src/lib/server/([^/]+)/';

/** @type {Border[]} */
export const BORDERS = [
	{
		from: /^src\/lib\/decoder\//,
		except: TESTS,
		into: /./,
		allowed: /^src\/lib\/(?:decoder|types|text)(?:\/|$)/,
		why: 'The decoder is pure, so that it runs unchanged in a browser and a reading is a function of its arguments: it imports lib/decoder, lib/types and lib/text, and nothing else.'
	},
	{
		from: /^src\/lib\/types\//,
		except: TESTS,
		into: /./,
		allowed: /^(?:zod(?:\/.*)?|src\/lib\/types(?:\/.*)?)$/,
		why: 'Everything imports lib/types, so it imports nothing but zod.'
	},
	{
		from: /^src\/lib\//,
		into: /^src\/(?:routes|hooks)/,
		why: 'Imports go one way: routes → lib/server/<subject> → lib/server/db, lib/decoder → lib/types.'
	},
	{
		from: /^src\/lib\/server\//,
		except: TESTS,
		into: /^src\/lib\/components/,
		why: 'The server knows no parts of pages: it hands out data.'
	},
	{
		from: /^src\/(?:routes\/|hooks)/,
		into: /^src\/lib\/server\/db(?:\/|$)/,
		why: 'A route guards, reads its input, makes one call and maps the result; what asks the database is a subject of lib/server.'
	},
	{
		from: /^src\/(?:routes\/|hooks)/,
		into: /^src\/lib\/server\/[^/]+\/(?!index(?:\.ts)?$)/,
		why: 'The index.ts of a subject is what it offers; behind it, it may change.'
	},
	{
		from: /^src\//,
		except: /^src\/lib\/server\/db\/(?:models|repositories)\/|^src\/lib\/server\/db\/[^/]+$/,
		into: /^src\/lib\/server\/db\/models(?:\/|$)/,
		why: 'Only repositories ask models, so that every query stands in one place.'
	},
	{
		from: /^src\//,
		except: /^src\/lib\/server\/db\//,
		into: /^(?:sequelize|mariadb|umzug)(?:\/|$)/,
		why: 'Only lib/server/db speaks to the database; others call its repositories.'
	},
	{
		from: /^src\/(?!lib\/server\/config\.ts$)/,
		into: /^\$env\//,
		why: 'lib/server/config.ts is the only reader of the environment: it checks each variable and says what is wrong.'
	}
];

/** One subject's files may not look behind another's index; db/repositories is open to all of them. */
const NEIGHBOUR_WHY =
	'A subject of lib/server shows its index.ts; behind it, it may change. Import that, or add there what is missing.';
const OPEN_PARTS = /^src\/lib\/server\/db\/repositories(?:\/index(?:\.ts)?)?$/;

/**
 * The path that an import names, from the project's root on; a package keeps its name.
 * @param {string} specifier @param {string} file the importing file, from the root on
 */
function targetOf(specifier, file) {
	if (specifier.startsWith('.')) return posix.join(posix.dirname(file), specifier);
	if (specifier === '$lib') return 'src/lib';
	return specifier.replace(/^\$lib\//, 'src/lib/');
}

/**
 * Why a file may not import something, or null.
 * @param {string} file @param {string} specifier
 */
export function borderBetween(file, specifier) {
	const target = targetOf(specifier, file);
	for (const { from, except, into, allowed, why } of BORDERS)
		if (from.test(file) && !except?.test(file) && into.test(target) && !allowed?.test(target))
			return why;
	const own = new RegExp(`^${SUBJECT}`).exec(file)?.[1];
	const other = new RegExp(`^${SUBJECT}(?!index(?:\\.ts)?$)`).exec(target)?.[1];
	if (own && other && own !== other && !OPEN_PARTS.test(target)) return NEIGHBOUR_WHY;
	return null;
}

/** @type {import('eslint').Rule.RuleModule} */
export const importBorders = {
	meta: {
		type: 'problem',
		docs: { description: 'keep imports going one way' },
		messages: { border: '{{ specifier }} may not be imported here. {{ why }}' },
		schema: []
	},
	create(context) {
		const file = relative(ROOT, context.filename).split(sep).join('/');
		/** @param {any} node */
		const check = ({ source }) => {
			if (typeof source?.value !== 'string') return;
			const why = borderBetween(file, source.value);
			if (why)
				context.report({
					node: source,
					messageId: 'border',
					data: { specifier: source.value, why }
				});
		};
		return {
			ImportDeclaration: check,
			ImportExpression: check,
			ExportNamedDeclaration: check,
			ExportAllDeclaration: check
		};
	}
};
