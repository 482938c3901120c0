import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { runLanes, sumOf } from './lane.mjs';
import { outcomeOf } from './vitest.mjs';

const GOOD = { passed: 1, failed: 0, skipped: 0, output: '' };
const BAD = { passed: 2, failed: 1, skipped: 0, output: 'what went wrong' };

let printed: string[] = [];
beforeEach(() => {
	printed = [];
	vi.spyOn(console, 'log').mockImplementation((line: string) => void printed.push(line));
});
afterEach(() => vi.restoreAllMocks());

describe('runLanes', () => {
	it('prints seconds and counts of every lane, and the output of one that failed', async () => {
		await runLanes([
			{ name: 'types', run: async () => GOOD },
			{ name: 'unit', run: async () => BAD }
		]);
		expect(printed.join('\n')).toMatch(/types +0\.0 s +1 passed\n/);
		expect(printed.join('\n')).toMatch(/unit +0\.0 s +2 passed, 1 failed\n\nwhat went wrong/);
	});

	it('runs two at a time, and lets others go ahead of one that waits', async () => {
		const order: string[] = [];
		let busy = 0;
		const lane = (name: string, after: string[] = []) => ({
			name,
			after,
			run: async () => {
				order.push(name);
				expect(++busy).toBeLessThanOrEqual(2);
				await new Promise((done) => setTimeout(done, 5));
				busy--;
				return GOOD;
			}
		});
		await runLanes([lane('build'), lane('browser', ['build']), lane('types'), lane('unit')]);
		expect(order.slice(0, 2)).toEqual(['build', 'types']);
		expect(order).toHaveLength(4);
	});

	it('fails what rests on a lane that failed, without running it', async () => {
		const run = vi.fn(async () => GOOD);
		const results = await runLanes([
			{ name: 'build', run: async () => BAD },
			{ name: 'browser', after: ['build'], run }
		]);
		expect(run).not.toHaveBeenCalled();
		expect(results.map(({ failed }) => failed)).toEqual([1, 1]);
	});

	it('does not wait for a lane that is not run', async () => {
		const results = await runLanes([{ name: 'browser', after: ['build'], run: async () => GOOD }]);
		expect(results).toHaveLength(1);
	});

	it('counts a lane that breaks off as failed', async () => {
		const results = await runLanes([{ name: 'unit', run: () => Promise.reject(new Error('off')) }]);
		expect(results).toMatchObject([{ failed: 1, output: expect.stringContaining('off') }]);
	});
});

describe('sumOf', () => {
	const result = (passed: number, failed: number) => ({
		...GOOD,
		name: 'x',
		ms: 1,
		passed,
		failed
	});

	it('adds up over lanes', () => {
		expect(sumOf([result(1, 0), result(40, 2)])).toEqual({
			line: '41 passed, 2 failed',
			ok: false
		});
		expect(sumOf([result(1, 0)])).toEqual({ line: '1 passed, 0 failed', ok: true });
	});

	it('does not call nothing at all a success', () => {
		expect(sumOf([]).ok).toBe(false);
	});
});

describe('outcomeOf', () => {
	const report = { numPassedTests: 3, numFailedTests: 0, numPendingTests: 1, numTodoTests: 1 };

	it('takes the counts of the report', () => {
		expect(outcomeOf(report, 0, '')).toMatchObject({ passed: 3, failed: 0, skipped: 2 });
	});

	it('counts a run that failed without a failed test as one', () => {
		expect(outcomeOf(report, 1, '')).toMatchObject({ passed: 3, failed: 1 });
		expect(outcomeOf(null, null, '')).toMatchObject({ passed: 0, failed: 1 });
	});
});
