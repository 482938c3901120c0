/** Kinds of work that files ask for. */
export const CHECK = 'check_file';
export const REMOVE = 'remove_files';
