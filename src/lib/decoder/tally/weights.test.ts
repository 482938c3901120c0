import { describe, expect, it } from 'vitest';
import { STAMP_KINDS } from '../../types';
import { lighter, weightOf } from './weights';

describe('weights', () => {
	it('follow the kind of stamp where nothing is said of the place', () => {
		const weights = STAMP_KINDS.map((kind) => weightOf(kind, undefined, 'gm', false));
		expect(weights).toEqual(['heavy', 'heavy', 'middling', 'middling', 'middling', 'light']);
	});

	it('are heavy for the car’s number struck into a part', () => {
		expect(weightOf('engine', undefined, 'gm', true)).toBe('heavy');
	});

	it('are middling for a tag that screws hold', () => {
		expect(weightOf('body_tag', undefined, 'chrysler', false)).toBe('middling');
		expect(weightOf('body_tag', undefined, null, false)).toBe('middling');
	});

	it.each([
		['copied build sheet', 'light'],
		['bolted badge', 'light'],
		['door label', 'middling'],
		['stamped in the frame', 'heavy'],
		['somewhere', 'middling']
	] as const)('%s is %s', (place, weight) =>
		expect(weightOf('engine', place, 'gm', false)).toBe(weight)
	);

	it('of a line are those of its lighter side', () => {
		expect(lighter('heavy', 'middling')).toBe('middling');
		expect(lighter('light', 'heavy')).toBe('light');
		expect(lighter('heavy', 'heavy')).toBe('heavy');
	});
});
