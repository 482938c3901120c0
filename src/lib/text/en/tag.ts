/** The page on which a body tag is typed line by line, and held against the serial number beside it. */
import type { TallyAttribute, Weight } from '../../types';
import { decoderText } from './decoder';
import { tallyText } from './tally';

const { counted, listed, lower } = decoderText;

export const tagText = {
	title: 'Body tag',
	intro:
		'Type the tag line by line as it stands, with its blanks. Each line is read as you go, and held against the serial number.',
	help: 'Where it sits, and how to read it without harm',
	helpAddress: '/help/body-tags',

	serial: 'Serial number beside it',
	serialHint: 'From the plate, so that the two can be held against each other.',
	maker: 'Maker, if known',
	year: 'Model year, if known',
	read: 'Read the tag',
	add: 'Add a line, or a second tag',
	clear: 'Start again',

	line: (n: number): string => `Line ${n}`,
	blank: 'Empty line',
	/** What a line of the form usually holds. */
	usually: (labels: readonly string[]): string => `Usually ${listed(labels.map(lower))}.`,
	signs: {
		before: 'Write ',
		unread: '?',
		between: ' for a character you cannot read, ',
		either: '[38]',
		after: ' for one that could be either.'
	},
	lookUp: (token: string): string => `Look up ${token}`,
	unplaced: 'No form that we know takes this line. Its codes, one at a time:',
	rows: 'Rows and sources',

	plate: {
		drawing: (lines: readonly string[]): string =>
			lines.length === 0
				? 'The tag, still empty.'
				: `The tag as typed, from the top: ${lines.join('; ')}.`,
		empty: 'Empty until a line is typed.',
		upwards: 'Read upwards: the lowest line comes first.',
		downwards: 'Read downwards.',
		key: 'Broken bar: does not tally. Dotted bar: cannot be told.'
	},

	form: {
		heading: 'Forms that are read line by line',
		none: 'Tags of other makers and years are kept as they are typed, and their codes can be looked up one at a time.'
	},
	readAs: (title: string): string => `Read as: ${title}.`,
	whole: 'The whole reading, with its sources',
	others: (n: number): string =>
		n === 1 ? 'One other reading is as likely.' : `${n} other readings are as likely.`,
	problems: 'Worth a second look',
	inOrder: 'Take this',

	example: {
		link: 'Fill in an example',
		note: 'Real code patterns; the numbers are invented, and two places differ on purpose.',
		maker: 'plymouth',
		year: '1970',
		serial: 'RM23N0G104127',
		lines: ['V1X Y05 END', 'C16 J25 N85', 'EV2 H6X9 000 B30 E12345', 'E61 D32 RM23 N0G104121']
	},

	seam: {
		heading: 'Between tag and serial',
		attribute: (attribute: TallyAttribute): string => {
			const word = tallyText.attribute(attribute);
			return `${word.charAt(0).toUpperCase()}${word.slice(1)}`;
		},
		paper: 'Serial plate',
		metal: 'Body tag',
		without: 'Nothing to hold it against yet. Type the serial number of the car beside the tag.',
		withoutTag: 'Type at least one line of the tag.',
		counts: (not: number, untold: number, tallies: number): string => {
			const parts = [
				not > 0 ? `${lower(counted(not, 'line does', 'lines do'))} not tally` : '',
				untold > 0 ? `${lower(counted(untold, 'line', 'lines'))} cannot be told` : '',
				tallies > 0 ? `${lower(counted(tallies, 'line tallies', 'lines tally'))}` : ''
			].filter(Boolean);
			const words = listed(parts);
			return words === ''
				? 'Nothing that both of them say.'
				: `${words.charAt(0).toUpperCase()}${words.slice(1)}.`;
		},
		lonely: (labels: readonly string[]): string =>
			`On one of them only, so not held against anything: ${listed(labels)}.`,
		weights: {
			heavy: 'Heavy',
			middling: 'Middling',
			light: 'Light'
		} satisfies Record<Weight, string>,
		weight: (weight: string, ground: string): string => `${weight}. ${ground}`,
		limit:
			'Agreement does not rule out that a plate or tag was changed, and a difference can be a misreading: look again before you conclude.',
		open: (label: string): string => `, ${lower(label)}: show both`,
		on: {
			does_not_tally: 'does not tally with the serial',
			cannot_be_told: 'cannot be told against the serial'
		}
	}
} as const;
