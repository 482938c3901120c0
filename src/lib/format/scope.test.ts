import { describe, expect, it } from 'vitest';
import { buildRow } from '../../../tests/fixtures/builders';
import { scopeCells, scopeWords } from './scope';

const row = (parts: Parameters<typeof buildRow>[4]) =>
	buildRow('chrysler', 'engine', 'N', 'An engine', parts);

describe('where a row holds', () => {
	it('names makes, lines and codes of the same serial', () => {
		const words = scopeWords(
			row({ division: ['Dodge', 'Plymouth'], line: ['Charger'], body: ['23', '27'], plant: ['B'] })
		);
		expect(words).toBe('Dodge, Plymouth; Charger; body 23, 27; plant B');
	});

	it('names the corporation where every make of it is meant, and every maker where no one is', () => {
		expect(scopeWords(row({ line: ['Charger'] }))).toBe('Chrysler Corporation; Charger');
		expect(scopeWords(buildRow('other', 'wmi', '1G1', 'Chevrolet'))).toBe('Every maker');
	});

	it('is told column by column, those that are open left out but for make and years', () => {
		expect(scopeCells(row({ engine: ['N'], years: [1970, 1971] }))).toEqual([
			{ label: 'Make', value: 'All of Chrysler Corporation' },
			{ label: 'Engine', value: 'N' },
			{ label: 'Model years', value: '1970–71' }
		]);
		expect(scopeCells(row({ division: ['Dodge'] }))).toEqual([
			{ label: 'Make', value: 'Dodge' },
			{ label: 'Model years', value: 'all years' }
		]);
	});
});
