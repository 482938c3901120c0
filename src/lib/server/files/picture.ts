import type { Sharp, SharpOptions } from 'sharp';
import { FILE_PIXELS, type KeptType } from '../../types';
import { FileRefusedError } from './errors';
import { takenAt } from './taken';

/** A picture as it is kept, in all its sizes. */
export interface Picture {
	readonly type: KeptType;
	readonly width: number;
	readonly height: number;
	readonly takenAt: string | null;
	readonly whole: Buffer;
	/** JPEG, 1600 pixels at most. */
	readonly view: Buffer;
	/** JPEG, 320 pixels at most. */
	readonly thumb: Buffer;
}

const VIEW_PIXELS = 1600;
const THUMB_PIXELS = 320;
const QUALITY = { whole: 90, view: 82, thumb: 76 };
/** A picture that takes longer was made to. */
const TIMEOUT_S = 90;

/** Formats whose readers are switched on; all others, vector formats above all, cannot even be tried. */
const READERS = [
	'VipsForeignLoadJpegBuffer',
	'VipsForeignLoadJpegFile',
	'VipsForeignLoadPngBuffer',
	'VipsForeignLoadPngFile',
	'VipsForeignLoadWebpBuffer',
	'VipsForeignLoadWebpFile'
];

type Open = (input: string | Buffer) => Sharp;
let library: Promise<Open> | undefined;

async function loadLibrary(): Promise<Open> {
	const { default: sharp } = await import('sharp');
	sharp.block({ operation: ['VipsForeignLoad'] });
	sharp.unblock({ operation: READERS });
	// Memory is what is short, not time: one thread, nothing kept, rows read as they are needed.
	sharp.concurrency(1);
	sharp.cache(false);
	const options: SharpOptions = {
		limitInputPixels: FILE_PIXELS,
		sequentialRead: true,
		failOn: 'error',
		pages: 1
	};
	return (input) => sharp(input, options).timeout({ seconds: TIMEOUT_S });
}

/**
 * Writes a picture anew: upright, in sRGB, without what the camera added, its position above all.
 * What moves or has several pages is kept as its first picture.
 * @param path a file on disk, which is read in order and never held whole
 * @throws {FileRefusedError} too many pixels (told from its head, before any is decoded), or broken
 */
export async function pictureOf(path: string): Promise<Picture> {
	const open = await (library ??= loadLibrary());
	try {
		const { format, width = 0, height = 0, exif, hasAlpha } = await open(path).metadata();
		if (width * height > FILE_PIXELS) throw new FileRefusedError('too_many_pixels');
		// Reports want one of two formats. What came without loss stays so.
		const asPng = format === 'png' || hasAlpha;
		const upright = open(path).autoOrient();
		const written = asPng
			? upright.png({ compressionLevel: 6 })
			: upright.jpeg({ quality: QUALITY.whole });
		const { data: whole, info } = await written.toBuffer({ resolveWithObject: true });
		const view = await smaller(open(whole), VIEW_PIXELS, QUALITY.view);
		return {
			type: asPng ? 'image/png' : 'image/jpeg',
			width: info.width,
			height: info.height,
			takenAt: exif === undefined ? null : takenAt(exif),
			whole,
			view,
			thumb: await smaller(open(view), THUMB_PIXELS, QUALITY.thumb)
		};
	} catch (error) {
		if (error instanceof FileRefusedError) throw error;
		// The library says whatever is wrong with a picture in words alone.
		const pixels = /exceeds pixel limit/.test((error as Error).message);
		throw new FileRefusedError(pixels ? 'too_many_pixels' : 'broken', { cause: error });
	}
}

const smaller = (picture: Sharp, most: number, quality: number): Promise<Buffer> =>
	picture
		.resize(most, most, { fit: 'inside', withoutEnlargement: true })
		.flatten({ background: '#ffffff' })
		.jpeg({ quality })
		.toBuffer();
