import { filesText } from '../../text/en/files';
import type { FileRefusal } from '../../types';

/** There is no such file, or it is somebody else's, or its address has run out or was never ours. */
export class UnknownFileError extends Error {
	readonly code = 'unknown_file';
	override readonly name = 'UnknownFileError';
	constructor() {
		super(filesText.unknown);
	}
}

/** The file is not kept, and why. */
export class FileRefusedError extends Error {
	readonly code = 'file_refused';
	override readonly name = 'FileRefusedError';
	constructor(
		readonly refusal: FileRefusal,
		options?: ErrorOptions
	) {
		super(filesText.refusals[refusal], options);
	}
}

/** What came does not begin where the file ends so far: somebody else sent that part, or it came before. */
export class WrongPlaceError extends Error {
	readonly code = 'wrong_place';
	override readonly name = 'WrongPlaceError';
	constructor() {
		super(filesText.wrongPlace);
	}
}

/** What was sent is no file, or breaks off before its end. */
export class BrokenFormError extends Error {
	readonly code = 'broken_form';
	override readonly name = 'BrokenFormError';
	constructor(readonly why: 'no_file' | 'breaks_off') {
		super(filesText.brokenForm[why]);
	}
}
