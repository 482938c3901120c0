/**
 * The certification label of Ford, Mercury and Lincoln, 1970 to 1980: month and year of manufacture and the serial
 * number in the upper half; below them body, color, trim, axle, transmission and district, each with its printed word.
 * It carries no scheduled date. Labels of the later years carry more codes, which are told as not placed.
 * Sources: Cougar Club of America; GMV Registry; row `ford-label-1970-1980` of table `layout` cites all.
 */
import type { LinedLayout } from '../../engine/lined-layout';
import { axle, body, districts, paint, serialLine, transmission, trim } from './plate-fields';
import { DIGITS } from './signs';

export const fordLabel1970: LinedLayout = {
	id: 'ford-label-1970-1980',
	kind: 'body_tag',
	maker: 'ford',
	title: 'Certification label, Ford Motor Company, 1970–80',
	years: [1970, 1980],
	source: 'Cougar Club of America, certification label; GMV Registry, certification label',
	order: 'down',
	lookFirst: ['body_style'],
	divisionFrom: 'body_style',
	lines: [
		{
			label: 'Month and year of manufacture',
			optional: true,
			fields: [
				{
					name: 'build_date',
					label: 'Manufactured',
					words: ['MFD', 'DATE'],
					shape: { chars: ['01', DIGITS, '678', DIGITS] },
					reads: { by: 'date', format: 'label-month-year' }
				}
			]
		},
		serialLine,
		{
			label: 'Codes',
			fields: [body, paint, trim, axle, transmission, ...districts]
		}
	],
	examples: {
		good: '08/70 / 1F91Mxxxxxx / BODY 65D COLOR J TRIM 1A AXLE 6 TRANS X DSO 21',
		bad: '08/70 / 1F91Mxxxxxx'
	}
};
