/**
 * The body plate of General Motors, 1976 to 1980: year, time built, style number with letters, plant, body number; trim,
 * paint of lower body, upper body and accent, kind of paint, seat; codes of the plant's own. Sources: The Body Plate
 * (Olds G-Mail Reference Manual), for 1978 on, and the 1977 Nova tag of the Nova Resource, where the time built is not
 * told and the seat stands before the paint; row `gm-body-plate-1976-1980` of table `layout` cites both.
 */
import type { LinedLayout } from '../../engine/lined-layout';
import { ANY, DIGITS } from './signs';
import { TAG, options, plantAndNumber, seat, style, timeBuilt, trim, year } from './tag-fields';

/** Two figures; the letter for the place on the body may be printed behind them. */
const paint = (name: 'paint' | 'paint_upper', label: string, letter: string) =>
	({
		name,
		label,
		wordsAfter: [letter],
		shape: { chars: [DIGITS, DIGITS] },
		reads: { by: 'table', table: 'paint' }
	}) as const;

export const gmBodyPlate1976: LinedLayout = {
	...TAG,
	id: 'gm-body-plate-1976-1980',
	title: 'Body plate, General Motors, 1976–80',
	years: [1976, 1980],
	source: 'The Body Plate (Olds G-Mail Reference Manual); 1977 Nova cowl tag (Nova Resource)',
	lines: [
		{
			label: 'Style line',
			fields: [
				year(1976, 1980),
				{ ...timeBuilt, optional: true },
				...style('letters'),
				...plantAndNumber
			]
		},
		{
			label: 'Trim and paint',
			fields: [
				{ ...trim, shape: { chars: ANY, length: 3, whole: true } },
				seat,
				paint('paint', 'Lower body', 'L'),
				{ ...paint('paint_upper', 'Upper body', 'U'), optional: true },
				{ ...paint('paint', 'Accent', 'A'), optional: true },
				{
					name: 'unknown',
					label: 'Kind of paint',
					optional: true,
					shape: { chars: 'LWE', length: 1, whole: true },
					reads: { by: 'table', table: 'tag_field' }
				},
				seat
			]
		},
		{
			label: 'Plant use',
			optional: true,
			fields: [{ ...timeBuilt, optional: true }, options]
		}
	],
	examples: {
		good: '77 1XX27 W 112233 / 19N A51 51 51',
		bad: '19N A51 51 51'
	}
};
