import { FILE_BYTES, FILE_PIXELS, type FileRefusal, type FileState } from '../../types';
import { grouped } from './counts';

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
	} satisfies Record<FileState, string>
} as const;
