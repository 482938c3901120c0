/**
 * The date struck on an axle or gearbox of General Motors without its plant letter: month and day, no year.
 * Source: D. McIntosh, "Chevelle Restoration and Authenticity Guide 1970–1972", on the warranty card's axle stamp; row
 * `gm-assembly-month-day` of table `layout` cites all.
 */
import { datesText } from '../../text/en/dates';
import type { DateFormat } from './format';
import { struckMonthAndDay } from './parts';

export const gmAssemblyMonthDay = {
	id: 'gm-assembly-month-day',
	title: 'General Motors assembly stamp: month, day',
	maker: 'gm',
	dates: 'unit_assembled',
	source: 'CarTech, Chevelle Restoration and Authenticity Guide 1970–1972',
	years: [1955, 1980],
	parts: [...struckMonthAndDay()],
	remark: datesText.remarks.noYear,
	example: { text: '0525', year: 1970, earliest: '1970-05-25', latest: '1970-05-25' }
} as const satisfies DateFormat;
