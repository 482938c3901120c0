import {
	FILE_BYTES,
	FILE_PIXELS,
	type FaultTexts,
	type FileRefusal,
	type FileState,
	type KeptType
} from '../../types';
import { counted, grouped } from './counts';

const MEGABYTES = FILE_BYTES / 1024 ** 2;
const MEGAPIXELS = FILE_PIXELS / 1e6;

const refusals: Readonly<Record<FileRefusal, string>> = {
	empty: 'This file is empty. Choose it again, or take another one.',
	too_large: `This file has more than ${MEGABYTES} MB. Save it smaller, as a JPEG of good quality, and send that.`,
	heic: 'This is a HEIC picture, which few programs read. On the iPhone: Settings, Camera, Formats, Most Compatible; then new pictures come as JPEG. For this one: open it, choose Export or Save as, and take JPEG.',
	not_taken:
		'This is no JPEG, PNG, WebP or PDF, whatever its name says. Save a picture as JPEG, and paper as PDF.',
	too_many_pixels: `This picture has more than ${MEGAPIXELS} megapixels. Save it smaller and send that.`,
	broken:
		'This file breaks off or is damaged. Open it on your side: if it looks whole there, save it anew and send that.',
	full: 'You have no room left for it. Delete files that you no longer need, or let those that are on their way arrive first.',
	stopped: 'You have stopped the check of this file. Send it again if you want it kept.',
	unchecked:
		'This file could not be checked, though we have tried several times. It is on record; send it again, or save it as a JPEG first.'
};

const SIZES = ['B', 'kB', 'MB', 'GB'] as const;

/** @example sizeOf(1_572_864) // '1.5 MB' */
export function sizeOf(bytes: number): string {
	let size = bytes;
	let unit = 0;
	while (size >= 1000 && unit < SIZES.length - 1) {
		size /= 1024;
		unit += 1;
	}
	return `${size < 10 && unit > 0 ? size.toFixed(1) : grouped(Math.round(size))} ${SIZES[unit]}`;
}

/** What is said about files: their page, the field that takes them, what is refused. */
export const filesText = {
	refusals,
	unknown: 'There is no such file, or its address has run out. Open the page that shows it again.',
	wrongPlace: 'This part of the file has arrived already, or another one is missing before it.',
	brokenForm: {
		no_file: 'No file was chosen.',
		breaks_off: 'The file broke off on its way. Nothing of it was kept; send it again.'
	},
	protocol: 'This upload was not understood. Load the page again and choose the file once more.',
	away: 'The file store does not answer. Nothing that is kept in it is lost; try again in a minute.',
	states: {
		arriving: 'on its way',
		checking: 'being checked',
		ready: 'kept',
		refused: 'not kept'
	} satisfies Record<FileState, string>,
	title: 'Your files',
	intro:
		'Photographs of plates, stamps and papers. Nobody else sees them until you put them beside a car or a correction. Pictures are turned upright, and the place where they were taken is removed.',
	crumbs: 'The way to this page',
	field: {
		label: 'Add files',
		one: 'Add a file',
		hint: `JPEG, PNG, WebP or PDF, up to ${MEGABYTES} MB and ${MEGAPIXELS} megapixels each.`,
		choose: 'Choose files',
		send: 'Send it',
		dropped: 'or drop them here',
		list: 'Files that you are sending',
		waits: 'waits its turn',
		sending: (percent: number) => `${percent} % sent`,
		checking: 'sent, being checked',
		ready: 'kept',
		broken: 'The line broke. What was sent so far is kept; it goes on when you try again.',
		progress: (name: string) => `How much of ${name} is sent`,
		again: 'Try again',
		againNamed: (name: string) => `Try ${name} again`,
		stop: 'Stop',
		stopNamed: (name: string) => `Stop sending ${name}`,
		dismiss: 'Dismiss',
		dismissNamed: (name: string) => `Dismiss what is said about ${name}`
	},
	nothing: 'No files yet',
	nothingBody:
		'Begin with the serial plate: a photograph from straight in front, without flash, so that every character can be read.',
	listed: 'Your files, newest first',
	count: (n: number) => counted(n, 'file', 'files'),
	kinds: {
		'image/jpeg': 'JPEG',
		'image/png': 'PNG',
		'application/pdf': 'PDF'
	} satisfies Record<KeptType, string>,
	measures: (width: number, height: number) => `${grouped(width)} × ${grouped(height)} pixels`,
	taken: (moment: string) => `taken ${moment}`,
	sent: (date: string) => `sent ${date}`,
	digest: 'SHA-256 of what you sent',
	open: 'Open',
	openNamed: (name: string) => `Open ${name}`,
	save: 'Save',
	saveNamed: (name: string) => `Save ${name}`,
	remove: 'Delete',
	removeNamed: (name: string) => `Delete ${name}`,
	giveUp: 'Give up',
	giveUpNamed: (name: string) => `Give up ${name}`,
	kept: (name: string) => `“${name}” is kept.`,
	checking: (name: string) => `“${name}” has arrived, and is being checked.`,
	notKept: (name: string) => `“${name}” was not kept. The reason stands beside it.`,
	deleted: 'The file is deleted.'
} as const;

/** Sentences about the field that takes files, by the code of what went wrong. */
export const fileFaults: FaultTexts = {
	file: { ...refusals, ...filesText.brokenForm, storage_away: filesText.away }
};
