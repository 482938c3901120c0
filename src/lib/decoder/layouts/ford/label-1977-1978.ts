/**
 * The certification label of full-size Mercury in 1977, as read from a car: color, vinyl roof, body, trim, date,
 * transmission, axle, air conditioning, district. The upper half is as before. Row `ford-label-1977-1978` of table
 * `layout` cites what it rests on; for how many lines and years it holds is not known.
 */
import type { LinedLayout } from '../../engine/lined-layout';
import {
	axle,
	body,
	dates,
	districts,
	paint,
	serialLine,
	transmission,
	trim
} from './plate-fields';
import { ANY } from './signs';

export const fordLabel1977: LinedLayout = {
	id: 'ford-label-1977-1978',
	kind: 'body_tag',
	maker: 'ford',
	title: 'Certification label, Ford Motor Company, 1977–78, with vinyl roof and air conditioning',
	years: [1977, 1978],
	source: '1977 Mercury Marquis Brougham, a viewer’s reading of its label',
	order: 'down',
	lookFirst: ['body_style'],
	divisionFrom: 'body_style',
	lines: [
		{ ...serialLine, optional: true },
		{
			label: 'Codes',
			fields: [
				paint,
				{
					name: 'roof',
					label: 'Vinyl roof',
					words: ['VR'],
					optional: true,
					shape: { chars: ANY, length: 2 },
					reads: { by: 'table', table: 'roof' }
				},
				body,
				trim,
				...dates,
				transmission,
				axle,
				{
					name: 'option',
					label: 'Air conditioning',
					words: ['AC'],
					optional: true,
					shape: { chars: ANY, length: 1 },
					reads: { by: 'table', table: 'option' }
				},
				...districts
			]
		}
	],
	examples: { good: '8K BT 53K RZ 07G X B A 22', bad: '8K BT' }
};
