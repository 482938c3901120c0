// Serves the build with the database that DATABASE_URL names: what a deployment runs.
import { fileURLToPath } from 'node:url';
import { sayError } from '../lib/say-error.mjs';
import { serve } from './serve.mjs';

const build = fileURLToPath(new URL('../../build', import.meta.url));

try {
	const running = await serve({ build });
	console.log(`Tallyplate is at ${running.origin} (port ${running.port})`);
	for (const signal of ['SIGINT', 'SIGTERM'])
		process.once(signal, () => void running.close(signal).then(() => process.exit(0)));
} catch (error) {
	sayError(error);
	process.exit(1);
}
