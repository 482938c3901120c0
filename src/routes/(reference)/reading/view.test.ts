import { describe, expect, it } from 'vitest';
import type { EditionHead } from '$lib/types';
import { answerTo } from '../../../../tests/fixtures/readings/answers';
import { answerView } from './answer-view';
import { viewOf } from './view';

const reading = (text: string, index = 0) => {
	const answer = answerTo(text, 'serial');
	return viewOf(answer.readings[index]!, answer.input.normalised);
};
const field = (text: string, label: string, index = 0) =>
	reading(text, index).groups.find((group) => group.field.label === label)!.field;

describe('a reading as shown', () => {
	it('partitions the characters into groups, in order', () => {
		const { groups } = reading('RH23L0E904127');
		expect(groups.flatMap(({ cells }) => cells).join('')).toBe('RH23L0E904127');
		expect(groups.map(({ id }) => id)).toEqual([
			'at-1',
			'at-2',
			'at-3-4',
			'at-5',
			'at-6',
			'at-7',
			'at-8-13'
		]);
	});

	it('hangs a derived field under the last of its parents and names its places', () => {
		const [, price] = reading('RM23N0G904127').groups;
		expect(price?.derived.map(({ label, places }) => `${label}, ${places}`)).toEqual([
			'Series, characters 1–2'
		]);
	});

	it('does not repeat the sources of a row that tells two fields', () => {
		const body = reading('7F91C5[38]4127').groups.find(
			({ field }) => field.label === 'Body serial'
		);
		expect(body?.derived.map(({ meaning, sameRow }) => [meaning, sameRow])).toEqual([
			['Cougar', true],
			['Two-door hardtop', true]
		]);
	});

	it('shows both values of a contested field and neither as its meaning', () => {
		const engine = field('RH23L0E904127', 'Engine');
		expect(engine.meaning).toBe('');
		expect(engine.alternatives).toHaveLength(2);
		expect(engine.mark).toBe('contested');
	});

	it('says not listed with what is known nearby, and not used with its source', () => {
		const plant = field('RH23L0E904127', 'Assembly plant');
		expect(plant.meaning).toBe('Not listed');
		expect(plant.possible[0]?.meaning).toBe('Los Angeles, California');
		const body = field('RH23L0E904127', 'Body style', 1);
		expect(body.meaning).toBe('Not used');
		expect(body.sources).toHaveLength(1);
	});

	it('tells unread from not typed', () => {
		expect(field('242379P9?4117', 'Sequence number').meaning).toBe('Cannot be read');
		const open = field('RM23N0G', 'Sequence number');
		expect([open.meaning, open.code, open.detail]).toEqual(['Not typed yet', '', '']);
		expect(reading('RM23N0G').groups.at(-1)?.cells).toEqual(['', '', '', '', '', '']);
	});

	it('says aloud what a cell shows', () => {
		expect(reading('7F91C5[38]4127').groups.at(-1)?.name).toBe(
			'characters 6–11, 5 3 or 8 4 1 2 7: Unit number'
		);
	});

	it('names each source once, the best kind first', () => {
		const { sources } = reading('RH23L0E904127');
		expect(new Set(sources.map(({ key }) => key)).size).toBe(sources.length);
		expect(sources[0]?.kind).toBe('factory_paper');
	});
});

describe('an answer as shown', () => {
	const head: EditionHead = {
		number: 43,
		parent: 42,
		digest: '9f3c07be51d2',
		cause: 'release',
		cause_id: null,
		made_at: '2026-06-12T00:00:00Z'
	};
	const view = (text: string, index = 0, present = 43) =>
		answerView({ answer: answerTo(text), head, present, query: { text }, index });

	it('shows the reading that is asked for, the others by name', () => {
		const second = view('RH23L0E904127', 1);
		expect(second.reading?.title).toContain('1980');
		expect(second.position).toBe('Second of two readings.');
		expect(second.others.map(({ address }) => address)).toEqual(['/?text=RH23L0E904127']);
	});

	it('shows the first when there is none of that number', () => {
		expect(view('RH23L0E904127', 9).reading?.title).toContain('1970');
	});

	it('calls equal readings either', () => {
		const { position, others } = view('904127');
		expect(position).toBe('One of two that fit equally well.');
		expect(others[0]?.equal).toBe(true);
	});

	it('says beside the field why nothing fits, with an offer', () => {
		const { reading, misfits, problems } = view('RMZ3N0G904127');
		expect(reading).toBeNull();
		expect(misfits[0]).toContain('character 3');
		expect(problems[0]?.offers[0]?.address).toBe('/?text=RM23N0G904127');
	});

	it('carries kind and edition in the permanent address', () => {
		expect(view('RM23N0G904127').permanent).toBe('/?kind=serial&text=RM23N0G904127&edition=43');
	});

	it('tells an older edition from the present one', () => {
		expect(view('RM23N0G904127').present).toBeNull();
		expect(view('RM23N0G904127', 0, 44).present).toBe(44);
	});

	it('works the check digit of seventeen characters only', () => {
		expect(view('1G1AY8760B5900417').work?.digit).toBe('0');
		expect(view('RM23N0G904127').work).toBeNull();
	});
});
