import { describe, expect, it } from 'vitest';
import { buildLargeContent } from '../../../../tests/fixtures/large';
import { compile, compileInSteps } from '../../decoder';
import { inSlices } from './slices';

describe('compiling in slices', () => {
	it('answers as compiling at once does, and lets others have their turn', async () => {
		const content = buildLargeContent(3000);
		let turns = 0;
		const count = () => {
			turns += 1;
			timer = setImmediate(count);
		};
		let timer = setImmediate(count);
		const sliced = await inSlices(compileInSteps(content));
		clearImmediate(timer);
		expect(turns).toBeGreaterThan(5);
		expect([...sliced.rows.keys()]).toEqual([...compile(content).rows.keys()]);
	});
});
