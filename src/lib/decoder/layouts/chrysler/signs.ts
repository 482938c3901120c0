/** Characters that stand on the plates of this maker. */
export const DIGITS = '0123456789';
export const LETTERS = 'ABCDEFGHIJKLMNOPQRSTUVWXYZ';
export const ANY = LETTERS + DIGITS;
/** First character of a scheduled date: January to September by figure, then A, B, C. */
export const MONTHS = '123456789ABC';
export const FIRST_OF_DAY = '0123';
