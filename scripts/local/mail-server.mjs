// The mail server of a demonstration: takes every mail, and sends none on. They are kept as files.
import { createHash } from 'node:crypto';
import { mkdirSync, renameSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { once } from 'node:events';
import { SMTPServer } from 'smtp-server';

const LARGEST_BYTES = 5 * 1024 * 1024;
const MESSAGE_ID = /^message-id:\s*(<[^>\r\n]+>)/im;

/**
 * One file for a Message-ID: a mail that is handed over twice is one, as in a good mail program.
 * @param {string} folder @param {Buffer} mail
 */
function keep(folder, mail) {
	const head = mail.subarray(0, mail.indexOf('\r\n\r\n')).toString('latin1');
	const name = createHash('sha256')
		.update(MESSAGE_ID.exec(head)?.[1] ?? mail)
		.digest('hex')
		.slice(0, 32);
	const file = join(folder, `${name}.eml`);
	writeFileSync(`${file}.part`, mail, { mode: 0o600 });
	renameSync(`${file}.part`, file);
}

/**
 * Starts it on a free port of loopback.
 * @param {string} folder where mails are kept
 * @returns {Promise<{ port: number, close: () => Promise<void> }>}
 */
export async function startMailServer(folder) {
	mkdirSync(folder, { recursive: true, mode: 0o700 });
	const server = new SMTPServer({
		disabledCommands: ['AUTH', 'STARTTLS'],
		size: LARGEST_BYTES,
		disableReverseLookup: true,
		onData(stream, _session, done) {
			/** @type {Buffer[]} */
			const pieces = [];
			stream.on('data', (piece) => pieces.push(piece));
			stream.on('end', () => {
				if (stream.sizeExceeded)
					return done(Object.assign(new Error('too large'), { responseCode: 552 }));
				try {
					keep(folder, Buffer.concat(pieces));
					done();
				} catch (error) {
					done(/** @type {Error} */ (error));
				}
			});
		}
	});
	// A connection that breaks off is the sender's affair.
	server.on('error', () => {});
	server.listen(0, '127.0.0.1');
	await once(server.server, 'listening');
	const address = server.server.address();
	if (!address || typeof address === 'string') throw new Error('no port on loopback');
	return {
		port: address.port,
		close: () => new Promise((done) => server.close(() => done()))
	};
}
