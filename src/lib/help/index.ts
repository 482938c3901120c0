/** Help: our own texts. Kept out of the browser's code: only a server load imports this. */
import howRowsAreRated from './how-rows-are-rated.md';
import howToReadAPlate from './how-to-read-a-plate.md';
import identityPlatesAndTheLaw from './identity-plates-and-the-law.md';
import type { HelpPage } from './pages';
import privacyOfNumbers from './privacy-of-numbers.md';
import whatAReadingTells from './what-a-reading-tells.md';
import whoDecides from './who-decides.md';
import yourAccountAndYourData from './your-account-and-your-data.md';

export type { HelpPage, HelpPart } from './pages';

/** In the order in which somebody with a plate before them needs them. */
export const HELP_PAGES: readonly HelpPage[] = [
	howToReadAPlate,
	whatAReadingTells,
	howRowsAreRated,
	identityPlatesAndTheLaw,
	whoDecides,
	privacyOfNumbers,
	yourAccountAndYourData
];

export const helpPage = (slug: string): HelpPage | undefined =>
	HELP_PAGES.find((page) => page.slug === slug);
