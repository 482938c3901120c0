/** What the reading page shows for an address. */
import { readingAddress, type ReadingQuery } from '$lib/format/addresses';
import { Refusal } from '$lib/server/http';
import { readAgainst, readRequest } from '$lib/server/readings';
import { current, editionAt } from '$lib/server/reference';
import { entryText } from '$lib/text/en/entry';
import { answerView } from './answer-view';
import { corporationOf, makerChoice, makerNameOf, makerOptions, yearOptions } from './choices';
import type { AskedView, EmptyView, FieldFault, ReadingPage } from './page-data';
import { viewOf } from './view';

const PARAMETERS = ['kind', 'text', 'maker', 'year', 'edition', 'reading'] as const;
type Asked = Partial<Record<(typeof PARAMETERS)[number], string>>;

/** The parameters that we know; what a link from elsewhere adds is passed over. */
function askedOf(parameters: URLSearchParams): Asked {
	const asked: Asked = {};
	for (const name of PARAMETERS) {
		const value = parameters.get(name);
		if (value !== null && value.trim() !== '') asked[name] = value;
	}
	return asked;
}

const queryOf = (asked: Asked, text: string): ReadingQuery => ({
	kind: asked.kind,
	text,
	maker: asked.maker,
	year: asked.year,
	edition: asked.edition
});
const shownIndex = (asked: Asked): number => Math.max(0, (Number(asked.reading) || 1) - 1);

/**
 * Where a question belongs when it is not written the usual way, as a form without script writes it;
 * null when it is, or when nothing is asked.
 */
export function usualAddress(url: URL): string | null {
	const asked = askedOf(url.searchParams);
	if (asked.text === undefined) return null;
	const usual = readingAddress({ ...queryOf(asked, asked.text), reading: shownIndex(asked) + 1 });
	const written = [...url.searchParams].map(([name, value]) => `${name}=${value}`).join('&');
	const wanted = [...new URL(usual, url).searchParams].map(([name, value]) => `${name}=${value}`);
	return written === wanted.join('&') ? null : usual;
}

function entryOf(asked: Asked, typed: string, faults: readonly FieldFault[], now: Date) {
	const view: AskedView = {
		kind: asked.kind ?? '',
		text: typed,
		maker: asked.maker === undefined ? '' : makerChoice(asked.maker),
		year: asked.year ?? ''
	};
	return {
		asked: view,
		faults,
		makerName: makerNameOf(view.maker),
		makers: makerOptions(view.maker),
		years: yearOptions(now)(view.year)
	};
}

/** The worked example, read against the present tables like anything else. */
function emptyView(asked: Asked): EmptyView {
	const { text } = entryText.example;
	const answer = readAgainst(current(), readRequest({ text, kind: 'serial' }));
	const [reading] = answer.readings;
	return {
		corporation: corporationOf(asked.maker ?? ''),
		example:
			reading === undefined
				? null
				: {
						reading: viewOf(reading, answer.input.normalised),
						address: readingAddress({ kind: 'serial', text })
					}
	};
}

/**
 * The page: the form, and under it what the text says or, before anything is asked, where to begin.
 * What is wrong with a part of the form stands beside it, and what was typed stays.
 * @throws what `reference.editionAt` throws
 */
export async function readingPage(url: URL, now: Date): Promise<ReadingPage> {
	const asked = askedOf(url.searchParams);
	const typed = url.searchParams.get('text') ?? '';
	const present = current().head.number;
	const blank = (faults: readonly FieldFault[]): ReadingPage => ({
		entry: entryOf(asked, typed, faults, now),
		answer: null,
		empty: emptyView(asked),
		present
	});
	if (!url.searchParams.has('text')) return blank([]);

	const { reading: _, ...parameters } = asked;
	let request;
	try {
		request = readRequest(parameters);
	} catch (error) {
		if (!(error instanceof Refusal)) throw error;
		return blank(error.errors.map(({ field, message }) => ({ field, message })));
	}
	const edition = request.edition === undefined ? current() : await editionAt(request.edition);
	return {
		entry: entryOf(asked, typed, [], now),
		answer: answerView({
			answer: readAgainst(edition, request),
			head: edition.head,
			present,
			query: queryOf(asked, typed),
			index: shownIndex(asked)
		}),
		empty: null,
		present
	};
}
