/** Help: our own texts. Kept out of the browser's code: only a server load imports this. */
import axleCodes from './axle-codes.md';
import bodyTags from './body-tags.md';
import castingNumbersAndDates from './casting-numbers-and-dates.md';
import engineStamps from './engine-stamps.md';
import glassAndPartDates from './glass-and-part-dates.md';
import howRowsAreRated from './how-rows-are-rated.md';
import howToReadAPlate from './how-to-read-a-plate.md';
import identityPlatesAndTheLaw from './identity-plates-and-the-law.md';
import type { HelpPage } from './pages';
import privacyOfNumbers from './privacy-of-numbers.md';
import singleCodes from './single-codes.md';
import transmissionStamps from './transmission-stamps.md';
import whatAReadingTells from './what-a-reading-tells.md';
import whoDecides from './who-decides.md';
import yourAccountAndYourData from './your-account-and-your-data.md';

export type { HelpPage, HelpPart } from './pages';

/** In the order in which somebody with a plate before them needs them. */
export const HELP_PAGES: readonly HelpPage[] = [
	howToReadAPlate,
	bodyTags,
	engineStamps,
	castingNumbersAndDates,
	transmissionStamps,
	axleCodes,
	glassAndPartDates,
	singleCodes,
	whatAReadingTells,
	howRowsAreRated,
	identityPlatesAndTheLaw,
	whoDecides,
	privacyOfNumbers,
	yourAccountAndYourData
];

export const helpPage = (slug: string): HelpPage | undefined =>
	HELP_PAGES.find((page) => page.slug === slug);
