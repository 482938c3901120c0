import { FILE_TYPES, type FileRefusal } from '../../types';

/** As many bytes as it takes to know what a file is. */
export const HEAD_BYTES = 4_100;

type Taken = (typeof FILE_TYPES)[number];

/** What somebody's phone writes unless told otherwise. */
const HEIC = /^image\/hei[cf]/;

/**
 * What a file is by its first bytes, whatever its name and its sender say.
 * @param head `HEAD_BYTES` of it, or all of it when it has fewer
 */
export async function contentOf(
	head: Uint8Array
): Promise<{ readonly type: Taken } | { readonly refusal: FileRefusal }> {
	if (head.length === 0) return { refusal: 'empty' };
	const { fileTypeFromBuffer } = await import('file-type');
	const found = await fileTypeFromBuffer(head);
	const mime = found?.mime as string | undefined;
	if (mime !== undefined && HEIC.test(mime)) return { refusal: 'heic' };
	// A PNG that moves is a PNG; its first picture is kept.
	const type = FILE_TYPES.find((one) => one === (mime === 'image/apng' ? 'image/png' : mime));
	return type === undefined ? { refusal: 'not_taken' } : { type };
}
