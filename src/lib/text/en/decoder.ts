/** Every word that the reading code says. */
import type { SourceKind } from '../../types';

const NUMBERS = [
	'No',
	'One',
	'Two',
	'Three',
	'Four',
	'Five',
	'Six',
	'Seven',
	'Eight',
	'Nine',
	'Ten'
];
const count = (n: number): string => NUMBERS[n] ?? String(n);
const lower = (text: string): string => text.charAt(0).toLowerCase() + text.slice(1);
const counted = (n: number, one: string, many: string): string =>
	`${count(n)} ${n === 1 ? one : many}`;

const KIND_NAMES: Readonly<Record<SourceKind, readonly [one: string, many: string]>> = {
	factory_paper: ['factory paper', 'factory papers'],
	law: ['law or regulation', 'laws or regulations'],
	standard: ['published standard', 'published standards'],
	book: ['book', 'books'],
	club_research: ['work of club research', 'works of club research'],
	magazine: ['magazine', 'magazines'],
	web_page: ['web page', 'independent web pages'],
	dataset: ['open dataset', 'open datasets'],
	car_seen: ['car seen', 'cars seen'],
	common_practice: ['common practice, no source', 'common practice, no source'],
	memory: ['memory, no source', 'memory, no source']
};

const listed = (parts: readonly string[]): string =>
	parts.length < 2
		? parts.join('')
		: `${parts.slice(0, -1).join(', ')} and ${parts[parts.length - 1]}`;

/** 12345 as 12,345; `toLocaleString` is a hundred times slower. */
const grouped = (n: number): string =>
	n < 1000 ? String(n) : `${grouped(Math.floor(n / 1000))},${String(n % 1000).padStart(3, '0')}`;
const characters = (n: number): string => counted(n, 'character', 'characters');
const numbered = (from: number, to: number): string =>
	from === to ? `character ${from}` : `characters ${from}–${to}`;

/** "1969", "1967–69", "1998–2002". */
const yearSpan = (from: number, to: number): string => {
	if (from === to) return String(from);
	const short = Math.floor(from / 100) === Math.floor(to / 100);
	return `${from}–${short ? String(to % 100).padStart(2, '0') : to}`;
};

