import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readContent } from '../../../../../scripts/data/read';
import { compile, read, readStamps } from '../..';

const tables = compile(readContent('data'));
const beside = (serial: string, tag: string) =>
	readStamps(tables, {
		stamps: [
			{ kind: 'serial', text: serial },
			{ kind: 'body_tag', text: tag }
		]
	}).lines;
const readTag = (text: string) => read(tables, { text, kind: 'body_tag', context: {} });

describe('a Fisher body tag beside the serial number', () => {
	it('tallies in year, division, line and plant', () => {
		const lines = beside(
			'124379N512345',
			'ST 69 12437 NOR 123456 BDY / TR 711 72 B PNT / 04C X33 D80'
		);
		const tallying = lines.filter(({ result }) => result === 'tallies');
		expect(tallying.map(({ attribute }) => attribute)).toEqual(
			expect.arrayContaining(['division', 'model_year', 'line', 'body_style', 'assembly_plant'])
		);
		expect(lines.filter(({ result }) => result === 'does_not_tally')).toEqual([]);
	});

	it('never holds the last figure of the series against the serial number', () => {
		const series = fc.constantFrom('13', '23', '33', '35', '53', '55', '63');
		fc.assert(
			fc.property(series, fc.boolean(), fc.constantFrom('69', '70', '71'), (odd, six, year) => {
				const even = String(Number(odd) + 1);
				const [serial, tag] = six ? [odd, even] : [even, odd];
				const lines = beside(
					`1${serial}37${year.slice(1)}N112345`,
					`ST ${year} 1${tag}37 NOR 12345 BDY / TR 711 10 10 PNT / 04C`
				);
				expect(lines.filter(({ result }) => result === 'does_not_tally')).toEqual([]);
				const engines = lines.filter(({ attribute }) => attribute === 'engine');
				expect(engines.every(({ right }) => right === null)).toBe(true);
			})
		);
	});

	it('tells another plant, where rows are good enough, as different or as open, never as tallying', () => {
		const lines = beside('124379L512345', 'ST 69 12437 NOR 123456 BDY / TR 711 72 B PNT / 04C');
		const plant = lines.find(({ attribute }) => attribute === 'assembly_plant');
		expect(plant?.result).not.toBe('tallies');
	});
});

describe('what a tag holds beyond its form', () => {
	it('is kept as unknown', () => {
		const { readings } = readTag('04C 1234567 / ST 68 24237 PON 12345 BDY 7 / TR 223 GG PNT');
		const unknown = readings[0]?.fields.filter(({ name }) => name === 'unknown');
		expect(unknown?.map(({ code, outcome }) => [code, outcome])).toEqual([
			['1234567', 'not_listed'],
			['7', 'not_listed']
		]);
	});

	it('is read in the order that it has, and the order of the plate is offered', () => {
		const { readings, problems } = readTag('ST 68 24237 PON 12345 BDY / TR 223 GG PNT / 04C');
		expect(readings[0]?.fields.find(({ name }) => name === 'build_date')?.code).toBe('04C');
		expect(problems.flatMap(({ offers }) => offers.map(({ text }) => text))).toContain(
			'04C / ST 68 24237 PON 12345 BDY / TR 223 GG PNT'
		);
	});

	it('reads a top beside the color of the body', () => {
		const [reading] = readTag('04C / ST 67 12437 NOR 12345 BODY / TR 760-Z N-1 PAINT').readings;
		const told = reading?.fields.map(({ name, meaning }) => [name, meaning]);
		expect(told).toContainEqual(['paint', 'Maroon']);
		expect(told).toContainEqual(['roof', 'White top']);
	});

	it('takes the body for the scope of the series', () => {
		const [reading] = readTag('ST 70 13857 BAL 12345 BDY / TR 755 25 25 PNT / 02B').readings;
		expect(reading?.fields.find(({ name }) => name === 'line')?.meaning).toBe('Monte Carlo');
	});

	it('leaves the scope open while a figure of the body is unread', () => {
		const [reading] = readTag('ST 70 1385? BAL 12345 BDY / TR 755 25 25 PNT / 02B').readings;
		const line = reading?.fields.find(({ name }) => name === 'line');
		expect(line?.possible.map(({ meaning }) => meaning)).toContain('Monte Carlo');
	});
});

describe('the letters of an engine alone', () => {
	it('are those of the division that was given, before those of another', () => {
		const first = (division?: string) =>
			read(tables, {
				text: 'JE',
				kind: 'engine',
				context: { maker: 'gm', year: 1967, ...(division === undefined ? {} : { division }) }
			}).readings[0];
		expect(first('Chevrolet')).toMatchObject({ layout: null });
		expect(first('Chevrolet')?.fields[0]).toMatchObject({ code: 'JE', outcome: 'found' });
		expect(first('Pontiac')?.layout).toBe('pontiac-engine-stamp');
		expect(first()?.layout).toBe('pontiac-engine-stamp');
	});
});
