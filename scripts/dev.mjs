// npm run dev: the private database and Vite's server, which shows each change at once.
import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { endCommands } from './lib/commands.mjs';
import { fillDatabase, openDatabase } from './lib/own-database.mjs';
import { ensurePackages } from './lib/packages.mjs';
import { ROOT } from './lib/project.mjs';
import { sayError } from './lib/say-error.mjs';
import { authSecret } from './lib/secrets.mjs';
import { step } from './lib/steps.mjs';
import { localOrigin } from './server/origin.mjs';

const HOST = process.env.HOST || '127.0.0.1';
const PORT = process.env.PORT || '5173';

/** @type {import('node:child_process').ChildProcess | undefined} */
let vite;
// Ctrl-C reaches Vite by itself too; a second signal does no harm.
for (const signal of ['SIGINT', 'SIGTERM'])
	process.on(signal, () => {
		endCommands();
		vite?.kill(/** @type {NodeJS.Signals} */ (signal));
	});

async function develop() {
	await step('Packages', async (say) => say((await ensurePackages()) ? 'installed' : 'in place'));
	const database = await openDatabase();
	try {
		await fillDatabase(database);
		vite = spawn(
			process.execPath,
			[
				'node_modules/vite/bin/vite.js',
				'dev',
				...['--host', HOST, '--port', PORT, '--strictPort'],
				...process.argv.slice(2)
			],
			{
				cwd: ROOT,
				stdio: 'inherit',
				env: {
					...process.env,
					HOST,
					PORT,
					ORIGIN: localOrigin(HOST, PORT),
					AUTH_URL: localOrigin(HOST, PORT),
					DATABASE_URL: database.url,
					AUTH_SECRET: process.env.AUTH_SECRET || authSecret(),
					DEMO: process.env.DEMO || 'on'
				}
			}
		);
		const [code] = await once(vite, 'exit');
		return code ?? 0;
	} finally {
		endCommands();
		await database.stop();
	}
}

try {
	process.exitCode = await develop();
} catch (error) {
	sayError(error);
	process.exitCode = 1;
}
