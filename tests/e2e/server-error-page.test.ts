import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { axe, openPage, shoot, type Theme, type Width } from '../fixtures/browser';

/** As the framework fills it in when not even the page of errors can be made. */
const FILLED = readFileSync('src/error.html', 'utf8')
	.replaceAll('%sveltekit.status%', '500')
	.replaceAll('%sveltekit.error.message%', 'Something broke here');

async function openErrorPage(width: Width, theme: Theme) {
	const opened = await openPage('/healthz', { width, theme });
	await opened.page.route('**/broken', (route) =>
		route.fulfill({ status: 200, contentType: 'text/html', body: FILLED })
	);
	await opened.page.goto('/broken');
	return opened;
}

describe('the page that stands in for all others', () => {
	it.each([
		[390, 'light'],
		[390, 'dark'],
		[1440, 'light'],
		[1440, 'dark']
	] as const)('is finished at %i px, %s', async (width, theme) => {
		const { page, complaints } = await openErrorPage(width, theme);
		expect(await axe(page)).toEqual([]);
		expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBe(width);
		expect(complaints).toEqual([]);
		await shoot(page, 'error-page');
	});

	it('carries its styles in a file, as the policy asks', () => {
		expect(FILLED).not.toMatch(/<style|style=|<script/);
		expect(FILLED).not.toContain('%sveltekit');
	});
});
