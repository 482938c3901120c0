import { gzipSync } from 'node:zlib';
import type { Page } from 'playwright-core';
import { describe, expect, inject, it } from 'vitest';
import { openPage, type OpenPage } from '../fixtures/browser';
import { faultsEverywhere, smallTargets } from '../fixtures/everywhere';

/** Real code patterns, invented sequence numbers. */
const PLYMOUTH = 'RH23L0E904127';
const STANDARD = '1G1AY8760B5900417';
const MISFIT = 'RMZ3N0G904127';

const PAGES = [
	['the empty page', '/'],
	['a reading of 13 characters', `/?text=${PLYMOUTH}`],
	['a reading of 17 characters', `/?text=${STANDARD}`],
	['a marked reading', '/?text=242379P9%3F4117'],
	['a beginning', '/?text=RM23N0G'],
	['a bare code', '/?kind=code&text=EB5'],
	['an engine stamp', '/?kind=engine&text=V0525CNR&year=1970'],
	['a casting with its date', '/?kind=casting&text=3914678+F106'],
	[
		'a body tag',
		'/?kind=body_tag&text=C16+J25+%2F+EV2+H6X9+000+B30+E12345+%2F+E74+D32+RM23+R0B123456'
	],
	['a text that nothing fits', `/?text=${MISFIT}`],
	['a form with faults', '/?text=---&maker=nobody']
] as const;

const lit = (page: Page) =>
	page.locator('.lit').evaluateAll((parts) => parts.map((part) => part.tagName.toLowerCase()));

async function closing<T>(opened: Promise<OpenPage>, use: (opened: OpenPage) => Promise<T>) {
	const own = await opened;
	try {
		return await use(own);
	} finally {
		await own.page.context().close();
	}
}

describe.each(PAGES)('%s', (_, path) => {
	it('is sound for axe and quiet, at each width and in both themes, with targets of 44 px on the phone', async () => {
		await closing(openPage(path), async ({ page, complaints }) => {
			expect(await faultsEverywhere(page)).toEqual([]);
			await page.setViewportSize({ width: 390, height: 844 });
			expect(await smallTargets(page)).toEqual([]);
			expect(complaints).toEqual([]);
		});
	});
});

describe('without script', () => {
	it('reads what is typed and leads to the usual address', async () => {
		await closing(openPage('/', { script: false }), async ({ page }) => {
			await page.getByLabel('Serial number, stamp or code').fill(PLYMOUTH);
			await page.getByRole('combobox', { name: /^Maker/ }).selectOption('plymouth');
			await page.getByRole('combobox', { name: /^Model year/ }).selectOption('1970');
			await page.getByRole('button', { name: 'Read' }).click();
			expect(new URL(page.url()).search).toBe(`?text=${PLYMOUTH}&maker=plymouth&year=1970`);
			expect(await page.locator('h1').textContent()).toMatch(/^1970 Plymouth/);
			expect(await page.getByLabel('Serial number, stamp or code').inputValue()).toBe(PLYMOUTH);
			expect(await page.getByRole('combobox', { name: /^Maker/ }).inputValue()).toBe('plymouth');
		});
	});

	it('leads from a cell to its field and lights it', async () => {
		await closing(openPage(`/?text=${PLYMOUTH}`, { script: false, width: 390 }), async (own) => {
			const { page } = own;
			await page.getByRole('link', { name: /^character 5, L/ }).click();
			const field = page.locator('#at-5:target');
			const ground = await field.evaluate((part) => getComputedStyle(part).backgroundColor);
			expect(ground).not.toBe('rgba(0, 0, 0, 0)');
			const [stamp, place] = await Promise.all([
				page.locator('.pinned').boundingBox(),
				field.boundingBox()
			]);
			expect(place!.y, 'the pinned cells do not cover it').toBeGreaterThanOrEqual(
				stamp!.y + stamp!.height - 1
			);
		});
	});

	it('offers no button that needs script', async () => {
		await closing(openPage(`/?text=${PLYMOUTH}`, { script: false }), async ({ page }) => {
			expect(await page.getByRole('button', { name: 'Copy link' }).count()).toBe(0);
		});
	});

	it('opens the menu of the phone', async () => {
		await closing(openPage('/', { script: false, width: 390 }), async ({ page }) => {
			await page.getByText('Menu').click();
			expect(await page.getByRole('link', { name: 'Tables' }).isVisible()).toBe(true);
		});
	});
});

