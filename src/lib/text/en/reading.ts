import type { SourceKind } from '../../types';

const NUMBERS = [
	'no',
	'one',
	'two',
	'three',
	'four',
	'five',
	'six',
	'seven',
	'eight',
	'nine',
	'ten',
	'eleven',
	'twelve'
];
const ORDINALS = ['', 'First', 'Second', 'Third', 'Fourth', 'Fifth', 'Sixth'];
const count = (n: number): string => NUMBERS[n] ?? String(n);

/** A reading on screen and paper. */
export const readingText = {
	/** Where a reading stands among others; empty when it is the only one. */
	position(index: number, of: number, equals: number): string {
		if (of < 2) return '';
		if (equals > 1) return `One of ${count(equals)} that fit equally well.`;
		return `${ORDINALS[index + 1] ?? `Number ${index + 1}`} of ${count(of)} readings.`;
	},
	partial: 'The beginning of a number: the rest is not typed yet.',
	layout: (title: string) => `Layout: ${title}.`,
	untitled: 'Reading',
	yearOpen: 'model year open',
	codeTitle: (label: string, code: string) => `${label} ${code}`,

	stamp: 'The stamp, character by character',
	group: (places: string, code: string, label: string) => `${places}, ${code}: ${label}`,
	unreadCharacter: 'unread',
	eitherCharacter: (set: string) => [...set].join(' or '),
	/** Head of a line of a body tag. */
	line: (n: number) => `Line ${n}`,
	fields: 'What the characters say',
	fromPlaces: (places: string) => `from ${places}`,
	fromSameRow: 'from the same row',
	placesApart: (places: readonly number[]) =>
		`characters ${places.slice(0, -1).join(', ')} and ${places.at(-1)}`,
	unreadWord: 'unread',

	notListed: 'Not listed',
	notUsed: 'Not used',
	illegible: 'Cannot be read',
	notTyped: 'Not typed yet',
	nearby: 'Known nearby',
	oneOf: 'One of these',
	couldBe: 'Could be',
	andMorePossible: (n: number) => `${n} more that it could be`,
	contestedNote: (n: number) =>
		`${n === 2 ? 'Both stand' : `All ${count(n)} stand`} until a source settles it. A contested field never makes a “does not tally”.`,
	or: 'or ',

	more: (n: number) => `and ${n} more`,
	rowsBehind: (n: number) => (n === 1 ? 'its row' : 'its rows'),
	whyStrength: (word: string) => `why ${word}`,
	ratedAs: (word: string) => `This value is ${word}.`,
	row: 'Row in the tables',
	rows: (n: number) => `Row ${n} in the tables`,

	caution:
		'A reading says what the characters mean. It never proves that a car is what they say, nor whose it is.',
	cautionLink: 'What a reading can and cannot tell',
	cautionAddress: '/help/what-a-reading-tells',

	edition: (n: number, day: string | null) => (day ? `Edition ${n}, ${day}` : `Edition ${n}`),
	digest: 'digest',
	reader: 'reader',
	repeat: 'Repeat on another edition',
	repeatSubmit: 'Repeat',
	allSources: 'All sources of this reading',
	where: 'Where its stamps sit',
	lineByLine: 'Type it line by line, with the serial number beside it',
	permanent: 'Permanent address',
	copy: 'Copy link',
	copied: 'Link copied',
	copyFailed: 'The browser did not allow it. Copy the permanent address by hand.',
	print: 'Print',

	old: {
		heading: (n: number, day: string | null) =>
			day ? `Read on edition ${n} of ${day}` : `Read on edition ${n}`,
		body: (present: number) =>
			`It is shown as it was told then. The present edition is ${present}.`,
		again: 'Read again with the present edition'
	},

	others: (index: number) => `Reading ${index + 1}`,
	either: 'either',
	show: 'Show this reading',
	/** What is heard after it. */
	showMore: (index: number, title: string) => `: reading ${index + 1}, ${title}`,
	restReadings: (n: number) => `${n} more readings`,
	furtherReadings: (n: number) =>
		n === 1
			? 'One further reading fits and is not listed. A maker or a year narrows them.'
			: `${n} further readings fit and are not listed. A maker or a year narrows them.`,

	sources: 'Sources of this reading',
	sourceKinds: {
		factory_paper: 'factory paper',
		law: 'law or regulation',
		standard: 'published standard',
		book: 'book',
		club_research: 'club research',
		magazine: 'magazine',
		web_page: 'web page',
		dataset: 'open dataset',
		car_seen: 'car seen',
		common_practice: 'common practice, no source',
		memory: 'memory, no source'
	} satisfies Record<SourceKind, string>,
	sourceFor: (labels: readonly string[]) => `for ${labels.join(', ')}`,
	noSources: 'No row of this reading has a source yet.',
	memoryNote: 'Rows from memory or common practice have no source to show and are never firm.',

	check: {
		heading: 'The check digit, worked through',
		about:
			'Each character has a value and each place a weight. The products are added up, the sum is divided by 11, and what is left over is the check digit; ten is written X.',
		place: 'Place',
		character: 'Character',
		value: 'Value',
		weight: 'Weight',
		product: 'Product',
		sum: (sum: number, quotient: number, rest: number, digit: string) =>
			rest === 10
				? `The sum is ${sum}: ${quotient} times 11, and 10 left over, written X.`
				: `The sum is ${sum}: ${quotient} times 11, and ${digit} left over.`,
		standard: 'Method: 49 CFR 565.15.',
		stands: (digit: string) => `Place 9 has ${digit}.`
	},

	problem: {
		none: 'No layout fits',
		beside: 'Worth a second look',
		instead: 'It could be',
		read: 'Read',
		broken: 'this character breaks it'
	}
} as const;
