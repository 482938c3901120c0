/** Characters of General Motors stamps. */
export const DIGITS = '0123456789';
export const LETTERS = 'ABCDEFGHIJKLMNOPQRSTUVWXYZ';
export const ANY = LETTERS + DIGITS;
