import { readdir, readFile, stat } from 'node:fs/promises';
import { join } from 'node:path';
import type { AddressObject } from 'mailparser';
import { config } from '../config';

/** A mail of the demonstration, as it stands in a list. */
export interface KeptMail {
	readonly id: string;
	readonly to: string;
	readonly from: string;
	readonly subject: string;
	readonly at: Date;
}

/** A mail of the demonstration in full. */
export interface KeptMailInFull extends KeptMail {
	readonly text: string;
	readonly html: string | null;
	readonly unsubscribe: string | null;
}

/** There is no such mail, or no mailbox: only a demonstration has one. */
export class UnknownMailError extends Error {
	readonly code = 'unknown_mail';
	override readonly name = 'UnknownMailError';
	constructor() {
		super('There is no such mail.');
	}
}

const FILE = /^([0-9a-f]{32})\.eml$/;
/** Shown in a list; older ones stay in the folder. */
const MOST = 100;

const addressesOf = (addresses: AddressObject | AddressObject[] | undefined): string =>
	[addresses ?? []]
		.flat()
		.map(({ text }) => text)
		.join(', ');

async function parsed(folder: string, id: string): Promise<KeptMailInFull> {
	const file = join(folder, `${id}.eml`);
	// Only a demonstration needs it.
	const { simpleParser } = await import('mailparser');
	const [mail, { mtime }] = await Promise.all([
		// Links and pictures in it are none of our business: nothing is fetched or made up for the text.
		simpleParser(await readFile(file), { skipHtmlToText: true, skipTextToHtml: true }),
		stat(file)
	]);
	const list = mail.headers.get('list') as { unsubscribe?: { url?: string } } | undefined;
	return {
		id,
		to: addressesOf(mail.to),
		from: addressesOf(mail.from),
		subject: mail.subject ?? '',
		at: mtime,
		text: mail.text ?? '',
		html: mail.html || null,
		unsubscribe: list?.unsubscribe?.url ?? null
	};
}

/** The folder that a demonstration keeps its mail in. @throws {UnknownMailError} this is none */
export function demoMailbox(): string {
	const { demo, mailboxFolder } = config();
	if (!demo || mailboxFolder === undefined) throw new UnknownMailError();
	return mailboxFolder;
}

/** The mails of a mailbox folder, newest first. */
export async function keptMails(folder: string): Promise<KeptMail[]> {
	const ids = (await readdir(folder)).flatMap((name) => FILE.exec(name)?.[1] ?? []);
	const dated = await Promise.all(
		ids.map(async (id) => ({ id, at: (await stat(join(folder, `${id}.eml`))).mtimeMs }))
	);
	const newest = dated.sort((a, b) => b.at - a.at).slice(0, MOST);
	return Promise.all(newest.map(({ id }) => parsed(folder, id)));
}

/** One mail of a mailbox folder. @throws {UnknownMailError} */
export async function keptMail(folder: string, id: string): Promise<KeptMailInFull> {
	if (!FILE.test(`${id}.eml`)) throw new UnknownMailError();
	try {
		return await parsed(folder, id);
	} catch (error) {
		if ((error as NodeJS.ErrnoException).code === 'ENOENT') throw new UnknownMailError();
		throw error;
	}
}