export const decoderText = {
	count,
	counted,
	lower,
	listed,
	numbered,

	strengthWhy(
		kinds: readonly SourceKind[],
		carsFor: number,
		carsAgainst: number,
		against: number
	): string {
		const tally = new Map<SourceKind, number>();
		for (const kind of kinds) tally.set(kind, (tally.get(kind) ?? 0) + 1);
		const parts = [...tally].map(([kind, n]) => {
			const [one, many] = KIND_NAMES[kind];
			if (kind === 'memory' || kind === 'common_practice') return one;
			return lower(counted(n, one, many));
		});
		if (carsFor > 0) parts.push(lower(counted(carsFor, 'car seen', 'cars seen')));
		const rests = parts.length === 0 ? 'Rests on nothing yet' : `Rests on ${listed(parts)}`;
		const contrary = [
			...(carsAgainst > 0 ? [lower(counted(carsAgainst, 'car seen', 'cars seen'))] : []),
			...(against > 0 ? [lower(counted(against, 'source', 'sources'))] : [])
		];
		if (contrary.length === 0) return `${rests}.`;
		const lowered = carsAgainst > 0 ? ', which lowers it by one step' : '';
		return `${rests}; ${listed(contrary)} against${lowered}.`;
	},

	scope(names: readonly string[], from: number | null, to: number | null): string {
		const years = from === null || to === null ? [] : [yearSpan(from, to)];
		return [...names, ...years].join(', ');
	},
	yearSpan,

	cylinders: (n: number): string => counted(n, 'cylinder', 'cylinders'),

	gaps: {
		ford: 'One Ford line of April 1964 is not curated.'
	},

	layoutStrength: 'Given by the layout, which has no row yet.',
	contestedWhy: 'Sources differ; each value stands over its own.',

	fields: {
		bothStand: 'Both stand until a source settles it.',
		notListed: (label: string, code: string) =>
			`We have no row for ${code} as ${lower(label)} here. That says nothing against the car.`,
		nearby: 'What is known nearby is listed below.',
		parentMissing: (parent: string) =>
			`What it means depends on the ${lower(parent)}, for which we have no row. That says nothing against the car.`,
		parentUnread: (parent: string) =>
			`What it means depends on the ${lower(parent)}, which is unread.`,
		noTable:
			'The maker decides what these say. We have no table for them, and that says nothing against the car.',
		notUsed: (code: string, source: string) =>
			`${code} stands in no row, and ${source} lists every code of this scope.`,
		/** `cells` as they were read: `?` for unread, `38` for one of these. */
		unread: (cells: readonly string[]): string => {
			const unread = cells.filter((cell) => cell === '?').length;
			const either = cells.filter((cell) => cell.length > 1);
			const parts: string[] = [];
			if (unread > 0)
				parts.push(
					cells.length === 1
						? 'Unread.'
						: `${count(unread)} of ${lower(count(cells.length))} unread.`
				);
			for (const cell of either)
				parts.push(`Could be ${listed([...cell]).replace(' and ', ' or ')}.`);
			return parts.join(' ');
		},
		manyPossible: (n: number) => `${n} meanings are possible: too many to list.`,
		notTyped: 'Not typed yet.',
		noRowFor: 'Not in the tables'
	},

	year: {
		byLayout: 'Given by the layout.',
		repeats: 'One character stands for this year each ten or thirty years.',
		positionSeven: (numeric: boolean) =>
			`Position 7 is a ${numeric ? 'figure: 1980 to 2009' : 'letter: 2010 to 2039'}. So for cars and light trucks for the United States; heavier vehicles may have either.`,
		open: 'Year open',
		openWhy:
			'Outside North America the tenth character need not be the model year. What it would be, if it is, stands below.',
		unread: 'The year’s character is unread: this reading takes it as the year named above.'
	},

	sequence: {
		noRow: 'Place in the year’s run: not told. The first number of this plant has no row.',
		inRun: (first: number, place: number) =>
			`Numbers began at ${first}. If none was left out, this is number ${grouped(place)} of the run.`,
		below: (first: number) =>
			`Below the first number that we have on record, ${first}. Either our row is wider than it should be, or a figure is misread.`,
		above: (last: number) =>
			`Above the last number that we have on record, ${last}. Either our row is narrower than it should be, or a figure is misread.`
	},

	check: {
		fits: (digit: string) => `${digit}: fits`,
		fails: (digit: string, expected: string) => `${digit}: does not fit, ${expected} is called for`,
		passWhy:
			'The other characters call for this one. It guards against slips in copying; anybody can work it out, so a fit proves nothing about the car.',
		failNorthAmerica:
			'Read the number again first (I and 1, O and 0, S and 5, B and 8, Z and 2). A slip in copying is the usual cause, a maker’s error is possible. It is no sign of forgery by itself.',
		failElsewhere:
			'Outside North America this place need not be a check digit. Nothing follows from it.',
		notDigit:
			'Not a check digit: outside North America other characters may stand here. Nothing follows from it.',
		calledFor: (digit: string) => `${digit} if the check digit stands`,
		cannot: 'Cannot be worked out while another character is unread.',
		narrowed: (from: number, set: string) =>
			`If the check digit stands, character ${from} is ${listed([...set]).replace(/ and /, ' or ')}.`
	},

	code: {
		depends: 'Depends on division, line and year',
		narrowedBy: 'Give the maker and the year to narrow it.'
	},

	why: {
		first: (found: number, of: number) =>
			`${found === 0 ? 'None' : count(found)} of ${lower(count(of))} fields ${found < 2 ? 'is' : 'are'} told.`,
		contested: (n: number) => `${counted(n, 'field is', 'fields are')} contested.`,
		notListed: (n: number) => `${counted(n, 'field is', 'fields are')} not listed.`,
		illegible: (n: number) => `${counted(n, 'field is', 'fields are')} unread.`,
		notUsed: (n: number) =>
			`${counted(n, 'code was', 'codes were')} not used in this scope, by a source that lists all.`,
		fewerHints: 'It does not agree with what you gave beside it.',
		misfit: 'Its lines and fields fit what was typed less well than the first.',
		outOfRun: 'Its running number stands outside the run that we have on record for the division.',
		fewerFound: 'Fewer of its fields are in the tables than in the first.',
		thinner: 'More of it rests on thin rows than in the first.',
		equalFirst: 'Nothing on the plate settles it: another reading is as likely.',
		equal: 'Nothing on the plate settles it: this reading is as likely as the first.',
		table: (label: string) => `Stands in ${lower(label)}.`
	},

	problems: {
		length: (typed: number, needed: number, title: string) =>
			`${characters(typed)}; ${lower(count(needed))} are needed for ${title}. ` +
			(typed < needed
				? `${count(needed - typed)} ${needed - typed === 1 ? 'is' : 'are'} missing. Write ? for each that you cannot read.`
				: `${count(typed - needed)} too many.`),
		character: (title: string, position: number, found: string, expected: string) =>
			`Nearest is ${title}. It breaks at character ${position}, where ${found} stands and ${expected} is expected.`,
		yearCode: 'a code of a model year',
		figure: 'a figure',
		letter: 'a letter',
		oneOf: (set: string) => `one of ${[...set].join(' ')}`,
		letterFound: (character: string) => `the letter ${character}`,
		figureFound: (character: string) => `the figure ${character}`,
		tryInPlace: (to: string, position: number) => `${to} as character ${position}`,
		pad: 'Unread characters at the end',
		bare: 'Six figures alone are usually the sequence number, and that names no car by itself. With the characters before it unread:',
		sequenceOf: (title: string) => `As the sequence of ${title}`,
		lookAlike: (label: string, code: string) =>
			`No row for ${code} as ${lower(label)}. A look-alike would have one:`,
		lookAlikeCheck: 'The check digit does not fit. With a look-alike it would:',
		wouldRead: (meaning: string) => `would read ${meaning}`,
		foreignLetter: (position: number) =>
			`Character ${position} is of no die set that we know; it is taken as unread.`,
		notInTables: (code: string) =>
			`${code} stands in none of our tables. That says nothing against the car.`
	}
} as const;
