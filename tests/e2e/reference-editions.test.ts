import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { loadRelease } from '../../src/lib/server/reference';
import type { EditionContent } from '../../src/lib/types';
import { openPage } from '../fixtures/browser';
import { buildCitation, buildRow } from '../fixtures/builders';
import { startBuiltServer, type BuiltServer } from '../fixtures/built-server';
import { openTestDatabase, type TestDatabase } from '../fixtures/database';
import { faultsEverywhere, smallTargets } from '../fixtures/everywhere';
import { INVENTED } from '../fixtures/invented';

const DUNLIN = 'gm.line.k.1';
const GONE = 'gm.body_style.37.1';
const CONTESTED = buildRow('gm', 'line', 'H', 'Sanderling', {
	n: 9,
	division: ['Pontiac'],
	years: [1970, 1972],
	values: { line: 'Sanderling' }
});
const PAINT = buildRow('gm', 'paint', '52', 'Marsh Green', {
	division: ['Pontiac'],
	years: [1969, 1969],
	values: { hex_approximate: '#3F5F3A' }
});

/** The next release: one row changed, one gone, two new, of which one contradicts an older. */
const NEXT: EditionContent = {
	...INVENTED,
	rows: [
		...INVENTED.rows
			.filter(({ row_key }) => row_key !== GONE)
			.map((row) =>
				row.row_key === DUNLIN ? { ...row, meaning: 'Dunlin Sport', note: 'Renamed.' } : row
			),
		CONTESTED,
		PAINT
	],
	citations: [
		...INVENTED.citations.filter(({ row_key }) => row_key !== GONE),
		buildCitation(CONTESTED.row_key, 'works-manual', {
			quotation: 'H … Sanderling',
			seen_on: '2026-06-01'
		}),
		buildCitation(PAINT.row_key, 'marsh-book')
	]
};

let database: TestDatabase;
let server: BuiltServer;
beforeAll(async () => {
	database = await openTestDatabase({ url: inject('builtDatabaseUrl') });
	for (const release of [INVENTED, NEXT]) await loadRelease(database, release);
	server = await startBuiltServer({ DATABASE_URL: database.url, LOG_LEVEL: 'error' });
});
afterAll(async () => {
	await server.end();
	await database.sequelize.query(`DROP DATABASE ${database.sequelize.getDatabaseName()}`);
});

async function on<T>(path: string, use: (page: Page) => Promise<T>, script = true): Promise<T> {
	const { page, complaints } = await openPage(server.origin + path, { script });
	try {
		const answer = await use(page);
		expect(complaints).toEqual([]);
		return answer;
	} finally {
		await page.context().close();
	}
}
const changes = (page: Page) =>
	page
		.locator('main dl:has(.new) > div')
		.evaluateAll((cells) =>
			cells.map((cell) =>
				[...cell.children].map((part) => part.textContent?.replace(/\s+/g, ' ').trim())
			)
		);

describe.each([
	['an edition against the one before', '/editions/2'],
	['a row that has changed', `/rows/${DUNLIN}`],
	['a row that sources contest', `/rows/${CONTESTED.row_key}`],
	['a row that is gone', `/rows/${GONE}`],
	['a row as it was', `/rows/${DUNLIN}?edition=1`],
	['a paint', `/rows/${PAINT.row_key}`],
	['a table with chips', '/tables/gm/paint'],
	['a table with a claim', '/tables/gm/body_style']
])('%s', (_, path) => {
	it('is sound for axe at each width and in both themes, with targets of 44 px on the phone', async () => {
		await on(path, async (page) => {
			expect(await faultsEverywhere(page)).toEqual([]);
			await page.setViewportSize({ width: 390, height: 844 });
			expect(await smallTargets(page)).toEqual([]);
		});
	});
});

