/**
 * How a file stands.
 * - `arriving`: more of it is to come
 * - `checking`: it is whole, and waits to be looked at
 * - `ready`: kept
 * - `refused`: not kept, with a reason
 */
export const FILE_STATES = ['arriving', 'checking', 'ready', 'refused'] as const;
export type FileState = (typeof FILE_STATES)[number];

/**
 * Why a file is not kept.
 * - `empty`: it has no bytes
 * - `too_large`: above `FILE_BYTES`
 * - `heic`: a picture in the format of newer phones, which few programs read
 * - `not_taken`: no picture and no PDF, whatever its name says
 * - `too_many_pixels`: above `FILE_PIXELS`
 * - `broken`: it breaks off, or cannot be read as what it begins as
 * - `full`: whoever sent it has no room left
 * - `stopped`: its sender has stopped the check
 * - `unchecked`: the check did not come to an end, again and again
 */
export const FILE_REFUSALS = [
	'empty',
	'too_large',
	'heic',
	'not_taken',
	'too_many_pixels',
	'broken',
	'full',
	'stopped',
	'unchecked'
] as const;
export type FileRefusal = (typeof FILE_REFUSALS)[number];

/** Largest file that is taken, and most pixels of a picture. */
export const FILE_BYTES = 25 * 1024 * 1024;
export const FILE_PIXELS = 100_000_000;

/** What a file may be, by its content. */
export const FILE_TYPES = ['image/jpeg', 'image/png', 'image/webp', 'application/pdf'] as const;
/** What a file is kept as: every picture is written anew. */
export const KEPT_TYPES = ['image/jpeg', 'image/png', 'application/pdf'] as const;
export type KeptType = (typeof KEPT_TYPES)[number];

/**
 * Forms in which a file can be had.
 * - `whole`: as it is kept
 * - `view`: a picture for the screen, 1600 pixels at most
 * - `thumb`: a picture for lists, 320 pixels at most
 */
export const RENDITIONS = ['whole', 'view', 'thumb'] as const;
export type Rendition = (typeof RENDITIONS)[number];

/** How a file stands that a page has sent, as the page is told. */
export interface SentFileState {
	readonly id: string;
	readonly state: FileState;
	/** Why it is not kept; null when it is, or may be. */
	readonly message: string | null;
	/** Where its picture for lists can be seen, for an hour; null when it has none. */
	readonly thumb: string | null;
}
