import { describe, expect, it } from 'vitest';
import { expectSound, onPage } from '../fixtures/sound';
import { paintText } from '../../src/lib/text/en/paint';
import { whereText } from '../../src/lib/text/en/where';

describe('where the stamps sit', () => {
	it('is opened from a reading, and a number in the drawing leads to its words', async () => {
		await onPage('/?kind=serial&text=124379N504127', async (page) => {
			await page.getByRole('link', { name: 'Where its stamps sit' }).click();
			await page.waitForURL('**/where?maker=chevrolet&year=1969');
			expect(await page.locator('#maker').inputValue()).toBe('chevrolet');
			expect(await page.locator('#year').inputValue()).toBe('1969');
			await expectSound(page, 'where');
			await page.getByRole('link', { name: /^\d+, Cowl/ }).press('Enter');
			expect(await page.locator('li:target').innerText()).toContain('Body tag');
		});
	});

	it('narrows to maker and year without script', async () => {
		await onPage(
			'/where',
			async (page) => {
				await page.locator('#maker').selectOption('ford');
				await page.locator('#year').selectOption('1965');
				await page.getByRole('button', { name: whereText.show }).click();
				const places = page.getByRole('region', { name: /^1965 Ford/ });
				expect(await places.innerText()).toContain('Lock face of the driver’s door');
				expect(await places.innerText()).not.toContain('Lock pillar');
				await page.goto('/where?maker=nobody&year=12');
				expect(await page.locator('[aria-invalid="true"]').count()).toBe(2);
			},
			{ script: false }
		);
	});
});

describe('paint codes', () => {
	it('of a make and year stand with chips, names and their rows', async () => {
		await onPage('/paint', async (page) => {
			await expectSound(page, 'paint-empty');
			await page.locator('#division').selectOption('Plymouth');
			await page.locator('#year').selectOption('1970');
			await page.waitForURL('**/paint?division=Plymouth&year=1970');
			await page.getByText('Tor-Red').first().waitFor();
			await expectSound(page, 'paint');
		});
	});

	it('that are not in the tables are said not to be, without script', async () => {
		await onPage(
			'/paint?division=Lincoln&year=1961',
			async (page) => {
				const main = await page.locator('main').innerText();
				expect(main).toContain(paintText.nothing('Lincoln', 1961));
				await page.goto('/paint?division=Chevrolet&year=1969');
				const orange = page.getByRole('listitem').filter({ hasText: 'Hugger Orange' }).first();
				expect(await orange.innerText()).toContain('Monaco Orange');
				await page.goto('/paint?division=Nobody&year=1970');
				expect(await page.locator('[aria-invalid="true"]').count()).toBe(1);
			},
			{ script: false }
		);
	});
});
