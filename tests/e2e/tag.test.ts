import { describe, expect, it } from 'vitest';
import { expectSound, onPage } from '../fixtures/sound';
import { tagText as text } from '../../src/lib/text/en/tag';

const { example } = text;
const UPSIDE_DOWN = [...example.lines].reverse();
const asked = (lines: readonly string[], serial: string) =>
	`/tag?${new URLSearchParams([
		['maker', example.maker],
		['year', example.year],
		['serial', serial],
		...lines.map((line) => ['text', line])
	])}`;

describe('a body tag, line by line', () => {
	it('is read as one types, and what differs from the serial stands at the seam', async () => {
		await onPage('/tag', async (page) => {
			await expectSound(page, 'tag-empty');
			await page.getByLabel(text.serial).fill(example.serial);
			await page.getByLabel(text.maker).selectOption(example.maker);
			await page.getByLabel(text.year).selectOption(example.year);
			for (const [index, line] of example.lines.entries())
				await page.locator(`#line-${index + 1}`).fill(line);
			await page.getByText('Tor-Red').waitFor();
			const open = page.getByRole('region', { name: text.seam.heading }).locator('.open');
			await open.getByText('104121').first().waitFor();
			expect(await open.getByRole('listitem').count()).toBe(2);
			expect(await page.locator('#line-4').inputValue()).toBe(example.lines[3]);
			await expectSound(page, 'tag-read');
		});
	});

	it('pasted into one field becomes its lines', async () => {
		await onPage('/tag', async (page) => {
			await page.locator('#line-1').evaluate((field, pasted) => {
				const clipboardData = new DataTransfer();
				clipboardData.setData('text', pasted);
				field.dispatchEvent(
					new ClipboardEvent('paste', { clipboardData, bubbles: true, cancelable: true })
				);
			}, example.lines.join('\n'));
			await page.getByText('Tor-Red').waitFor();
			for (const [index, line] of example.lines.entries())
				expect(await page.locator(`#line-${index + 1}`).inputValue()).toBe(line);
		});
	});

	it('is read without script, and lines in the wrong order are offered in the right one', async () => {
		await onPage(
			asked(UPSIDE_DOWN, example.serial),
			async (page) => {
				await page.getByRole('link', { name: text.inOrder }).first().click();
				expect(await page.locator('#line-4').inputValue()).toBe(example.lines[3]);
				expect(await page.locator('#serial').inputValue()).toBe(example.serial);
				await page.locator('#line-1').fill('QQ9');
				await page.getByRole('button', { name: text.read }).click();
				await page.getByRole('link', { name: text.lookUp('QQ9') }).waitFor();
			},
			{ script: false }
		);
	});

	it('keeps what it cannot read: fifteen lines, a line of 700 characters, a serial of another maker', async () => {
		const lines = [...Array.from({ length: 14 }, (_, index) => `Q${index}`), 'X'.repeat(700)];
		await onPage(asked(lines, '9F02G123456'), async (page) => {
			const fields = page.locator('input[name="text"]');
			expect(await fields.count()).toBe(15);
			expect(await fields.last().inputValue()).toBe('X'.repeat(700));
			expect(await page.locator('#serial').inputValue()).toBe('9F02G123456');
			await expectSound(page, 'tag-kept');
		});
	});
});
