/**
 * Sends mail and does background work with the database that DATABASE_URL names, until it is ended.
 * Any number of them may run beside each other.
 *   node --import tsx scripts/worker.ts
 */
import { config } from '../src/lib/server/config';
import { configuredStore } from '../src/lib/server/files';
import { clearGround, layGround } from '../src/lib/server/ground';
import { log } from '../src/lib/server/log';
import { smtpPost } from '../src/lib/server/mail';
import { startWorker } from '../src/lib/server/worker';
import { kindsFor, REPEATED } from '../src/lib/server/work';
import { sayError } from './lib/say-error.mjs';

// The versions of packages are pinned until a newer Node is what we run on.
process.env['AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED'] = 'true';

function start() {
	const { databaseUrl, smtpUrl, mailFrom } = config();
	if (smtpUrl === undefined) log().warn('SMTP_URL is not set: mail waits in the outbox');
	return startWorker({
		...layGround(databaseUrl),
		log: log(),
		post: smtpUrl === undefined ? null : smtpPost(smtpUrl, mailFrom),
		kinds: kindsFor(configuredStore()),
		repeated: REPEATED
	});
}

try {
	const worker = start();
	let ending = false;
	const end = async (): Promise<void> => {
		if (ending) return;
		ending = true;
		await worker.stop();
		await clearGround();
		await new Promise((done) => log().flush(done));
		process.exit(0);
	};
	for (const signal of ['SIGTERM', 'SIGINT'] as const) process.on(signal, () => void end());
	// Whoever started it is gone.
	process.on('disconnect', () => void end());
	process.on('unhandledRejection', (error) => log().error({ err: error }, 'unhandled rejection'));
	process.send?.('ready');
} catch (error) {
	sayError(error);
	process.exitCode = 1;
}
