import { describe, expect, it } from 'vitest';
import { readContent } from '../../../../scripts/data/read';
import { compile, linesOf, readStamps } from '$lib/decoder';
import type { AnsweredReading, StampsAnswer } from '$lib/types';
import { seamOf } from './seam-lines';
import { doubtsOf, tagLines } from './tag-lines';

const tables = compile(readContent('data'));

/** Invented numbers in the pattern of a fender tag of 1970. */
const TAG = ['V1X Y05 END', 'C16 J25 QQ9', '', 'EV2 H6X9 000 B30 E12345', 'E61 D32 RM23 N0G104121'];

function page(typed: readonly string[], serial: string) {
	const lines = typed.filter((line) => linesOf(line).lines.length > 0);
	const answer = readStamps(tables, {
		stamps: [
			{ kind: 'serial', text: serial },
			{ kind: 'body_tag', text: lines.join('\n') }
		],
		context: { maker: 'chrysler', division: 'Plymouth', year: 1970 }
	}) as unknown as StampsAnswer;
	const tag = answer.stamps[1];
	let last = 0;
	return {
		lines: tagLines({
			typed,
			numbers: typed.map((line) => (linesOf(line).lines.length > 0 ? (last += 1) : null)),
			normalised: tag?.input.normalised ?? '',
			reading: tag?.readings[0] as AnsweredReading | undefined,
			problems: tag?.problems ?? [],
			doubts: doubtsOf(answer.lines, 1),
			scope: { maker: 'plymouth', year: '1970' }
		}),
		seam: seamOf(answer.lines, 0)
	};
}

const codes = (fields: readonly { readonly cells: readonly string[] }[]) =>
	fields.map(({ cells }) => cells.join(''));

describe('the lines of a tag', () => {
	const { lines, seam } = page(TAG, 'RM23N0G104127');

	it('stand where they were typed, a blank one too, and count without it', () => {
		expect(lines.map(({ typed }) => typed)).toEqual(TAG);
		expect(lines.map(({ number }) => number)).toEqual([1, 2, null, 3, 4]);
	});

	it('are read code by code', () => {
		expect(codes(lines[0]?.fields ?? [])).toEqual(['V1X', 'Y05', 'END']);
		expect(codes(lines[4]?.fields ?? [])).toEqual(['E61', 'D32', 'RM23', 'N0G104121']);
		expect(lines[4]?.cells.join('')).toBe('E61 D32 RM23 N0G104121');
	});

	it('offer a code that no row has to be looked up by itself', () => {
		const unlisted = lines[1]?.fields.find(({ cells }) => cells.join('') === 'QQ9');
		expect(unlisted?.lookUp).toBe('/?kind=code&text=QQ9&maker=plymouth&year=1970');
		expect(lines[0]?.fields.map(({ lookUp }) => lookUp)).toEqual([null, null, null]);
	});

	it('have a bar under what differs from the serial, as wide as the code', () => {
		expect(lines[4]?.bars).toEqual([
			{ from: 0, to: 3, result: 'cannot_be_told' },
			{ from: 13, to: 22, result: 'does_not_tally' }
		]);
		expect(lines[0]?.bars).toEqual([]);
	});

	it('meet the serial at the seam: what differs first, the number that the tag repeats beside its own code', () => {
		expect(seam.summary).toMatch(
			/^One line does not tally, one line cannot be told and .* tally\.$/
		);
		expect(
			seam.open.map(({ key, result, paper, metal }) => [
				key.replace(/-\d+$/, ''),
				result,
				paper.cells.join(''),
				metal.cells.join('')
			])
		).toEqual([
			['sequence_number', 'does_not_tally', '104127', '104121'],
			['engine', 'cannot_be_told', 'N', 'E61']
		]);
		expect(seam.tallies.map(({ paper }) => paper.label)).toContain('Maker');
		expect(seam.lonely).toContain('Paint');
	});
});

describe('lines that no form takes', () => {
	it('are kept, and each of their codes can be looked up', () => {
		const { lines } = page(['ZZZZZZZZ', 'A [38]? /'], 'RM23N0G104127');
		expect(lines.map(({ typed }) => typed)).toEqual(['ZZZZZZZZ', 'A [38]? /']);
		for (const { fields, tokens } of lines)
			expect(fields.length + tokens.length).toBeGreaterThan(0);
	});
});
