/** How far the tables reach, and where they end. */
import type { StampKind } from '../../types';
import { counted } from './counts';

export const coverageText = {
	title: 'Coverage',
	intro:
		'How many rows we have for each make and model year, how well they are supported, and what is not there at all.',
	notCurated: 'One Ford line of April 1964 is not curated.',
	byYear: 'By make and model year',
	drawing: 'A cell fills from below with the share of its rows that are firm or fair.',
	legend: {
		share: 'share of rows that are firm or fair',
		few: (n: number) => `the same, of fewer than ${n} rows`,
		none: 'no rows yet',
		blank: 'blank: no cars that year'
	},
	asTable: 'The same as a table',
	asTableCaption: 'Rows that hold for a make in a model year, and the share that is firm or fair',
	make: 'Make',
	cell: (rows: number, share: number): string => `${counted(rows, 'row', 'rows')}, ${share} %`,
	cellTitle: (division: string, year: number, rows: number, share: number): string =>
		rows === 0
			? `${division} ${year}: no rows yet`
			: `${division} ${year}: ${counted(rows, 'row', 'rows')}, ${share} % firm or fair`,
	noRows: 'no rows',
	noCars: 'no cars',
	yearsOf: (division: string): string => `${division}: tables of every year`,

	byTable: 'By table',
	byTableNote:
		'Rows of every strength. A thin row rests on one web page, on memory or on practice.',
	lined: 'Other stamps that are read',
	linedNote:
		'Body tags, engine stamps and castings as a whole. What has no form here is read as single codes and dates.',
	linedHeads: { layout: 'Form', years: 'Model years', kind: 'Kind' },
	kinds: {
		serial: 'Serial numbers',
		body_tag: 'Body tags',
		engine: 'Engine stamps',
		casting: 'Castings',
		date: 'Dates',
		code: 'Single codes'
	} satisfies Record<StampKind, string>,
	examples: 'Published examples',
	examplesNote:
		'Stamps that a published page prints together with what they mean. Every release is read against all of them.',
	exampleHeads: { kind: 'Kind', met: 'Read as published', of: 'Examples' },
	misses: 'Where we knowingly differ',
	missHeads: { text: 'Stamp', source: 'Published in', reason: 'Why we differ' },
	layouts: 'Serial numbers that are read',
	layoutsNote:
		'A number in another form is refused, with the nearest layout named; it is not guessed at.',
	layoutHeads: { layout: 'Layout', years: 'Model years', length: 'Characters' },
	gaps: 'What is not there',
	gapsNote: 'What is missing says nothing against a car. These are the gaps that we know of.',
	notCuratedTitle: 'Left out on purpose',
	gapList: [
		{
			title: 'General Motors of 1964 and before',
			text: 'Each division had a form of its own until 1965. The 12 characters of a Chevrolet of 1964 are read. The forms of Pontiac, Oldsmobile, Buick and Cadillac of that year, and all of 1963 and before, are refused: do not add a character to make them fit.'
		},
		{
			title: 'Cadillac, 1965 to 1970',
			text: 'The numbers may have been shorter than those of the other divisions. We have no source that settles it.'
		},
		{
			title: 'Body tags of General Motors',
			text: 'Fisher tags of 1964 to 1975, body plates of 1976 to 1980 and the Corvette’s trim plates of 1965 to 1977 are read. The style line is published; the order of the other lines is from memory for most years. Tags of Canadian plants, and what single plants added, are kept as they stand. Option groups to 1967 are known for one plant, Norwood, and only in part.'
		},
		{
			title: 'Engines, gearboxes and axles of General Motors',
			text: 'Chevrolet’s suffixes, Pontiac’s codes and Buick’s are listed in part. For Oldsmobile and Cadillac we have no table of engine codes, only the part of the serial number. Axle stamps are dated; what their letters say of the ratio is not listed.'
		},
		{
			title: 'Chrysler Corporation of 1964 and 1965',
			text: 'Ten characters in another order. We found no published page to rest a table on.'
		},
		{
			title: 'Ford Motor Company of 1955 to 1959',
			text: 'Ten characters in another order than from 1960 on, and not read.'
		},
		{
			title: 'Body plates and labels of Ford, Mercury and Lincoln',
			text: 'Plates of 1960 to 1969 and labels of 1970 to 1980 are read. To 1963 it is open whether axle or transmission stands first, and both are offered. Labels of 1979 and 1980 are placed in part. Of trim codes we list a few whole ones; of others the last character tells black, blue, red or aqua, from memory.'
		},
		{
			title: 'American Motors',
			text: 'Serial numbers are read from 1968 on, body plates of 1968 to 1974 and the day-build code of engines from memory. Paint and trim codes of the plates have no rows. For 1966 and 1967 we found no published form, and refuse them.'
		},
		{
			title: 'Studebaker, and makers of trucks',
			text: 'No tables.'
		},
		{
			title: 'Body tags of Chrysler Corporation',
			text: 'Fender tags of 1967 to 1974 are read. Of the punched columns of 1967 and 1968 we know what a few of 1968 mean, from one worked tag; the others are kept as column and figure. The tags of 1965 and 1966, those of Lynch Road of 1969 and those from 1975 on have other forms, for which we have no source.'
		},
		{
			title: 'Engines, transmissions and axles of Chrysler Corporation',
			text: 'Engine pads of 1965 to 1980 are read by year, size, marks and date, and numbers with a day count from 1968; most of it is from memory, and no dated part was found to check the first day of the count. Pads with two figures for the size, as on sixes and in 1964, are not read. Part numbers of transmissions and tags of axles have no table.'
		},
		{
			title: 'Trim, paint and tops',
			text: 'Whole charts for some makes and years, scattered codes for others. A code that is not listed is usual here.'
		},
		{
			title: 'Cars built outside the United States and Canada',
			text: 'For the 17-character standard the maker’s own characters, 4 to 8, have no table. Older numbers of other countries are not read.'
		}
	],
	questions: 'Open questions in the tables',
	questionsNote:
		'What a look over all rows asks. Sources differ and lists have holes: a question says nothing against a row, and waits for somebody who knows.',
	questionRow: (n: number): string => `Row ${n}`,
	moreQuestions: (n: number): string => `And ${n} more.`,
	complete: {
		none: 'No table carries a claim of completeness: none of our sources lists every code of its scope, so a code that we lack is “not listed” and never “not used”.',
		some: (n: number): string =>
			`${counted(n, 'claim', 'claims')} of completeness, each by a named source. Only there can a code be “not used”; everywhere else a code that we lack is “not listed”.`
	}
} as const;
