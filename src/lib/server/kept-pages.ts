import { current } from './reference';

/** With this a page says of itself what it was made from; the own server keeps it while that is the present. */
export const KEPT_WHILE = 'x-kept-while';

/** What the pages of readings are made from, beside the build: the edition, and the year that the form ends with. */
export const presentPages = (now = new Date()): string =>
	`${current().head.number}.${now.getUTCFullYear()}`;
