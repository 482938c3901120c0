/**
 * The stamp on the tube of the rear axle, or on a tag at its cover: the code of the axle, whose third letter names its
 * maker, month and day, and a letter for the plant; no year. Row `gm-axle-stamp` of table `layout` cites it.
 */
import type { LinedLayout } from '../../engine/lined-layout';
import { DIGITS, LETTERS } from './signs';

export const gmAxleStamp: LinedLayout = {
	id: 'gm-axle-stamp',
	kind: 'casting',
	maker: 'gm',
	title: 'Axle stamp, General Motors: code, month, day, plant',
	years: [1965, 1978],
	source: 'A Protect-O-Plate of 1970, in the Chevelle Restoration and Authenticity Guide 1970–1972',
	order: 'down',
	lines: [
		{
			label: 'Axle',
			fields: [
				{
					name: 'axle',
					label: 'Axle',
					shape: { chars: [LETTERS, LETTERS, LETTERS], fewest: 2 },
					reads: {
						by: 'table',
						table: 'axle',
						also: [
							{
								name: 'axle',
								label: 'Maker of the axle',
								by: 'table',
								table: 'axle',
								parts: [[3, 3]]
							}
						]
					}
				},
				{
					name: 'assembly_date',
					label: 'Assembled',
					shape: { chars: ['01I', `${DIGITS}I`, '0123I', `${DIGITS}I`] },
					reads: { by: 'date', format: 'gm-assembly-month-day' }
				},
				{
					name: 'unknown',
					label: 'Plant of the axle',
					optional: true,
					shape: { chars: [LETTERS] },
					reads: { by: 'unknown' }
				}
			]
		}
	],
	examples: { good: 'CRV1215B', bad: 'CRV' }
};
