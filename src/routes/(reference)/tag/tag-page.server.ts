/** What the tag page shows for an address. */
import { examineText, LINED_LAYOUTS, linesOf, type LinedLayout } from '$lib/decoder';
import { readingAddress, tagAddress, type TagQuery } from '$lib/format/addresses';
import { fault } from '$lib/server/http';
import { readContext, readStampsAgainst } from '$lib/server/readings';
import { current } from '$lib/server/reference';
import { interfaceText } from '$lib/text/en/interface';
import { MAX_TEXT, type FieldError, type Problem, type ReadContext } from '$lib/types';
import { makerChoice, makerOptions, yearOptions } from '../reading/choices';
import { titleOf } from '../reading/view';
import { askedTag, splitLines } from './asked';
import { seamOf } from './seam-lines';
import { doubtsOf, tagLines } from './tag-lines';

/** Lines of a tag whose form is not known yet. */
const USUAL_LINES = 4;
const TAGS = LINED_LAYOUTS.filter(({ kind }) => kind === 'body_tag');

/** The one form that a maker and year leave, those of single cars aside; null when none or several do. */
function formOf({ maker, year }: ReadContext): LinedLayout | null {
	const fitting = TAGS.filter(
		(tag) =>
			tag.maker === maker &&
			tag.divisions === undefined &&
			year !== undefined &&
			tag.years[0] <= year &&
			year <= tag.years[1]
	);
	return fitting.length === 1 ? (fitting[0] ?? null) : null;
}

/** What each place of a form usually holds, in the order in which lines stand on the tag. */
function usualLabels(form: LinedLayout | null, count: number): (readonly string[])[] {
	if (form === null) return Array.from({ length: count }, () => []);
	const labels = Array.from({ length: count }, (_, index) => {
		const line = form.lines[Math.min(index, form.lines.length - 1)];
		return [...new Set((line?.fields ?? []).map(({ label }) => label))];
	});
	return form.order === 'up' ? labels.reverse() : labels;
}

function inputLines(asked: TagQuery, form: LinedLayout | null, add: boolean): readonly string[] {
	const blank = Array.from({ length: form?.lines.length ?? USUAL_LINES }, () => '');
	const lines = asked.lines.length > 0 ? asked.lines : blank;
	if (!add) return lines;
	return form?.order === 'up' ? ['', ...lines] : [...lines, ''];
}

/** Number of each line, as problems count them: those that hold a character. */
function numbered(lines: readonly string[]): (number | null)[] {
	let last = 0;
	return lines.map((line) => (linesOf(line).lines.length > 0 ? (last += 1) : null));
}

const offered = (problem: Problem, asked: TagQuery) =>
	problem.offers.map(({ text, why }) => ({
		text,
		why,
		address: tagAddress({ ...asked, lines: splitLines(text) })
	}));

function serialFaults(serial: string): FieldError[] {
	const wrong = serial.trim() === '' ? null : examineText(serial, 'serial');
	if (wrong === null) return [];
	return [fault('serial', wrong, interfaceText.text[wrong](MAX_TEXT.serial))];
}

/** The page: the form with its lines, what each says, and what tag and serial say against each other. */
export function tagPage(parameters: URLSearchParams, now: Date) {
	const asked = askedTag(parameters);
	const faults = serialFaults(asked.serial);
	const context = readContext(
		{ maker: asked.maker || undefined, year: asked.year || undefined },
		faults
	);
	const known = formOf(context);
	const lines = inputLines(asked, known, parameters.has('add'));
	const numbers = numbered(lines);
	const text = lines.filter((_, index) => numbers[index] !== null).join('\n');
	const withSerial = asked.serial.trim() !== '' && !faults.some(({ field }) => field === 'serial');
	const withTag = text !== '';
	const stamps = [
		...(withSerial ? [{ kind: 'serial', text: asked.serial } as const] : []),
		...(withTag ? [{ kind: 'body_tag', text } as const] : [])
	];
	const answer =
		stamps.length === 0 ? null : readStampsAgainst(current(), { stamps, context, explain: false });
	const serial = withSerial ? answer?.stamps[0] : undefined;
	const tag = withTag ? answer?.stamps.at(-1) : undefined;
	const [reading] = tag?.readings ?? [];
	const form = TAGS.find(({ id }) => id === reading?.layout) ?? known;
	const tally = answer?.lines ?? [];
	const scope = { maker: asked.maker, year: asked.year };
	const typed = tagLines({
		typed: lines,
		numbers,
		normalised: tag?.input.normalised ?? '',
		reading,
		problems: tag?.problems ?? [],
		doubts: doubtsOf(tally, stamps.length - 1),
		scope
	});
	const usual = usualLabels(form, lines.length);
	const query = { ...scope, kind: 'body_tag', text: text.replaceAll('\n', ' / ') };
	return {
		form: {
			...asked,
			maker: asked.maker === '' ? '' : makerChoice(asked.maker),
			makers: makerOptions(makerChoice(asked.maker)),
			years: yearOptions(now)(asked.year),
			faults,
			serial: asked.serial
		},
		lines: typed.map((line, index) => ({ ...line, usual: usual[index] ?? [] })),
		order: form?.order ?? 'down',
		readAs: reading?.layout_title ?? '',
		known: TAGS.map(({ title }) => title),
		/** Problems of the tag as a whole. */
		problems: (tag?.problems ?? [])
			.filter(({ line, offers }) => line === undefined || offers.length > 0)
			.map((problem) => ({
				message: problem.line === undefined ? problem.message : '',
				offers: offered(problem, asked)
			})),
		whole: withTag ? readingAddress(query) : null,
		/** Readings that nothing on the tag sets apart from the one that is shown. */
		others: (tag?.readings ?? []).slice(1).filter(({ rank }) => rank === reading?.rank).length,
		serial:
			serial === undefined
				? null
				: {
						title: serial.readings[0] === undefined ? '' : titleOf(serial.readings[0]),
						problem:
							serial.readings.length > 0
								? ''
								: serial.problems.map(({ message }) => message).join(' '),
						address: readingAddress({ ...scope, kind: 'serial', text: asked.serial })
					},
		seam: serial?.readings.length && reading ? seamOf(tally, 0) : null,
		withTag
	};
}

export type TagPage = ReturnType<typeof tagPage>;
