/**
 * Files: they come in parts that can be gone on with, are checked by the worker, and are shown to their owner
 * alone, at addresses that run out.
 */
export { fileAddress, openFile, type FileBytes } from './address';
export { arrivalFor, endFile, expectFile, takePart, type Arrival } from './arrivals';
export { checkFileKind } from './check';
export { BrokenFormError, FileRefusedError, UnknownFileError, WrongPlaceError } from './errors';
export { takeFileOfForm } from './form';
export { configuredStore, fileGround, type FileGround } from './ground';
export { deleteFile, fileFor, filesFor, settledFileFor, type OwnFile } from './mine';
export { giveUpAbandoned, queueRemoval, removeFilesKind } from './removal';
export { s3Store } from './s3-store';
export { MissingObjectError, NO_STORE, StorageAwayError, type Store } from './store';
export { answerTus } from './tus';
