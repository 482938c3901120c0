/**
 * The assembly date struck on the pad of a General Motors engine: plant letter, month and day, no year, as V0525. A
 * one may be struck as a roman I.
 * Source: Drivin’ It Home, "Engine codes", and chevy-camaro.com, "Engine suffix code help"; row `gm-engine-month-day` of table `layout` cites all.
 */
import { LETTERS } from '../engine/characters';
import { datesText } from '../../text/en/dates';
import type { DateFormat } from './format';
import { otherPart, struckMonthAndDay } from './parts';

const text = datesText.parts;

export const gmEngineMonthDay = {
	id: 'gm-engine-month-day',
	title: 'General Motors engine stamp: plant letter, month, day',
	maker: 'gm',
	dates: 'unit_assembled',
	unit: 'engine',
	source: 'Drivin’ It Home, Engine codes',
	years: [1955, 1980],
	parts: [otherPart(text.plantLetter, LETTERS), ...struckMonthAndDay()],
	remark: datesText.remarks.noYear,
	example: { text: 'V0525', year: 1970, earliest: '1970-05-25', latest: '1970-05-25' }
} as const satisfies DateFormat;