describe('with script', () => {
	it('lights the touched group in stamp, leader and field', async () => {
		await closing(openPage(`/?text=${PLYMOUTH}`), async ({ page }) => {
			await page.locator('#at-5').hover();
			expect((await lit(page)).sort()).toEqual(['a', 'li', 'path']);
			await page.getByRole('link', { name: /^characters 3–4, 23/ }).focus();
			expect(await page.locator('li.lit').getAttribute('id')).toBe('at-3-4');
		});
	});

	it('leads along the stamp by arrows and to the field by a stroke', async () => {
		await closing(openPage(`/?text=${PLYMOUTH}`), async ({ page }) => {
			await page.getByRole('link', { name: /^character 1, R/ }).focus();
			await page.keyboard.press('ArrowRight');
			await page.keyboard.press('ArrowRight');
			expect(await page.locator('li.lit').getAttribute('id')).toBe('at-3-4');
			await page.keyboard.press('ArrowLeft');
			expect(await page.locator('li.lit').getAttribute('id')).toBe('at-2');
			await page.keyboard.press('/');
			const focused = await page.evaluate(() => document.activeElement?.id);
			expect(focused).toBe('text');
		});
	});

	it('names the kind while it is typed', async () => {
		await closing(openPage('/'), async ({ page }) => {
			const field = page.getByLabel('Serial number, stamp or code');
			await field.pressSequentially('RM23');
			expect(await page.getByText('Characters: 4. A single code.').isVisible()).toBe(true);
			await field.pressSequentially('N0G[12]04127');
			expect(await page.getByText('13 characters: a serial number.').isVisible()).toBe(true);
			await field.fill('');
			expect(await page.getByText('characters: a serial number.').count()).toBe(0);
		});
	});

	it('goes to the usual address at once', async () => {
		await closing(openPage('/'), async ({ page }) => {
			const asked: string[] = [];
			page.on('request', (request) => {
				if (request.isNavigationRequest()) asked.push(new URL(request.url()).search);
			});
			await page.getByLabel('Serial number, stamp or code').fill('RH23L0E9?4127');
			await page.getByRole('radio', { name: 'serial number' }).check();
			await page.keyboard.press('Enter');
			await page.waitForURL(/text=/);
			expect(asked).toEqual(['?kind=serial&text=RH23L0E9%3F4127']);
		});
	});

	it('draws the places of the chosen maker and year', async () => {
		await closing(openPage('/'), async ({ page }) => {
			const plan = page.getByRole('img', { name: /^Plan of a car/ });
			expect(await plan.getAttribute('aria-label')).toContain('most American makers');
			await page.getByRole('combobox', { name: /^Maker/ }).selectOption('pontiac');
			await page.getByRole('combobox', { name: /^Model year/ }).selectOption('1966');
			await page.getByRole('img', { name: /General Motors/ }).waitFor();
			const text = plan.getByText('front door pillar');
			await text.first().waitFor({ state: 'attached' });
			expect(await plan.textContent()).not.toContain('dash top');
		});
	});

	it('copies the permanent address', async () => {
		await closing(openPage(`/?text=${PLYMOUTH}`), async ({ page }) => {
			await page.context().grantPermissions(['clipboard-read', 'clipboard-write']);
			await page.getByRole('button', { name: 'Copy link' }).click();
			await page.getByText('Link copied').waitFor();
			const copied = await page.evaluate(() => navigator.clipboard.readText());
			expect(copied).toBe(`${inject('origin')}/?kind=serial&text=${PLYMOUTH}&edition=1`);
		});
	});

	it('is one small file', async () => {
		await closing(openPage('/'), async ({ page }) => {
			const scripts = await page
				.locator('script')
				.evaluateAll((all) => all.map((script) => (script as HTMLScriptElement).src));
			expect(scripts).toHaveLength(1);
			const code = Buffer.from(await (await fetch(scripts[0]!)).arrayBuffer());
			expect(gzipSync(code).length).toBeLessThan(50 * 1024);
		});
	});

	it('works where another page’s router has drawn the page', async () => {
		await closing(openPage('/tables'), async ({ page }) => {
			await page.getByRole('link', { name: 'Read', exact: true }).click();
			await page.waitForURL(/\/$/);
			await page.locator('html.live').waitFor();
			await page.getByLabel('Serial number, stamp or code').fill('RM23N0G904127');
			expect(await page.getByText('13 characters: a serial number.').isVisible()).toBe(true);
		});
	});
});

