/**
 * The plate on the edge of the driver's door of American Motors: body number, model number (year, line, body and, behind
 * a dash, series), trim number, paint code. From memory; row `amc-body-plate` of table `layout` says so.
 */
import type { LineField, LinedLayout } from '../../engine/lined-layout';

const DIGITS = '0123456789';
const ANY = `ABCDEFGHIJKLMNOPQRSTUVWXYZ${DIGITS}`;

const line = (field: LineField) => ({ label: field.label, fields: [field] });

export const amcBodyPlate: LinedLayout = {
	id: 'amc-body-plate',
	kind: 'body_tag',
	maker: 'amc',
	title: 'Body plate, American Motors, 1968–74',
	years: [1968, 1974],
	source: 'From memory',
	order: 'down',
	lookFirst: ['body_style'],
	lines: [
		line({
			name: 'body_number',
			label: 'Body number',
			words: ['BODY'],
			shape: { chars: ANY, length: [5, 7] },
			reads: { by: 'number' }
		}),
		line({
			name: 'body_style',
			label: 'Model number',
			words: ['MODEL'],
			shape: { chars: DIGITS, length: 5 },
			reads: { by: 'table', table: 'body_code' }
		}),
		line({
			name: 'trim',
			label: 'Trim number',
			words: ['TRIM'],
			shape: { chars: ANY, length: [3, 5] },
			reads: { by: 'table', table: 'trim' }
		}),
		line({
			name: 'paint',
			label: 'Paint',
			words: ['PAINT'],
			shape: { chars: ANY, length: [2, 4] },
			reads: { by: 'table', table: 'paint' }
		})
	],
	examples: {
		good: 'BODY ?????? / MODEL 7079-7 / TRIM ???? / PAINT ???',
		bad: 'BODY ?????? / PAINT ???'
	}
};
