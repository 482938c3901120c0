import { describe, expect, inject, it } from 'vitest';
import type { Page } from 'playwright-core';
import { openPage, type OpenPage } from '../fixtures/browser';
import { faultsEverywhere, smallTargets } from '../fixtures/everywhere';

const PAGES = [
	['all tables', '/tables'],
	['the tables of a make and year', '/tables?division=Plymouth&year=1970'],
	['a search', '/tables?q=hemi&division=Plymouth&year=1970'],
	['a search that finds nothing', '/tables?q=zzzzzz'],
	['a form with faults', '/tables?division=Nobody&year=70&table=gears'],
	['the tables of a corporation', '/tables/ford'],
	['a table', '/tables/chrysler/engine?division=Plymouth&year=1970'],
	['a table without codes', '/tables/ford/stamp_place'],
	['sources', '/sources?kind=law'],
	['a source', '/sources/cfr-565-15'],
	['editions', '/editions'],
	['an edition', '/editions/1'],
	['coverage', '/coverage'],
	['help', '/help'],
	['a help page with drawings', '/help/what-a-reading-tells']
] as const;

async function closing<T>(opened: Promise<OpenPage>, use: (page: Page) => Promise<T>) {
	const { page, complaints } = await opened;
	try {
		const answer = await use(page);
		expect(complaints).toEqual([]);
		return answer;
	} finally {
		await page.context().close();
	}
}

const texts = (page: Page, selector: string) => page.locator(selector).allTextContents();
const CODES = 'td.key';
const MEANINGS = '.meaning';

describe.each(PAGES)('%s', (_, path) => {
	it('is sound for axe and quiet, at each width and in both themes', async () => {
		await closing(openPage(path), async (page) => {
			expect(await faultsEverywhere(page)).toEqual([]);
			await page.setViewportSize({ width: 390, height: 844 });
			expect(await smallTargets(page)).toEqual([]);
			expect(await page.title()).toMatch(/ · Tallyplate$/);
			expect(await page.locator('h1').count()).toBe(1);
			expect(await page.locator('h3, h4, h5, h6').count()).toBe(0);
			const html = await (await page.request.get(path)).text();
			expect(html).not.toMatch(/<style|\sstyle=/);
		});
	});
});

