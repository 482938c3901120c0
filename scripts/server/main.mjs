// Serves the build with the database that DATABASE_URL names: what a deployment runs.
import { sayError } from '../lib/say-error.mjs';
import { BUILD } from '../lib/project.mjs';
import { serve } from './serve.mjs';

/** @type {import('./serve.mjs').Running | undefined} */
let running;

/** @param {NodeJS.Signals} signal */
async function end(signal) {
	await running?.close(signal);
	process.exit(0);
}
// Before it says that it listens: whoever hears that may end it at once.
process.on('SIGINT', end);
process.on('SIGTERM', end);

try {
	running = await serve({ build: BUILD });
	console.log(`Tallyplate is at ${running.origin} (port ${running.port})`);
} catch (error) {
	sayError(error);
	process.exit(1);
}
