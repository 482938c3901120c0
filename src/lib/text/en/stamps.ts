/** What the reading of body tags, engine stamps and castings says. */
import type { ScopeColumn } from '../../types';
import { decoderText } from './decoder';

const { listed, lower } = decoderText;

const COLUMNS: Readonly<Record<ScopeColumn, string>> = {
	division: 'division',
	line: 'car line',
	body: 'body',
	engine: 'engine',
	plant: 'plant',
	market: 'market'
};
const lines = (numbers: readonly number[]): string =>
	numbers.length === 1 ? `line ${numbers[0]}` : `lines ${listed(numbers.map(String))}`;
const sentence = (words: string): string => words.charAt(0).toUpperCase() + words.slice(1);

export const stampsText = {
	/** Label of what no field takes. */
	unplaced: 'Not placed',
	noField:
		'No field of this form takes it. It is kept as it stands, and says nothing against the car.',
	depends: (on: ScopeColumn) => `Depends on the ${COLUMNS[on]}`,
	differs: 'Depends on the rest of the serial',
	holdsFor: (scopes: readonly string[]) =>
		`On record for ${scopes.slice(0, 4).join('; ')}${scopes.length > 4 ? `; ${scopes.length - 4} more` : ''}.`,
	partOfSerial: (code: string) => `${code}, of the car’s number`,
	number: (label: string, code: string) => `${label} ${code}`,

	problems: {
		noForm: (title: string) =>
			`No form that we know takes these lines. Nearest is ${title}. What stands there is kept; look up single codes one at a time.`,
		noForms: 'We have no form for such a stamp yet.',
		missingLine: (label: string, title: string) =>
			`The line “${lower(label)}” is missing; ${title} has one. The other lines are read without it.`,
		missingField: (label: string, line: number) =>
			`Line ${line}: ${lower(label)} is missing or is not of the form expected.`,
		unplacedLine: (line: number, title: string) =>
			`Line ${line} fits no line of ${title}. It is kept as it stands.`,
		unreadLine: (line: number) =>
			`Nothing in line ${line} can be read. It is taken as a line of its own, so that the others keep their places.`,
		doubled: (line: number, first: number) =>
			`Line ${line} says the same as line ${first}. It is read once.`,
		turned: (title: string) =>
			`The lines stand from the other end than on ${title}. They are read as what they look like; in the order of the plate:`,
		swapped: (title: string) =>
			`The lines stand in another order than on ${title}. They are read as what they look like; in the order of the plate:`,
		inOrder: 'In the order of the plate',
		twoPlates: (numbers: readonly number[], title: string) =>
			`${sentence(lines(numbers))} ${numbers.length === 1 ? 'reads' : 'read'} as a plate of its own, ${title}. Two plates seem to be typed into one; each alone:`,
		onePlate: (title: string) => `As ${title}`,
		otherMaker: (stamp: string, serial: string) =>
			`This reads as a stamp of ${stamp}; the serial beside it is one of ${serial}. Either stands for another car, or one of them is misread.`,
		otherGiven: (stamp: string, maker: string) =>
			`This reads as a stamp of ${stamp}, and you gave ${maker} as the maker. No form of ${maker} that we know takes it.`,
		tooManyLines: (most: number, beyond: number) =>
			`No stamp has more than ${most} lines. The last ${beyond === 1 ? 'line is' : `${beyond} lines are`} not read.`,
		tooLong: (most: number, beyond: number) =>
			`Only the first ${most} characters are read; ${beyond} more ${beyond === 1 ? 'stands' : 'stand'} after them.`
	}
} as const;
