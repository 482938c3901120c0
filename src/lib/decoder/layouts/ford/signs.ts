/** Characters that stand on the plates, tags and castings of this maker. */
export const DIGITS = '0123456789';
export const LETTERS = 'ABCDEFGHIJKLMNOPQRSTUVWXYZ';
export const ANY = LETTERS + DIGITS;
/** Months of a casting or a tag: I is left out. */
export const MONTHS = 'ABCDEFGHJKLM';
/** Months of a plate: those of a second calendar year go on from N; I and O are left out. */
export const PLATE_MONTHS = 'ABCDEFGHJKLMNPQRSTUVWXYZ';
