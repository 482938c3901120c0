import { expect, it } from 'vitest';
import { publishedExamples } from '../../scripts/data/published-examples';
import shown from '../../src/lib/server/reference/published-examples.json';

it('the coverage page counts the published examples that stand here: npm run data:examples', () => {
	const counted = publishedExamples();
	expect(counted.kinds.reduce((sum, { of }) => sum + of, 0)).toBeGreaterThan(0);
	expect(shown).toEqual(counted);
});
