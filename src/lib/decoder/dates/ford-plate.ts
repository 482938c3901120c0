/**
 * The date of a Ford plate or label: day, then month letter, I and O left out; N to Z are the months of a second calendar
 * year.
 * Source: SCOA archive, "Date codes" (Bob Goodson); that it is the date scheduled: Love Fords, "Date code system". Row
 * `ford-plate` of table `layout` cites all.
 */
import { datesText } from '../../text/en/dates';
import type { DateFormat } from './format';
import { dayNumberPart, monthLetters } from './parts';
import { fordYears } from './years';

export const fordPlate = {
	id: 'ford-plate',
	title: 'Ford plate date: day and month letter',
	maker: 'ford',
	dates: 'scheduled',
	source: 'SCOA archive, Date codes',
	years: [1958, 1980],
	parts: [dayNumberPart(), monthLetters('ABCDEFGHJKLMNPQRSTUVWXYZ')],
	remark: datesText.remarks.fordPlate,
	yearsOf: fordYears,
	example: { text: '24D', year: 1969, earliest: '1969-04-24', latest: '1969-04-24' }
} as const satisfies DateFormat;