describe.each([
	['with script', true],
	['without script', false]
])('%s', (_, script) => {
	const open = (path: string) => openPage(path, { script });

	it('a word is found in all tables, narrowed, and a row of it opened', async () => {
		await closing(open('/tables'), async (page) => {
			await page.getByLabel('Find a code or a word').fill('hemi');
			await page.getByRole('button', { name: 'Find' }).click();
			await page.waitForURL(/q=hemi/);
			await page.getByRole('heading', { name: '“hemi”' }).waitFor();
			const all = (await texts(page, MEANINGS)).length;
			expect(all).toBeGreaterThan(3);

			await page.getByLabel('Table', { exact: true }).selectOption('engine');
			await page.getByLabel('Make', { exact: true }).selectOption('Plymouth');
			await page.getByLabel('Model year', { exact: true }).fill('1970');
			await page.getByRole('button', { name: 'Find' }).click();
			await page.getByRole('heading', { name: 'Plymouth 1970: Engine codes, “hemi”' }).waitFor();
			const meanings = await texts(page, MEANINGS);
			expect(meanings.length).toBeLessThan(all);
			expect(meanings.join()).toMatch(/Hemi/);
			expect(await page.getByLabel('Find a code or a word').inputValue()).toBe('hemi');

			await page
				.getByRole('link', { name: /^Row ?: / })
				.first()
				.click();
			await page.waitForURL(/\/rows\/chrysler\.engine\./);
			expect(await page.locator('h1').textContent()).toBe(meanings[0]);
		});
	});

	it('one or two characters are taken as a code', async () => {
		await closing(open('/tables?q=gg&table=paint#find'), async (page) => {
			expect(new Set((await texts(page, CODES)).map((code) => code.trim()))).toEqual(
				new Set(['GG'])
			);
		});
	});

	it('a cell of the coverage leads to the tables of its make and year, and they to their rows', async () => {
		await closing(open('/tables'), async (page) => {
			await page.locator('svg a[href*="division=Plymouth"][href*="year=1970"]').click();
			await page.getByRole('heading', { name: 'Plymouth 1970: tables' }).waitFor();
			await page.getByRole('link', { name: 'Engine codes' }).click();
			await page.waitForURL('**/tables/chrysler/engine?division=Plymouth&year=1970');
			expect(await page.getByLabel('Model year', { exact: true }).inputValue()).toBe('1970');
			for (const years of await texts(page, 'tbody .years')) expect(years).toMatch(/19(6|7)/);
		});
	});

	it('rows are sorted by a head, and the other way round', async () => {
		await closing(open('/tables/chrysler/engine'), async (page) => {
			const head = page.getByRole('columnheader', { name: /^Means/ });
			expect(await head.getAttribute('aria-sort')).toBeNull();
			await head.getByRole('link').click();
			await page.waitForURL(/sort=meaning/);
			await page.getByRole('columnheader', { name: 'Means, A to Z' }).waitFor();
			expect(await head.getAttribute('aria-sort')).toBe('ascending');
			const first = (await texts(page, MEANINGS))[0];
			await head.getByRole('link').click();
			await page.getByRole('columnheader', { name: 'Means, Z to A' }).waitFor();
			expect(await head.getAttribute('aria-sort')).toBe('descending');
			expect((await texts(page, MEANINGS))[0]).not.toBe(first);
		});
	});

	it('pages lead on and back', async () => {
		await closing(open('/tables/chrysler/engine'), async (page) => {
			const first = await texts(page, CODES);
			await page.getByRole('link', { name: 'Next' }).click();
			await page.waitForURL(/page=2/);
			await page.getByText('Page 2 of').waitFor();
			expect(await texts(page, CODES)).not.toEqual(first);
			await page.getByRole('link', { name: 'Previous' }).click();
			await page.getByText('Page 1 of').waitFor();
			expect(await texts(page, CODES)).toEqual(first);
		});
	});

	it('what cannot be is said beside its field, and stays there', async () => {
		await closing(open('/tables/chrysler/engine?year=70&q=hemi'), async (page) => {
			const year = page.getByLabel('Model year', { exact: true });
			expect(await year.inputValue()).toBe('70');
			expect(await year.getAttribute('aria-invalid')).toBe('true');
			expect(await page.locator('#year-error').textContent()).toMatch(/from 1955 to 2039/);
			expect((await texts(page, MEANINGS)).length).toBeGreaterThan(0);
		});
	});

	it('says what to do where nothing is found', async () => {
		await closing(open('/tables/chrysler/engine?q=zzzzzz'), async (page) => {
			await page.getByText('Nothing found for “zzzzzz”').waitFor();
			await page.getByRole('link', { name: 'Show the whole table' }).click();
			await page.waitForURL('**/tables/chrysler/engine');
			expect((await texts(page, MEANINGS)).length).toBeGreaterThan(50);
		});
	});

	it('a row leads to the reading of its code', async () => {
		await closing(open('/tables/chrysler/paint?q=EB5'), async (page) => {
			await page
				.getByRole('link', { name: /^Row ?: EB5/ })
				.first()
				.click();
			await page.waitForURL(/\/rows\/chrysler\.paint\./);
			expect(await texts(page, '.code-cells .sr-only')).toEqual(['EB5']);
			await page.getByRole('link', { name: 'Read this code' }).click();
			await page.waitForURL(/kind=code/);
			expect(new URL(page.url()).searchParams.get('text')).toBe('EB5');
			expect(await page.locator('h1').textContent()).not.toBe('Nothing fits');
		});
	});

	it('sources are picked by kind and lead to the rows that rest on them', async () => {
		await closing(open('/sources'), async (page) => {
			await page.getByLabel('Kind').selectOption('standard');
			await page.getByRole('button', { name: 'Show' }).click();
			await page.waitForURL(/kind=standard/);
			await page.locator('td.title a').first().click();
			await page.waitForURL(/\/sources\/[a-z0-9-]+$/);
			await page.getByRole('heading', { name: 'Rows that rest on it' }).waitFor();
			expect(await page.locator('dd').first().textContent()).toBe('published standard');
		});
	});

	it('help leads from page to page', async () => {
		await closing(open('/help'), async (page) => {
			await page.getByRole('link', { name: 'What a reading can and cannot tell' }).click();
			await page.waitForURL('**/help/what-a-reading-tells');
			expect(await page.locator('dt .strength').count()).toBeGreaterThan(5);
			await page.getByRole('link', { name: 'How rows are rated' }).first().click();
			await page.waitForURL('**/help/how-rows-are-rated');
			await page.getByRole('heading', { level: 1, name: 'How rows are rated' }).waitFor();
		});
	});
});

describe('rows as CSV', () => {
	it('are those that the page shows', async () => {
		await closing(openPage('/tables/chrysler/engine?division=Plymouth&year=1970'), async (page) => {
			const link = page.getByRole('link', { name: 'CSV' });
			const response = await page.request.get((await link.getAttribute('href')) ?? '');
			expect(response.headers()['content-type']).toMatch(/^text\/csv/);
			const lines = (await response.text()).trim().split('\n');
			expect(lines[0]).toMatch(/^row_key,/);
			expect(lines.length - 1).toBe((await texts(page, MEANINGS)).length);
		});
	});
});

describe('a search as it is typed', () => {
	it('shows what fits, keeps what is typed on, and stands in the address', async () => {
		await closing(openPage('/tables/ford/paint'), async (page) => {
			const field = page.getByLabel('Find a code or a word');
			await field.click();
			await page.keyboard.type('blue m', { delay: 120 });
			await page.waitForURL(/q=blue\+m/);
			await page.getByRole('heading', { name: '“blue m”' }).waitFor();
			await page.keyboard.type('etallic');
			await page.getByRole('heading', { name: '“blue metallic”' }).waitFor();
			expect(await field.inputValue()).toBe('blue metallic');
			expect(await page.evaluate(() => document.activeElement?.id)).toBe('q');
		});
	});
});

describe('addresses that name nothing', () => {
	it.each([
		'/tables/studebaker',
		'/tables/ford/gears',
		'/tables/amc/paint_supplier',
		'/rows/ford.engine.nothing.1',
		'/rows/nothing',
		'/sources/no-such-work',
		'/editions/999999',
		'/help/no-such-page'
	])('%s is answered with 404 and a way on', async (path) => {
		const response = await fetch(inject('origin') + path, { headers: { accept: 'text/html' } });
		expect(response.status).toBe(404);
		expect(await response.text()).toContain('Look through the tables');
	});
});
