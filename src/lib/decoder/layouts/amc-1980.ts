/**
 * American Motors, model year 1980: thirteen characters that begin with A, the year as A or 0.
 * Issued at Kenosha and Brampton; on the instrument panel, seen through the windshield. Characters 5 and 6 have other names
 * than in 1974 to 1979; from 1981 on the number has seventeen characters.
 * Source: the page "Vehicle identification: AMC and Eagle" of a repair data manual; row `amc-1980` of table `layout`.
 */
import { yearsByCharacter, type Layout } from '../engine/layout';
import { amcCommon, amcFields } from './amc-1968-1979';

export const amc1980: Layout = {
	...amcCommon,
	id: 'amc-1980',
	title: 'American Motors, 13 characters, 1980',
	years: [1980, 1980],
	source: 'Vehicle identification: AMC and Eagle, section of a repair data manual',
	fields: amcFields({ years: 'A0', body: 'Body style', series: 'Body type' }),
	yearsOf: yearsByCharacter(2, { '0': [1980], A: [1980] }),
	examples: { good: 'A0A060C100001', bad: 'A0A0G0C100001' }
};
