import { describe, expect, it } from 'vitest';
import { buildCitation, buildSource } from '../../../../tests/fixtures/builders';
import type { Citation, SourceKind } from '../../types';
import { strengthOf } from './strength';

const KEYS: readonly SourceKind[] = [
	'factory_paper',
	'law',
	'standard',
	'book',
	'club_research',
	'magazine',
	'web_page',
	'dataset',
	'common_practice',
	'memory'
];
const sources = new Map(
	[
		...KEYS.map((kind) => buildSource(kind.replace('_', '-'), { kind })),
		buildSource('web-two', { kind: 'web_page' }),
		buildSource('web-copy', { kind: 'web_page', repeats: 'web-page' }),
		buildSource('snake', { kind: 'web_page', repeats: 'tail' }),
		buildSource('tail', { kind: 'web_page', repeats: 'snake' }),
		buildSource('lost-copy', { kind: 'web_page', repeats: 'gone' }),
		...['car-1', 'car-2', 'car-3'].map((key) => buildSource(key, { kind: 'car_seen' }))
	].map((source) => [source.key, source])
);
const cite = (source: string, parts: Partial<Citation> = {}) =>
	buildCitation('gm.engine.t.1', source, parts);
const rate = (...citations: Citation[]) => strengthOf(citations, sources);
const against = { stance: 'against' } as const;

describe('strength', () => {
	it.each([
		['factory paper', [cite('factory-paper')], 'firm'],
		['law', [cite('law')], 'firm'],
		['a standard', [cite('standard')], 'firm'],
		['a book and a web page', [cite('book'), cite('web-page')], 'firm'],
		['club research and a magazine', [cite('club-research'), cite('magazine')], 'firm'],
		['a book', [cite('book')], 'fair'],
		['club research', [cite('club-research')], 'fair'],
		['a magazine', [cite('magazine')], 'fair'],
		['two web pages', [cite('web-page'), cite('web-two')], 'fair'],
		['a web page and its copy', [cite('web-page'), cite('web-copy')], 'thin'],
		['a book and memory', [cite('book'), cite('memory')], 'fair'],
		['three cars', [cite('car-1'), cite('car-2'), cite('car-3')], 'fair'],
		['two cars', [cite('car-1'), cite('car-2')], 'thin'],
		['a web page', [cite('web-page')], 'thin'],
		['common practice', [cite('common-practice')], 'thin'],
		['memory', [cite('memory')], 'thin'],
		['a book read by title only', [cite('book', { read: 'title' })], 'not_rated'],
		['a source that is gone', [cite('nowhere')], 'not_rated'],
		['nothing', [], 'not_rated'],
		['two copies of each other', [cite('snake'), cite('tail')], 'fair'],
		['a copy of something lost', [cite('lost-copy')], 'thin']
	] as const)('%s: %#', (_, citations, strength) => {
		expect(rate(...citations).strength).toBe(strength);
	});

	it('goes down one step when one car speaks against it, and says so', () => {
		expect(rate(cite('law'), cite('car-1', against))).toMatchObject({
			strength: 'fair',
			why: 'Rests on one law or regulation; one car seen against, which lowers it by one step.'
		});
		expect(rate(cite('book'), cite('car-1', against)).strength).toBe('thin');
		expect(rate(cite('memory'), cite('car-1', against)).strength).toBe('not_rated');
		expect(rate(cite('car-1', against)).strength).toBe('not_rated');
		const three = [cite('car-1'), cite('car-2'), cite('car-3'), cite('car-3', against)];
		expect(rate(...three).strength).toBe('not_rated');
	});

	it('says what it rests on', () => {
		expect(rate(cite('web-page'), cite('web-two'), cite('memory'), cite('car-1')).why).toBe(
			'Rests on two independent web pages, memory, no source and one car seen.'
		);
		expect(rate(cite('book'), cite('magazine', against)).why).toBe(
			'Rests on one book; one source against.'
		);
		expect(rate().why).toBe('Rests on nothing yet.');
	});

	it('counts memory and common practice as no citation', () => {
		expect(rate(cite('memory'), cite('common-practice')).cited).toBe(false);
		expect(rate(cite('web-page')).cited).toBe(true);
		expect(rate(cite('car-1')).cited).toBe(true);
	});
});
