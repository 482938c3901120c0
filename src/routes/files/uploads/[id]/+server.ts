/** The same protocol for one file: HEAD asks how far it is, PATCH sends more, DELETE gives it up. */
export { fallback } from '../+server';
