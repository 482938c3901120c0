import { describe, expect, it } from 'vitest';
import { COUNTER_CLEANERS, take, TooOftenError, type Limit } from '../../src/lib/server/limits';
import { connectAgain, openTestDatabase } from '../fixtures/database';

const LIMIT: Limit = { what: 'sign_in', most: 3, seconds: 600 };
const START = new Date('2026-12-01T10:00:00.000Z');
const database = await openTestDatabase();
const at = (seconds: number) => ({
	database,
	clock: () => new Date(START.getTime() + seconds * 1000)
});

describe('a limit', () => {
	it('lets so many through in a window, and says how long the rest of it is', async () => {
		for (let n = 0; n < 3; n += 1) await take(at(60), LIMIT, 'ann');
		const refused = take(at(60), LIMIT, 'ann');
		await expect(refused).rejects.toBeInstanceOf(TooOftenError);
		await expect(refused).rejects.toMatchObject({ code: 'too_often', retryAfterSeconds: 540 });
		await expect(take(at(599), LIMIT, 'ann')).rejects.toMatchObject({ retryAfterSeconds: 1 });
		await take(at(600), LIMIT, 'ann');
	});

	it('counts each person and each thing by itself', async () => {
		for (let n = 0; n < 3; n += 1) await take(at(0), LIMIT, 'bob');
		await take(at(0), LIMIT, 'cec');
		await take(at(0), { ...LIMIT, what: 'mail' }, 'bob');
	});

	it('lets exactly so many through when many processes ask at once', async () => {
		const other = { ...at(0), database: connectAgain(database) };
		const tries = await Promise.allSettled(
			Array.from({ length: 30 }, (_, n) => take(n % 2 ? other : at(0), LIMIT, 'dan'))
		);
		expect(tries.filter(({ status }) => status === 'fulfilled')).toHaveLength(3);
	});

	it('keeps no list of whom it counts, and nothing of windows that have passed', async () => {
		await take(at(0), LIMIT, 'eve@example.org');
		const keys = await database.models.sharedCounters.findAll({ raw: true });
		expect(JSON.stringify(keys)).not.toContain('eve');
		for (const clean of COUNTER_CLEANERS) await clean(at(1200));
		expect(await database.models.sharedCounters.count()).toBe(0);
	});
});
