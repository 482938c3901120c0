import { describe, expect, it } from 'vitest';
import { buildCitation, buildRow } from '../../../tests/fixtures/builders';
import { cellChanges } from './row-changes';

const version = (meaning: string, parts: Parameters<typeof buildRow>[4], ...sources: string[]) => {
	const row = buildRow('ford', 'engine', 'C', meaning, parts);
	return { row, citations: sources.map((source) => buildCitation(row.row_key, source)) };
};
const titleOf = (key: string) => `The ${key}`;

describe('what differs between two versions of a row', () => {
	it('is nothing when they say the same', () => {
		const one = version('289 V8', { values: { cylinders: 8 } }, 'book');
		expect(cellChanges(one, structuredClone(one), titleOf)).toEqual([]);
	});

	it('is told cell by cell, old and new, empty where there was none', () => {
		const old = version(
			'289 V8',
			{ values: { displacement_cuin: 289 }, years: [1966, 1966] },
			'book'
		);
		const now = version(
			'289 V8, two-barrel',
			{
				values: { displacement_cuin: 289, displacement_l: 4.7 },
				years: [1965, 1966],
				division: ['Mercury']
			},
			'book',
			'manual'
		);
		expect(cellChanges(old, now, titleOf)).toEqual([
			{ label: 'Means', old: '289 V8', new: '289 V8, two-barrel' },
			{ label: 'Make', old: 'All of Ford Motor Company', new: 'Mercury' },
			{ label: 'Model years', old: '1966', new: '1965–66' },
			{ label: 'Rests on', old: 'The book, p. 12', new: 'The book, p. 12; The manual, p. 12' },
			{ label: 'Displacement', old: '', new: '4.7 liters' }
		]);
	});

	it('says when a source turned against it', () => {
		const old = version('289 V8', {}, 'book');
		const now = {
			...old,
			citations: [buildCitation(old.row.row_key, 'book', { stance: 'against', locator: '' })]
		};
		expect(cellChanges(old, now, titleOf)).toEqual([
			{ label: 'Rests on', old: 'The book, p. 12', new: 'The book (against)' }
		]);
	});
});
