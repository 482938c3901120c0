/**
 * The seventeen-character number of ISO 3779 and 49 CFR 565, model year 1981 on.
 * Characters 1-3 name the maker (ISO 3780), 4-8 describe, 9 is a check digit in North America, 10 the model year,
 * 11 the plant, 12-17 the running number. A 9 in third place marks a maker of few vehicles, whose identifier goes on
 * in places 12 to 14 and whose running number has three figures.
 * Sources: 49 CFR 565.13 and 565.15; ISO 3779; ISO 3780. Letters I, O and Q are not used.
 */
import { isRead, UNREAD, type Cell } from '../engine/characters';
import { isNorthAmerican, VIN_CHARACTERS } from '../engine/check-digit';
import { yearsByCharacter, type Layout, type PrimaryField } from '../engine/layout';
import { decoderText as text } from '../../text/en/decoder';

/** The code order of model years: thirty characters, I, O, Q, U, Z and 0 left out (49 CFR 565.15, table VII). */
const YEAR_CODES = 'ABCDEFGHJKLMNPRSTVWXY123456789';
const FIRST_CYCLE = 1980;
const byCode: Record<string, number[]> = Object.fromEntries(
	[...YEAR_CODES].map((code, index) => [code, [FIRST_CYCLE + index, FIRST_CYCLE + 30 + index]])
);
const bothCycles = yearsByCharacter(10, byCode);

const OPEN = [null] as const;

/**
 * Position 7 tells the thirty-year cycle on cars and light trucks for the United States: a figure to 2009, a letter from 2010.
 * Where the first character is not North American, the standard leaves the year open.
 */
function yearsOf(cells: readonly Cell[]): readonly (number | null)[] {
	if (!isNorthAmerican(cells[0] as Cell) && isRead(cells[0] as Cell)) return OPEN;
	const first = cells[0] as Cell;
	const may = (test: (character: string) => boolean): boolean =>
		first === UNREAD || [...first].some(test);
	const years: (number | null)[] = [];
	if (may(isNorthAmerican)) {
		const seventh = cells[6] as Cell;
		const figure = seventh === UNREAD || /[0-9]/.test(seventh);
		const letter = seventh === UNREAD || /[A-Z]/.test(seventh);
		const late = (year: number): boolean => year >= FIRST_CYCLE + 30;
		for (const year of bothCycles(cells))
			if (year !== null && (late(year) ? letter : figure)) years.push(year);
	}
	if (may((character) => !isNorthAmerican(character))) years.push(null);
	return years;
}

const yearDetail = (cells: readonly Cell[]): string => {
	const seventh = cells[6] as Cell;
	return isRead(seventh) ? text.year.positionSeven(/[0-9]/.test(seventh)) : text.year.repeats;
};

const WITHOUT_NINE = VIN_CHARACTERS.replace('9', '');

const fieldsFor = (few: boolean): PrimaryField[] => [
	{
		name: 'wmi',
		label: 'Manufacturer identifier',
		from: 1,
		to: 3,
		chars: [VIN_CHARACTERS, VIN_CHARACTERS, few ? '9' : WITHOUT_NINE],
		reads: few
			? {
					by: 'table',
					table: 'wmi',
					parts: [
						[1, 3],
						[12, 14]
					],
					otherwise: [[1, 3]]
				}
			: { by: 'table', table: 'wmi' }
	},
	{
		name: 'unknown',
		label: 'Description by the maker',
		from: 4,
		to: 8,
		chars: VIN_CHARACTERS,
		reads: { by: 'unknown' }
	},
	{
		name: 'check_digit',
		label: 'Check digit',
		from: 9,
		to: 9,
		chars: VIN_CHARACTERS,
		reads: { by: 'check_digit' }
	},
	{
		name: 'model_year',
		label: 'Model year',
		from: 10,
		to: 10,
		chars: VIN_CHARACTERS,
		reads: { by: 'year' }
	},
	{
		name: 'assembly_plant',
		label: 'Assembly plant',
		from: 11,
		to: 11,
		chars: VIN_CHARACTERS,
		reads: { by: 'table', table: 'assembly_plant' }
	},
	...(few
		? ([
				{
					name: 'wmi',
					label: 'Manufacturer identifier, second part',
					from: 12,
					to: 14,
					chars: VIN_CHARACTERS,
					reads: {
						by: 'table',
						table: 'wmi',
						parts: [
							[1, 3],
							[12, 14]
						]
					}
				}
			] satisfies PrimaryField[])
		: []),
	{
		name: 'sequence_number',
		label: 'Running number',
		from: few ? 15 : 12,
		to: 17,
		chars: VIN_CHARACTERS,
		reads: { by: 'sequence' }
	}
];

const common = {
	kind: 'serial',
	maker: 'other',
	years: [1980, 2039],
	length: 17,
	source: '49 CFR 565.13 and 565.15; ISO 3779; ISO 3780',
	divisionFrom: 'wmi',
	lineFrom: 'wmi',
	derived: [
		{
			name: 'country',
			label: 'Country of the identifier',
			parents: ['wmi'],
			reads: { by: 'table', table: 'country', parts: [[1, 2]] }
		}
	],
	yearsOf,
	yearDetail,
	beginsWithoutYear: true
} as const satisfies Partial<Layout>;

/** Makers of 1,000 and more vehicles of a type a year. */
export const iso17: Layout = {
	...common,
	id: 'iso-17',
	title: '17 characters, ISO 3779 and 49 CFR 565',
	fields: fieldsFor(false),
	examples: { good: '1M8GDM9AXKP042788', bad: '1M8GDM9AXKPO42788' }
};

/** Makers of fewer: third character 9. */
export const iso17FewVehicles: Layout = {
	...common,
	id: 'iso-17-few',
	title: '17 characters, maker of few vehicles',
	fields: fieldsFor(true),
	examples: { good: '1J9RP1A36A1644345', bad: '1J9RP1A36A16443I5' }
};
