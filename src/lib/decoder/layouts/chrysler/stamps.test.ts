/** What the stamps of Chrysler Corporation are read as: their forms, not what the released tables say of the codes. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readContent } from '../../../../../scripts/data/read';
import { compile, read } from '../..';
import type { Reading, ReadContext, StampKind } from '../../../types';

const tables = compile(readContent('data'));
const firstOf = (kind: StampKind, text: string, context: ReadContext = {}): Reading | undefined =>
	read(tables, { text, kind, context: { maker: 'chrysler', ...context } }).readings[0];
const ownFields = (reading: Reading | undefined) =>
	(reading?.fields ?? []).filter((field) => field.derived_from === undefined);
const told = (reading: Reading | undefined) =>
	ownFields(reading).map(({ name, code }) => `${name} ${code}`);

const sizes = fc.constantFrom('273', '318', '340', '383', '440');
const marks = fc.constantFrom('', 'HP', 'HP2', 'LC');
const days = fc.tuple(fc.integer({ min: 1, max: 12 }), fc.integer({ min: 1, max: 28 }));

describe('an engine pad', () => {
	it('is read with letter, size, mark and date, the mark before the date or after', () => {
		fc.assert(
			fc.property(
				fc.constantFrom(...'ABCDEFGHJK'),
				sizes,
				marks,
				days,
				fc.boolean(),
				(letter, size, mark, [month, day], first) => {
					const date = `${month} ${day}`;
					const parts = first ? [mark, date] : [date, mark];
					const reading = firstOf('engine', [`${letter}${size}`, ...parts].join(' '));
					expect(reading?.layout).toBe('chrysler-engine-pad');
					const codes = parts.filter((part) => part !== '').map((part) => part.replace(' ', ''));
					expect(ownFields(reading).map(({ code }) => code)).toEqual([letter, size, ...codes]);
				}
			),
			{ numRuns: 100 }
		);
	});

	it('dates an engine of the autumn into the year before the model year', () => {
		const date = firstOf('engine', 'F383 9 28')?.fields.find(
			({ name }) => name === 'assembly_date'
		);
		expect(date?.values).toMatchObject({ earliest: '1969-09-28', latest: '1969-09-28' });
	});

	it('with a figure is of the seventies, whatever letter follows the size', () => {
		const reading = firstOf('engine', '7T440T HP 9 28');
		expect(reading?.model_year).toBe(1977);
		expect(told(reading)).toEqual([
			'model_year 7',
			'assembly_plant T',
			'engine 440',
			'option T',
			'option HP',
			'assembly_date 928'
		]);
	});
});

it('numbers of engines and transmissions are read back, with the part of the serial number beside them', () => {
	fc.assert(
		fc.property(
			fc.constantFrom('PM340', 'PT440', 'PW318', 'PK2801547', 'PP833'),
			fc.integer({ min: 2345, max: 4536 }),
			fc.integer({ min: 0, max: 9999 }),
			(head, day, unit) => {
				const kind = head.startsWith('PK') || head.startsWith('PP') ? 'casting' : 'engine';
				const text = `${head} ${day} ${String(unit).padStart(4, '0')}`;
				const reading = firstOf(kind, `${text} 9B123456`);
				expect(
					ownFields(reading)
						.map(({ code }) => code)
						.join('')
				).toBe(`${text} 9B123456`.replaceAll(' ', ''));
				expect(ownFields(reading).map(({ name }) => name)).toContain('partial_serial');
			}
		),
		{ numRuns: 60 }
	);
});

describe('a tag of punched columns', () => {
	const lower = 'AX 1 TRM P2F PNT BT2 / PP23 41 5 53 818 193128';
	const options = (text: string) =>
		(firstOf('body_tag', text, { year: 1968 })?.fields ?? [])
			.filter(({ label }) => /^Option|Numbered|Struck/.test(label))
			.map(({ label, code, meaning }) => [label, code, meaning]);

	it('tells a capital letter from a small one by the line', () => {
		expect(options(`H7 Y8 / N8 H7 / ${lower}`)).toEqual([
			['Option, small letter', 'H7', 'Hood-mounted turn signals'],
			['Struck on the line, small letter', 'Y8', 'Sales or delivery special instruction'],
			['Option', 'N8', 'Rear window defogger'],
			['Option', 'H7', null]
		]);
	});

	it('takes a single line of letters for the capital ones', () => {
		expect(options(`H7 / ${lower}`)).toEqual([['Option', 'H7', null]]);
	});

	it('is of 1967 as well, where its columns have no meaning yet', () => {
		const reading = firstOf('body_tag', `N8 / ${lower}`, { year: 1967 });
		expect(reading?.layout).toBe('chrysler-fender-tag-1967');
		expect(reading?.fields.find(({ code }) => code === 'N8')?.outcome).toBe('not_listed');
		expect(reading?.fields.find(({ name }) => name === 'build_date')?.meaning).toContain(
			'18 August 1966'
		);
	});
});

describe('a tag of 1969 to 1974', () => {
	const tag = (options: string, second: string) =>
		firstOf('body_tag', `${options} / ${second} / E74 D32 RM23 R0B123456`);

	it('has axle, roof and stripe among its options, each by its own table', () => {
		const reading = tag('C16 D56 J25 V1X V6X Y05 END', 'EV2 H6X9 000 B30 E12345');
		expect(told(reading).slice(0, 7)).toEqual([
			'option C16',
			'axle D56',
			'option J25',
			'roof V1X',
			'option V6X',
			'option Y05',
			'option END'
		]);
		expect(reading?.fields.find(({ code }) => code === 'V6X')?.outcome).toBe('found');
	});

	it('may have its axle first on a line', () => {
		expect(told(tag('D91 G11', 'EV2 H6X9 000 B30 E12345')).slice(0, 2)).toEqual([
			'axle D91',
			'option G11'
		]);
	});

	it('has a color where the upper door frame is painted', () => {
		const upper = tag('C16', 'EV2 H6X9 TX9 B30 E12345')?.fields.find(
			({ name }) => name === 'paint_upper'
		);
		expect(upper).toMatchObject({ code: 'TX9', outcome: 'found' });
	});

	it('tells color and seat of a trim that is not listed whole', () => {
		const trims = tag('C16', 'EV2 L4B5 000 B30 E12345')?.fields.filter(
			({ name }) => name === 'trim'
		);
		expect(trims?.map(({ label, meaning }) => [label, meaning])).toEqual([
			['Trim', 'Blue'],
			['Seat', 'Split-back bench, vinyl']
		]);
	});
});