describe('bad input', () => {
	it.each([
		['nothing', '', /^Type what is struck/],
		['nothing that can be struck', '---', /no letter or figure/],
		['too much', 'A'.repeat(65), /64 characters at most/]
	])('says beside the field what is wrong with %s, and keeps it', async (_, text, message) => {
		await closing(openPage(`/?text=${text}`), async ({ page }) => {
			const field = page.getByLabel('Serial number, stamp or code');
			expect(await field.inputValue()).toBe(text);
			expect(await field.getAttribute('aria-invalid')).toBe('true');
			const ids = (await field.getAttribute('aria-describedby'))!.split(' ');
			expect(await page.locator(`#${ids[0]}`).textContent()).toMatch(message);
		});
	});

	it('says which character breaks the nearest layout and reads an offer at one tap', async () => {
		await closing(openPage(`/?text=${MISFIT}`), async ({ page }) => {
			expect(await page.locator('#text-error').textContent()).toContain('character 3');
			await page.getByRole('link', { name: /^Read RM23N0G904127/ }).click();
			await page.waitForURL(/RM23N0G904127/);
			expect(await page.locator('h1').textContent()).toMatch(/^1970 Plymouth/);
		});
	});

	it('says that an edition does not exist, and where else to go', async () => {
		await closing(openPage(`/?text=${PLYMOUTH}&edition=99`), async ({ page }) => {
			expect(await page.locator('main').textContent()).toMatch(/edition.*99/i);
			expect(await page.getByRole('link', { name: 'Read a stamp' }).isVisible()).toBe(true);
		});
	});
});

describe('a reading', () => {
	it('shows its second reading under an address of its own', async () => {
		await closing(openPage(`/?text=${PLYMOUTH}`), async ({ page }) => {
			const first = await page.locator('h1').textContent();
			await page
				.getByRole('link', { name: /^Show this reading/ })
				.first()
				.click();
			await page.waitForURL(/reading=2$/);
			expect(await page.locator('h1').textContent()).not.toBe(first);
			expect(await page.getByText('Second of two readings.').isVisible()).toBe(true);
		});
	});

	it('works the check digit through', async () => {
		await closing(openPage(`/?text=${STANDARD}`), async ({ page }) => {
			const work = page.getByRole('region', { name: /check digit/ });
			expect(await work.locator('tr').first().locator('td').count()).toBe(17);
			expect(await work.textContent()).toContain('left over');
		});
	});

	it('says that it proves neither identity nor title', async () => {
		await closing(openPage(`/?text=${PLYMOUTH}`), async ({ page }) => {
			expect(await page.getByText(/never proves/).isVisible()).toBe(true);
			const link = page.getByRole('link', { name: 'What a reading can and cannot tell' });
			expect(await link.getAttribute('href')).toBe('/help/what-a-reading-tells');
		});
	});

	it('prints without form and navigation, with edition, digest and sources', async () => {
		await closing(openPage(`/?text=${PLYMOUTH}`), async ({ page }) => {
			await page.emulateMedia({ media: 'print' });
			expect(await page.getByRole('button', { name: 'Read' }).isVisible()).toBe(false);
			expect(await page.getByRole('navigation', { name: 'Main' }).isVisible()).toBe(false);
			expect(await page.getByText(/^Edition 1/).isVisible()).toBe(true);
			expect(await page.getByText(/^digest/).isVisible()).toBe(true);
			expect(await page.getByRole('region', { name: /^Sources/ }).isVisible()).toBe(true);
		});
	});
});
