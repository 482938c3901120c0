/**
 * The part of the serial number on engine and transmission of Chrysler Corporation from 1968: the figure of the year,
 * the plant, and the sequence number. Row `chrysler-partial-serial` of table `layout` cites what it rests on.
 */
import type { LinedLayout } from '../../engine/lined-layout';
import { partOfSerial } from './engine-fields';

export const chryslerPartialSerial: LinedLayout = {
	id: 'chrysler-partial-serial',
	kind: 'engine',
	maker: 'chrysler',
	title: 'Part of the serial number, Chrysler Corporation, from 1968',
	years: [1968, 1980],
	source: 'From memory',
	order: 'down',
	lines: [{ label: 'Part of the serial number', fields: [partOfSerial] }],
	examples: { good: '0B183475', bad: '0B18' }
};
