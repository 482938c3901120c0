/** Reads a date in one format. */
import { datesText as text } from '../../text/en/dates';
import { calendarDay } from './days';
import type {
	DateContext,
	DateFault,
	DateFormat,
	DateMeaning,
	DateReading,
	PartName,
	YearChoice
} from './format';
import { matchesOf, type Match } from './match';
import { tell, together, type Values } from './resolve';
import { modelYears, stampedYears, unstampedYears, type Years } from './years';

/** More meanings than this say nothing: too much is unread. */
const MOST = 24;
const MONTHS = 12;
/** What divides a year; `day_count` stands apart because it names the year too. */
const WITHIN = ['day', 'week', 'week_of_year', 'day_of_year', 'day_of_run'] as const;

interface Group {
	readonly month: number | undefined;
	readonly choice: YearChoice | null;
	/** Values of what stands within the month or year. */
	readonly within: readonly Values[];
}

const valuesOf = (match: Match, name: PartName): readonly number[] | undefined => {
	for (const [part, values] of match) if (part.name === name) return values;
	return undefined;
};

function withinOf(match: Match): readonly Values[] {
	for (const name of WITHIN) {
		const values = valuesOf(match, name);
		if (values !== undefined) return values.map((value) => ({ [name]: value }));
	}
	return [{}];
}

/** A day count names its year itself. */
function countGroups(counts: readonly number[], dayZero: number): Group[] {
	const byYear = new Map<number, Values[]>();
	for (const count of counts) {
		const { year } = calendarDay(dayZero + count);
		byYear.set(year, [...(byYear.get(year) ?? []), { day_count: count }]);
	}
	return [...byYear].map(([year, within]) => ({
		month: undefined,
		choice: { year, usual: true },
		within
	}));
}

/** The calendar years of one month, from what is stamped or from the car. */
function yearsOf(
	match: Match,
	month: number | undefined,
	format: DateFormat,
	context: DateContext
): Years {
	const stamped = valuesOf(match, 'year');
	if (stamped !== undefined) return stampedYears(stamped, format, context);
	const models = valuesOf(match, 'model_year');
	if (models !== undefined) return modelYears(models, month, format, context);
	return unstampedYears(month as number, format, context);
}

function groupsOf(
	match: Match,
	format: DateFormat,
	context: DateContext
): { readonly groups: Group[]; readonly settled: Years['settled'] } {
	const counts = valuesOf(match, 'day_count');
	if (counts !== undefined)
		return { groups: countGroups(counts, format.dayZero as number), settled: 'stamped' };
	const within = withinOf(match);
	const groups: Group[] = [];
	let settled: Years['settled'] = 'stamped';
	for (const month of valuesOf(match, 'month') ?? [undefined]) {
		const years = yearsOf(match, month, format, context);
		settled = years.settled;
		const folded = month === undefined ? undefined : ((month - 1) % MONTHS) + 1;
		for (const choice of years.choices) groups.push({ month: folded, choice, within });
	}
	return { groups, settled };
}

function detailOf(
	format: DateFormat,
	meanings: readonly DateMeaning[],
	settled: Years['settled']
): string {
	const withYear = format.parts.some(({ name }) => name === 'year' || name === 'model_year');
	const [first] = meanings;
	const sentences: string[] = [];
	if (settled === 'by_car')
		sentences.push(
			withYear ? text.detail.decadeByCar(first?.year as number) : text.detail.yearByCar
		);
	if (settled === 'open') sentences.push(withYear ? text.detail.decadeOpen : text.detail.yearOpen);
	if (meanings.some(({ usual }) => !usual)) sentences.push(text.detail.long);
	if (format.remark !== undefined) sentences.push(format.remark);
	return sentences.join(' ');
}

const none = (format: DateFormat, code: DateFault, message: string): DateReading => ({
	format,
	meanings: [],
	fault: { code, message },
	detail: ''
});

/**
 * Reads a date as one format has it. Marks for unread characters and dividers may stand in the text; dividers decide
 * how the characters are split where they can. Never throws: an impossible date gives no meaning, and says why.
 * @example readIn(gmCasting, 'A 12 9', { year: 1969 }).meanings[0]?.words // '12 January 1969'
 */
export function readIn(format: DateFormat, typed: string, context: DateContext = {}): DateReading {
	const { matches, fault } = matchesOf(format, typed);
	if (fault !== null) return none(format, fault.code, fault.message);
	const meanings = new Map<string, DateMeaning>();
	let settled: Years['settled'] = 'stamped';
	let impossible = '';
	for (const match of matches) {
		const { groups, settled: own } = groupsOf(match, format, context);
		settled = own;
		for (const { month, choice, within } of groups) {
			const year = choice?.year ?? null;
			const told = within.map((values) =>
				tell(month === undefined ? values : { ...values, month }, year, format.dayZero ?? 0)
			);
			const possible = told.filter((one) => 'span' in one);
			for (const one of told) if ('impossible' in one) impossible ||= one.impossible;
			if (possible.length === 0) continue;
			const meaning = together(possible, year, choice?.usual ?? true);
			if (!meanings.has(meaning.words)) meanings.set(meaning.words, meaning);
		}
	}
	if (meanings.size === 0) return none(format, 'no_such_day', impossible);
	if (meanings.size > MOST) return none(format, 'too_open', text.faults.tooOpen);
	const list = [...meanings.values()];
	const ordered = [...list.filter(({ usual }) => usual), ...list.filter(({ usual }) => !usual)];
	return {
		format,
		meanings: ordered,
		fault: null,
		detail: detailOf(format, ordered, settled)
	};
}
