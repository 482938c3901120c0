import { describe, expect, it } from 'vitest';
import { expectSound, onPage } from '../fixtures/sound';
import { partText as text } from '../../src/lib/text/en/part';

describe('a loose part', () => {
	it('is named by its number, and its date by the years of the number', async () => {
		await onPage('/part', async (page) => {
			await page.getByRole('link', { name: text.empty.example }).click();
			await page.getByText('283 V8 block', { exact: true }).waitFor();
			expect(await page.locator('main').innerText()).toContain(text.when.one('12 November 1962'));
			await expectSound(page, 'part');
			await page.goto('/part');
			await page.getByRole('link', { name: text.empty.example }).waitFor();
			await expectSound(page, 'part-empty');
		});
	});

	it('that is not in the tables, or cannot be read, keeps what was typed, without script', async () => {
		await onPage(
			'/part',
			async (page) => {
				await page.getByLabel(text.number).fill('9999999');
				await page.getByLabel(text.date).fill('!!!');
				await page.getByRole('button', { name: text.read }).click();
				expect(await page.locator('main').innerText()).toContain(text.what.none);
				expect(await page.locator('#date').inputValue()).toBe('!!!');
				expect(await page.locator('#date').getAttribute('aria-invalid')).toBe('true');
				await page.goto(`/part?number=${'X'.repeat(601)}&maker=nobody`);
				expect(await page.locator('#number').inputValue()).toBe('X'.repeat(601));
				expect(await page.locator('[aria-invalid="true"]').count()).toBe(2);
			},
			{ script: false }
		);
	});
});
