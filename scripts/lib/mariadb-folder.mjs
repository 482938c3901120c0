// The folder of a private MariaDB server: its data, its port and passwords, and who runs it.
import { spawn } from 'node:child_process';
import { randomBytes } from 'node:crypto';
import { once } from 'node:events';
import { existsSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { SetupError } from './debian.mjs';

const STOP_TIMEOUT_MS = 20_000;

/**
 * What the folder of a private server remembers between starts.
 * @typedef {{ port: number, rootPassword: string, password: string }} Access
 */

/** A port on loopback that nobody holds now. @returns {Promise<number>} */
async function freePort() {
	const probe = createServer().listen(0, '127.0.0.1');
	await once(probe, 'listening');
	const address = probe.address();
	await new Promise((done) => probe.close(done));
	if (!address || typeof address === 'string') throw new Error('no port on loopback');
	return address.port;
}

/** @param {number} port @returns {Promise<boolean>} */
async function isFree(port) {
	const probe = createServer();
	const free = await new Promise((done) => {
		probe.once('error', () => done(false));
		probe.listen(port, '127.0.0.1', () => done(true));
	});
	if (free) await new Promise((done) => probe.close(done));
	return free;
}

/**
 * Port and passwords of a folder: made once, the port anew when somebody else holds it.
 * @param {string} dir
 * @returns {Promise<Access>}
 */
export async function accessOf(dir) {
	const file = join(dir, 'access.json');
	/** @type {Access} */
	const access = existsSync(file)
		? JSON.parse(readFileSync(file, 'utf8'))
		: {
				port: 0,
				rootPassword: randomBytes(24).toString('hex'),
				password: randomBytes(24).toString('hex')
			};
	if (!access.port || !(await isFree(access.port))) access.port = await freePort();
	writeFileSync(file, JSON.stringify(access), { mode: 0o600 });
	return access;
}

/** @param {number} pid */
function isAlive(pid) {
	try {
		process.kill(pid, 0);
		return true;
	} catch (error) {
		// EPERM: there, and somebody else's.
		return /** @type {NodeJS.ErrnoException} */ (error).code === 'EPERM';
	}
}

/**
 * Whether a process is the server of this folder, and not one that got its number later.
 * @param {number} pid @param {string} dir
 */
function servesFolder(pid, dir) {
	if (!isAlive(pid)) return false;
	const commandLine = `/proc/${pid}/cmdline`;
	return !existsSync(commandLine) || readFileSync(commandLine, 'utf8').includes(dir);
}

/**
 * Port and passwords of the server that runs in a folder; undefined when none does.
 * @param {string} dir
 * @returns {Access | undefined}
 */
export function runningAccess(dir) {
	const file = join(dir, 'owner.json');
	if (!existsSync(file)) return undefined;
	const { server } = JSON.parse(readFileSync(file, 'utf8'));
	if (!server || !servesFolder(server, dir)) return undefined;
	return JSON.parse(readFileSync(join(dir, 'access.json'), 'utf8'));
}

/** @param {number} pid @param {number} timeoutMs */
async function gone(pid, timeoutMs) {
	for (const until = Date.now() + timeoutMs; isAlive(pid) && Date.now() < until;) await pause(25);
	return !isAlive(pid);
}

/**
 * One server per folder: refuses while its starter lives, ends one that outlived its starter.
 * @param {string} dir
 */
export async function takeFolder(dir) {
	const file = join(dir, 'owner.json');
	if (existsSync(file)) {
		const { owner, server, socketFolder } = JSON.parse(readFileSync(file, 'utf8'));
		if (owner !== process.pid && isAlive(owner) && (!server || servesFolder(server, dir)))
			throw new SetupError(
				`Process ${owner} already runs a database server in ${dir}. Stop that one first.`
			);
		if (server && servesFolder(server, dir)) {
			if (owner === process.pid)
				throw new SetupError(`This process already runs a database server in ${dir}.`);
			process.kill(server, 'SIGTERM');
			if (!(await gone(server, STOP_TIMEOUT_MS)))
				throw new SetupError(`The database server ${server} in ${dir} does not stop.`);
		}
		if (socketFolder) rmSync(socketFolder, { recursive: true, force: true });
		rmSync(file, { force: true });
	}
	try {
		writeFileSync(file, JSON.stringify({ owner: process.pid }), { flag: 'wx' });
	} catch (error) {
		if (/** @type {NodeJS.ErrnoException} */ (error).code !== 'EEXIST') throw error;
		throw new SetupError(`Another command is starting a database server in ${dir} just now.`);
	}
	return file;
}

/**
 * Makes the data of a server once. An interrupted run leaves nothing that looks finished.
 * @param {string} installer @param {string} data
 */
export async function makeDataFolder(installer, data) {
	if (existsSync(data)) return;
	const unfinished = `${data}.new`;
	rmSync(unfinished, { recursive: true, force: true });
	const child = spawn(
		installer,
		[
			'--no-defaults',
			`--datadir=${unfinished}`,
			'--auth-root-authentication-method=normal',
			'--skip-test-db',
			...(process.getuid?.() === 0 ? ['--user=root'] : [])
		],
		{ stdio: ['ignore', 'pipe', 'pipe'] }
	);
	let output = '';
	child.stdout.on('data', (part) => (output += part));
	child.stderr.on('data', (part) => (output += part));
	const [code] = await once(child, 'close');
	if (code === 0) return renameSync(unfinished, data);
	rmSync(unfinished, { recursive: true, force: true });
	throw new SetupError(`The database folder could not be made: ${output.trim().slice(-400)}`);
}