describe('editions', () => {
	it('are listed, the latest first, with what each changed', async () => {
		await on('/editions', async (page) => {
			const rows = await page.locator('tbody tr').allTextContents();
			expect(rows).toHaveLength(2);
			expect(rows[0]).toMatch(/Edition 2\s+present.*2 added, 1 changed, 1 retired/s);
			expect(rows[1]).toMatch(/Edition 1.*the first one/s);
			for (const row of rows) expect(row).toMatch(/[0-9a-f]{64}/);
		});
	});

	it('show what changed, old and new, what is new and what is gone', async () => {
		await on('/editions/2', async (page) => {
			await page.getByRole('heading', { name: 'How edition 2 differs from edition 1' }).waitFor();
			expect(await changes(page)).toEqual([
				['Means', 'was Dunlin', 'is Dunlin Sport'],
				['Note', 'was nothing', 'is Renamed.']
			]);
			await page.getByRole('link', { name: '2 rows added' }).click();
			await page.getByRole('heading', { name: 'Rows added' }).waitFor();
			expect(await page.locator('li .name').allTextContents()).toEqual([
				'H: Sanderling',
				'52: Marsh Green'
			]);
			await page.getByRole('link', { name: '1 rows retired' }).click();
			await page.getByRole('heading', { name: 'Rows retired' }).waitFor();
			await page.getByRole('link', { name: '37: 2-door hardtop' }).click();
			await page.getByText('Retired in edition 2').waitFor();
			expect(await page.locator('h1').textContent()).toBe('2-door hardtop');
		});
	});

	it.each([
		['with script', true],
		['without script', false]
	])('are compared with any other, %s', async (_, script) => {
		await on(
			'/editions/1',
			async (page) => {
				await page.getByText('There is no edition before this one.').waitFor();
				await page.getByLabel('Compare with edition').fill('2');
				await page.getByRole('button', { name: 'Compare' }).click();
				await page.getByRole('heading', { name: 'How edition 1 differs from edition 2' }).waitFor();
				expect(await changes(page)).toContainEqual(['Means', 'was Dunlin Sport', 'is Dunlin']);
			},
			script
		);
	});

	it('say when they cannot be compared', async () => {
		for (const [other, why] of [
			['7', 'An edition is a whole number from 1 to 2.'],
			['two', 'An edition is a whole number from 1 to 2.'],
			['2', 'That is this edition.']
		])
			await on(`/editions/2?with=${other}`, async (page) => {
				expect(await page.locator('#with-error').textContent()).toContain(why);
				expect(await page.getByLabel('Compare with edition').inputValue()).toBe(other);
			});
	});

	it('carry their whole digest and how to cite them', async () => {
		await on('/editions/2', async (page) => {
			const digest = (await page.locator('.digest .code').textContent()) ?? '';
			expect(digest).toMatch(/^[0-9a-f]{64}$/);
			expect(await page.locator('.cite').textContent()).toMatch(
				new RegExp(`^Tallyplate, reference tables, edition 2 of .* SHA-256 ${digest}\\.$`)
			);
		});
	});
});

describe('a row', () => {
	it('tells what it was, edition by edition', async () => {
		await on(`/rows/${DUNLIN}`, async (page) => {
			expect(await page.locator('h1').textContent()).toBe('Dunlin Sport');
			expect(await page.locator('ol > li > p:first-child').allTextContents()).toEqual([
				expect.stringMatching(/Version 2,\s+since edition 2/),
				expect.stringMatching(/Version 1,\s+edition 1 only/)
			]);
			expect(await changes(page)).toContainEqual(['Means', 'was Dunlin', 'is Dunlin Sport']);
		});
		await on(`/rows/${DUNLIN}?edition=1`, async (page) => {
			expect(await page.locator('h1').textContent()).toBe('Dunlin');
			await page.getByRole('link', { name: 'Show the present row' }).click();
			await page.getByRole('heading', { level: 1, name: 'Dunlin Sport' }).waitFor();
		});
	});

	it('stands beside those that contradict it, each over its sources', async () => {
		await on(`/rows/${CONTESTED.row_key}`, async (page) => {
			await page.getByRole('heading', { name: 'Sources differ' }).waitFor();
			const sides = page.locator('.side');
			expect(await sides.locator('.head').allTextContents()).toEqual(['Sanderling', 'Plover']);
			expect(await sides.nth(0).textContent()).toMatch(/Works manual.*“H … Sanderling”/s);
			expect(await sides.nth(0).textContent()).toMatch(/seen on 1 June 2026/);
			expect(await sides.nth(1).textContent()).toMatch(/Cars of the Marsh.*Register/s);
		});
	});

	it('shows a paint as a chip that says what it is', async () => {
		await on(`/rows/${PAINT.row_key}`, async (page) => {
			expect(await page.locator('.swatch rect').getAttribute('fill')).toBe('#3F5F3A');
			expect(await page.locator('.swatch').textContent()).toContain('screen approximation');
		});
		await on('/tables/gm/paint', async (page) => {
			await page.getByText('The chips are screen approximations').waitFor();
		});
	});
});

describe('a table', () => {
	it('shows its claim of completeness, or says that there is none', async () => {
		await on('/tables/gm/body_style', async (page) => {
			await page
				.getByText('Complete for Pontiac; Heron, 1965–69, by Works manual')
				.waitFor({ timeout: 5000 });
		});
		await on('/tables/gm/line', async (page) => {
			await page.getByText('No source claims that this table is complete').waitFor();
		});
	});
});
