/**
 * Dates of gearboxes: a letter for the plant, which is also that of the kind of gearbox, and the date, without a year to
 * 1966, with a figure of the model year and a letter for the month from 1967; a part of the car's number may follow. And
 * the tag of a Turbo Hydra-Matic 400. The modules of `dates/` say what each form rests on, as do rows of table `layout`
 * under the ids of the forms and of these layouts.
 */
import type { DateFormatId } from '../../dates';
import type { LinedLayout } from '../../engine/lined-layout';
import { partialOf } from './partial-fields';
import { ANY, DIGITS, LETTERS } from './signs';

type Gearbox = Pick<LinedLayout, 'id' | 'title' | 'years' | 'source' | 'examples'> & {
	readonly format: DateFormatId;
	/** What may stand in each place, and how many are always there. */
	readonly chars: readonly string[];
	readonly fewest: number;
};

const gearbox = ({ format, chars, fewest, ...declared }: Gearbox): LinedLayout => ({
	...declared,
	kind: 'casting',
	maker: 'gm',
	order: 'down',
	lines: [
		{
			label: 'Gearbox',
			fields: [
				{
					name: 'assembly_date',
					label: 'Assembled',
					shape: { chars, fewest, whole: true },
					reads: {
						by: 'date',
						format,
						also: [
							{
								name: 'transmission',
								label: 'Gearbox',
								by: 'table',
								table: 'transmission',
								parts: [[1, 1]]
							},
							{
								name: 'transmission',
								label: 'Ratio',
								by: 'table',
								table: 'transmission',
								parts: [
									[1, 1],
									[-1, -1]
								]
							}
						]
					}
				},
				partialOf('123467')
			]
		}
	]
});

const MONTHS = 'ABCDEHKMPRST';

export const GEARBOXES: readonly LinedLayout[] = [
	gearbox({
		id: 'gm-muncie-1963-1967',
		title: 'Muncie four-speed, 1963–67: P, month, day',
		years: [1963, 1967],
		source: '2nd Gen Camaro Owners Group, Muncie 4-speed text',
		format: 'muncie-month-day',
		chars: ['P', '01', DIGITS, '0123', DIGITS, 'DN'],
		fewest: 5,
		examples: { good: 'P0503N', bad: 'P05' }
	}),
	gearbox({
		id: 'gm-muncie-1967-1974',
		title: 'Muncie four-speed, 1967–74: P, year, month letter, day, ratio',
		years: [1967, 1974],
		source: 'ChevelleStuff, Transmission identification 1970',
		format: 'muncie-year-month-day',
		chars: ['P', DIGITS, MONTHS, '0123', DIGITS, 'ABCW', 'BLO'],
		fewest: 5,
		examples: { good: 'P0R25A 10B100123', bad: 'P0R' }
	}),
	gearbox({
		id: 'gm-gearbox-1955-1966',
		title: 'Gearbox of a Chevrolet, to 1966: plant letter, month, day, shift',
		years: [1955, 1967],
		source: 'ChevelleStuff, Transmission identification 1966',
		format: 'gm-gearbox-month-day',
		chars: ['CEHKMRSTW', '01', DIGITS, '0123', DIGITS, 'DN'],
		fewest: 5,
		examples: { good: 'T1109D', bad: 'T11' }
	}),
	gearbox({
		id: 'gm-gearbox-1967-1975',
		title: 'Gearbox of a Chevrolet, 1967–75: plant letter, year, month letter, day, shift',
		years: [1967, 1975],
		source: 'ChevelleStuff, Transmission identification 1970',
		format: 'gm-gearbox-year-month-day',
		chars: ['BCEJKNRSTY', DIGITS, MONTHS, '0123', DIGITS, 'DN'],
		fewest: 5,
		examples: { good: 'B0R25', bad: 'B0R' }
	}),
	gearbox({
		id: 'gm-turbo-400-tag',
		title: 'Turbo Hydra-Matic 400, tag: year, code, day of the run',
		years: [1966, 1980],
		source: 'ChevelleStuff, Transmission identification 1970',
		format: 'turbo-400-run-day',
		chars: ['67', DIGITS, LETTERS, ANY, DIGITS, DIGITS, DIGITS],
		fewest: 6,
		examples: { good: '70CA298', bad: '70CA' }
	})
];
