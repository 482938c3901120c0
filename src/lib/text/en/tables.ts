/** Code tables, rows and sources. */
import type { READ_EXTENTS, ScopeColumn, Strength } from '../../types';
import { counted, grouped } from './counts';

type Read = (typeof READ_EXTENTS)[number];

export const tablesText = {
	title: 'Code tables',
	intro: 'How well each make and year is covered. Choose a cell for its tables, or ',
	introLink: 'find a code or a word',
	rows: (n: number): string => counted(n, 'row', 'rows'),
	tables: (n: number): string => counted(n, 'table', 'tables'),
	shown: (n: number, of: number): string =>
		n === of ? counted(n, 'row', 'rows') : `${grouped(n)} of ${counted(of, 'row', 'rows')}`,
	edition: (n: number): string => `Edition ${n}`,
	csv: 'CSV',
	csvAllStrengths: 'CSV, every strength',
	json: 'The same as JSON',

	find: {
		heading: 'Search the tables',
		query: 'Find a code or a word',
		queryHint: 'One or two characters are taken as a code.',
		table: 'Table',
		allTables: 'all tables',
		division: 'Make',
		allDivisions: 'all makes',
		allOf: (maker: string) => `all of ${maker}`,
		year: 'Model year',
		strength: 'Strength',
		allStrengths: 'all',
		sort: 'Order',
		submit: 'Find',
		show: 'Show',
		codeTables: 'Looked up by a stamp',
		knowledgeTables: 'Read beside the codes'
	},
	faults: {
		division: (value: string) => `We know no make by the name of “${value}”.`,
		table: (value: string) => `There is no table “${value}”.`,
		year: (from: number, to: number) => `A model year is a whole number from ${from} to ${to}.`,
		strength: (value: string) => `“${value}” is no strength.`,
		search: (most: number) => `A search has ${most} characters at most.`
	},
	results: {
		quoted: (query: string) => `“${query}”`,
		everything: 'All rows',
		strength: (word: string) => `${word} only`,
		tablesOf: (scope: string) => `${scope}: tables`,
		tablesNote: 'Rows that hold for it, and how many of them are firm or fair.',
		order: 'The best match first.'
	},
	nothing: {
		found: (query: string) => `Nothing found for “${query}”`,
		fits: 'No row fits',
		wider:
			'Take a filter away, or try fewer letters. That a code is not in the tables says nothing against a car that wears it.',
		offer: 'Look in all tables',
		offerTable: 'Show the whole table',
		read: 'Read it as a code'
	},

	makers: {
		title: (maker: string) =>
			maker === 'Other makers' ? 'Tables of every maker' : `Tables of ${maker}`,
		heading: 'Tables by corporation',
		about: (tables: number, rows: number) =>
			`${counted(tables, 'table', 'tables')}, ${counted(rows, 'row', 'rows')}`,
		anyMaker: 'The 17-character standard, and what holds for every maker.',
		code: 'Codes',
		codeNote: 'Looked up by what is stamped, struck or printed on a car.',
		knowledge: 'Beside the codes',
		knowledgeNote: 'Read and shown; no stamp is looked up in them.',
		nothing: 'We have no tables of this corporation yet.'
	},
	table: {
		title: (label: string, maker: string) => `${label}: ${maker}`,
		missing: (label: string, maker: string) =>
			`We have no rows of “${label}” for ${maker} yet. That says nothing against a car.`,
		complete: (source: string, scope: string) =>
			`Complete for ${scope}, by ${source}: a code that is not here was not used there.`,
		claimSource: 'The source.',
		notComplete:
			'No source claims that this table is complete: a code that it lacks may well exist.'
	},
	heads: {
		code: 'Code',
		table: 'Table',
		means: 'Means',
		scope: 'Scope',
		years: 'Years',
		strength: 'Strength',
		restsOn: 'Rests on',
		supported: 'Firm or fair',
		about: 'What it holds',
		rows: 'Rows',
		row: 'Row'
	},
	sorts: {
		code: { up: 'A to Z', down: 'Z to A' },
		meaning: { up: 'A to Z', down: 'Z to A' },
		years: { up: 'earliest first', down: 'latest first' },
		strength: { up: 'firm first', down: 'firm last' },
		match: 'Best match first'
	},
	swatches: 'The chips are screen approximations: no screen shows a paint.',
	rowOf: (name: string) => `: ${name}`,
	noCode: 'no code',
	moreSources: (n: number) => `and ${n} more`,
	noSource: 'no source yet',
	pages: {
		label: 'Pages',
		previous: 'Previous',
		next: 'Next',
		page: (n: number, of: number) => `Page ${n} of ${of}`
	},

	scope: {
		columns: {
			division: 'Make',
			line: 'Line',
			body: 'Body',
			engine: 'Engine',
			plant: 'Plant',
			market: 'Market'
		} satisfies Record<ScopeColumn, string>,
		years: 'Model years',
		allOf: (maker: string) => `All of ${maker}`,
		everyMaker: 'Every maker',
		body: (codes: string) => `body ${codes}`,
		engine: (codes: string) => `engine ${codes}`,
		plant: (codes: string) => `plant ${codes}`
	},

	row: {
		heading: (label: string, code: string) => (code === '' ? label : `${label}, ${code}`),
		holds: 'Where it holds',
		values: 'Values',
		note: 'Note',
		rests: 'What it rests on',
		against: 'against',
		nothing: 'Nothing is cited yet.',
		read: {
			whole: 'The whole was read',
			page: 'The page was read',
			excerpt: 'An excerpt was read',
			title: 'Only the title is known: counts as nothing'
		} satisfies Record<Read, string>,
		isAgainst: 'Against',
		seenOn: (day: string) => `seen on ${day}`,
		contested: 'Sources differ',
		contestedNote:
			'Every value stands until a source settles it. A contested row never makes a “does not tally”.',
		this: 'This row',
		history: 'History',
		version: (n: number) => `Version ${n}`,
		since: (n: number) => `since edition ${n}`,
		between: (from: number, to: number) =>
			from === to - 1 ? `edition ${from} only` : `editions ${from} to ${to - 1}`,
		first: 'The first version.',
		retired: (n: number) => `Retired in edition ${n}`,
		retiredBody:
			'This row is no longer in the tables. It is shown as it last stood, with the strength that it had then.',
		earlier: (n: number, present: number) =>
			`This is the row as it stood in edition ${n}. The present edition is ${present}.`,
		present: 'Show the present row',
		historyAway: 'The history is kept in the database, and the database does not answer now.',
		readCode: 'Read this code',
		address: 'Key'
	},

	sources: {
		title: 'Sources',
		intro:
			'The works that rows rest on. A row is as strong as its sources: each row names its own, and copies of a work count once with it.',
		kind: 'Kind',
		allKinds: 'all kinds',
		shown: (n: number, of: number) =>
			n === of
				? counted(n, 'source', 'sources')
				: `${grouped(n)} of ${counted(of, 'source', 'sources')}`,
		heads: { title: 'Title', publisher: 'Publisher', year: 'Year', kind: 'Kind', rows: 'Rows' },
		sorts: { title: 'A to Z', rows: 'most first', year: 'latest first' },
		sortChoices: [
			{ value: 'title', label: 'Title, A to Z' },
			{ value: 'rows', label: 'Rows, most first' },
			{ value: 'year', label: 'Year, latest first' }
		],
		nothing: 'No source fits',
		place: 'Where in it',
		noPlace: '',
		query: 'Title or publisher',
		seenAt: 'Where to be seen',
		licence: 'License',
		repeats: 'Copies',
		repeatsNote: 'The two count as one.',
		repeatedBy: 'Copied by',
		publisher: 'Publisher',
		year: 'Year',
		cited: 'Rows that rest on it',
		citedBy: (n: number) => counted(n, 'row', 'rows'),
		citedWord: (n: number) => (n === 1 ? 'row' : 'rows'),
		notCited: 'No row rests on it now.',
		memory:
			'No source: what somebody who knows these cars remembers, marked so on every row. Such rows are thin at most and never make a “does not tally”.',
		practice:
			'No source: what is commonly done and believed in the trade, marked so on every row. Such rows are thin at most.',
		all: 'All sources'
	},
	crumbs: 'Where you are',
	strengthOf: {
		firm: 'firm',
		fair: 'fair',
		thin: 'thin',
		contested: 'contested',
		not_rated: 'not rated'
	} satisfies Record<Strength, string>
} as const;
