// npm start: from a fresh clone to a running product. Node built-ins only, until packages are there.
import { endCommands } from './lib/commands.mjs';
import { ensureBuild } from './lib/build.mjs';
import { startLocalServices } from './lib/local-services.mjs';
import { ensureMariadb } from './lib/mariadb.mjs';
import { fillDatabase, openDatabase } from './lib/own-database.mjs';
import { ensurePackages, packagesAreThere } from './lib/packages.mjs';
import { BUILD, LOCAL } from './lib/project.mjs';
import { sayError } from './lib/say-error.mjs';
import { authSecret } from './lib/secrets.mjs';
import { announce, seconds, step } from './lib/steps.mjs';
import { startWorkerProcess } from './lib/worker.mjs';
import { localOrigin } from './server/origin.mjs';
import { checkPort, serve } from './server/serve.mjs';

const LOOPBACK = /^(?:localhost|127(?:\.\d+){3}|::1)$/;

/** What was started, last first, and how to stop it. @type {(() => Promise<void>)[]} */
const toStop = [];
let stopping = false;

/** @param {number} code */
async function stopAll(code) {
	if (stopping) return;
	stopping = true;
	endCommands();
	for (const stop of toStop.splice(0).reverse()) await stop();
	process.exit(code);
}

const SIGNAL_CODES = { SIGINT: 130, SIGTERM: 143, SIGHUP: 129 };
let open = false;
for (const [signal, code] of Object.entries(SIGNAL_CODES))
	process.on(signal, () => {
		if (!stopping) console.log('\n  Stopping …');
		void stopAll(open ? 0 : code);
	});

/** Mail and files of a demonstration stay on this machine, save where the environment names others. */
const openLocalServices = () =>
	step('Mail, files', async (say) => {
		if (process.env.DEMO !== 'on') return say('as the environment says');
		const services = await startLocalServices(LOCAL);
		toStop.push(services.stop);
		const { SMTP_URL, MAILBOX_FOLDER, ...store } = services.environment;
		if (!process.env.SMTP_URL) Object.assign(process.env, { SMTP_URL, MAILBOX_FOLDER });
		if (!process.env.S3_BUCKET) Object.assign(process.env, store);
		say('stay here, in .local');
	});

async function start() {
	const started = performance.now();
	const host = process.env.HOST || '127.0.0.1';
	// Before the long steps, so that nobody waits for a build to hear that the port is taken. What is
	// no port at all, the configuration says later, as of every other variable.
	const port = Number(process.env.PORT || 3000);
	if (Number.isInteger(port) && port >= 0 && port < 65_536)
		// Server and worker both make links, so that they have to know the same port.
		process.env.PORT = String(await checkPort(host, port));

	console.log('Tallyplate');
	// Before the packages too: whoever has to install MariaDB by hand hears it at once.
	if (!process.env.DATABASE_URL) await ensureMariadb(announce);
	if (!packagesAreThere()) announce('Installing packages');
	await step('Packages', async (say) => say((await ensurePackages()) ? 'installed' : 'in place'));
	const database = await openDatabase();
	toStop.push(database.stop);
	process.env.NODE_ENV = 'production';
	process.env.DATABASE_URL = database.url;
	process.env.AUTH_SECRET ||= authSecret();
	process.env.ORIGIN ||= localOrigin(host, process.env.PORT || 3000);
	// Made-up people only where nobody but this machine's user can meet them.
	process.env.DEMO ||= database.own && LOOPBACK.test(host) ? 'on' : 'off';
	// The terminal is for people; LOG_LEVEL=info shows each request.
	process.env.LOG_LEVEL ||= 'warn';
	// One waits for the disk, the other for the processor.
	await Promise.all([
		openLocalServices(),
		fillDatabase(database),
		step('Build', async (say) => say((await ensureBuild()) ? 'built' : 'in place'))
	]);
	const running = await step('Server', async (say) => {
		const running = await serve({ build: BUILD });
		toStop.push(() => running.close('stop'));
		say(`listening on ${host}:${running.port}`);
		return running;
	});
	open = true;
	console.log(`\nOpen ${running.origin}`);
	console.log(
		`Ready after ${seconds(performance.now() - started)}. Ctrl-C stops all that was started.`
	);
	// Nobody waits for it: it takes up what was left for it once it is there.
	await step('Worker', async (say) => {
		const worker = await startWorkerProcess();
		toStop.push(worker.stop);
		say('sends mail and does what takes long');
	});
}

try {
	await start();
} catch (error) {
	// A signal that ends a step is no failure of that step.
	if (!stopping) {
		console.log();
		sayError(error);
		await stopAll(1);
	}
}
