import { describe, expect, it } from 'vitest';
import { compareCollected, digestOf, digestsOf } from './candidates';

const BIRDS = 'division,code\nPontiac,K\nPontiac,"M, late"\n';
const digests = digestsOf(new Map([['birds', BIRDS]]));
const known = [...digests].map(([candidate, digest]) => ({
	candidate,
	digest,
	area: 'codes',
	field: 'engine',
	outcome: 'row' as const,
	targets: ['gm.engine.k.1']
}));

describe('comparing collected facts', () => {
	it('numbers records from one and digests their cells', () => {
		expect([...digests]).toEqual([
			['birds-1', digestOf(['Pontiac', 'K'])],
			['birds-2', digestOf(['Pontiac', 'M, late'])]
		]);
		expect(digestOf(['a', 'b'])).toBe('f04cdced9736');
	});

	it('finds nothing when all is accounted for', () => {
		expect(compareCollected(digests, known)).toEqual({ added: [], changed: [], missing: [] });
	});

	it('tells new, changed and missing facts apart', () => {
		const later = digestsOf(
			new Map([
				['birds', 'division,code\nPontiac,L\n'],
				['fish', BIRDS]
			])
		);
		expect(compareCollected(later, known)).toEqual({
			added: ['fish-1', 'fish-2'],
			changed: ['birds-1'],
			missing: ['birds-2']
		});
	});
});
