import { mkdtempSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import type { Page } from 'playwright-core';
import { addMember, builtDatabase, signedInOn } from '../fixtures/members';
import { phoneJpeg, plainPng } from '../fixtures/pictures';
import { expectSound, onPage } from '../fixtures/sound';
import type { View } from '../fixtures/browser';

const database = builtDatabase();
afterAll(() => database.close());

/** Somebody new, on the page of their files. */
async function onFiles(use: (page: Page) => Promise<void>, view?: View) {
	const { email } = await addMember(database);
	await onPage(
		'/signin',
		async (page) => {
			await signedInOn(page, email, { next: '/account/files' });
			await use(page);
		},
		view
	);
}

const jpeg = async (name = 'plate.jpg') => ({
	name,
	mimeType: 'image/jpeg',
	buffer: await phoneJpeg()
});
const field = (page: Page) => page.locator('input[type=file]');
const row = (page: Page, name: string) =>
	page.getByRole('list', { name: 'Your files' }).getByRole('listitem').filter({ hasText: name });

describe('files with script', () => {
	it('are sent as soon as they are chosen, and shown upright to their owner', async () => {
		await onFiles(async (page) => {
			await field(page).setInputFiles(await jpeg());
			const kept = row(page, 'plate.jpg');
			await kept.waitFor();
			expect(await kept.innerText()).toContain('300 × 400 pixels');
			expect(await kept.innerText()).toContain('taken 12 June 2026, 10:31 (+02:00)');
			const thumb = kept.locator('img');
			await thumb.waitFor();
			await page.waitForFunction(() => document.querySelector('img')?.naturalWidth ?? 0 > 0);
			await expectSound(page, 'files');
		});
	});

	it('say beside the file what is wrong with it', async () => {
		await onFiles(async (page) => {
			await field(page).setInputFiles([
				{ name: 'note.jpg', mimeType: 'image/jpeg', buffer: Buffer.from('no picture'.repeat(99)) },
				{
					name: 'IMG_1.HEIC',
					mimeType: 'image/heic',
					buffer: Buffer.concat([
						Buffer.from([0, 0, 0, 24]),
						Buffer.from('ftypheic\0\0\0\0mif1heic'),
						Buffer.alloc(5000)
					])
				}
			]);
			const sending = page.getByRole('list', { name: 'Files that you are sending' });
			await sending.getByText('no JPEG, PNG, WebP or PDF').waitFor();
			await sending.getByText('Most Compatible').waitFor();
			await expectSound(page, 'files-refused');
			await page.getByRole('button', { name: 'Dismiss what is said about note.jpg' }).click();
			await sending.getByText('no JPEG, PNG, WebP or PDF').waitFor({ state: 'detached' });
		});
	});

	it('go on where they were broken off, also after the page was closed', async () => {
		// A file that is chosen again is known by its time too, so that it has to lie on the disk.
		const file = join(mkdtempSync(join(tmpdir(), 'tallyplate-')), 'door.png');
		writeFileSync(file, await plainPng(1000, 900));
		await onFiles(async (page) => {
			let parts = 0;
			await page.route('**/files/uploads/*', (route) =>
				route.request().method() === 'PATCH' && (parts += 1) > 1 ? route.abort() : route.continue()
			);
			await field(page).setInputFiles(file);
			await page.getByText(/^2\.6 MB, \d\d % sent$/).waitFor();
			await expect.poll(() => parts).toBeGreaterThan(1);
			const offsets: string[] = [];
			page.on('request', (request) => {
				if (request.method() === 'PATCH') offsets.push(request.headers()['upload-offset'] ?? '');
			});
			await page.reload();
			await page.unroute('**/files/uploads/*');
			await field(page).setInputFiles(file);
			await row(page, 'door.png')
				.getByText(/^PNG, /)
				.waitFor();
			expect(offsets[0]).toBe(String(1024 ** 2));
		});
	});
});

describe('files without script', () => {
	it('go one at a time with the form, and can be deleted', async () => {
		await onFiles(
			async (page) => {
				await field(page).setInputFiles(await jpeg('tag.jpg'));
				await page.getByRole('button', { name: 'Send it' }).click();
				await expect
					.poll(async () => {
						await page.goto('/account/files');
						return row(page, 'tag.jpg').innerText();
					})
					.toContain('JPEG');
				await page.getByRole('button', { name: 'Delete tag.jpg' }).click();
				await page.getByRole('status').getByText('The file is deleted.').waitFor();
				expect(await page.getByRole('heading', { name: 'No files yet' }).count()).toBe(1);
			},
			{ script: false }
		);
	});

	it('say at the field what is wrong', async () => {
		await onFiles(
			async (page) => {
				await page.getByRole('button', { name: 'Send it' }).click();
				await page.getByText('No file was chosen.').waitFor();
				await field(page).setInputFiles({
					name: 'nothing.pdf',
					mimeType: 'application/pdf',
					buffer: Buffer.alloc(0)
				});
				await page.getByRole('button', { name: 'Send it' }).click();
				await page.getByText('This file is empty.').waitFor();
				expect(await field(page).getAttribute('aria-invalid')).toBe('true');
			},
			{ script: false }
		);
	});
});

it('files are shown to their owner alone', async () => {
	let address = '';
	await onFiles(async (page) => {
		await field(page).setInputFiles(await jpeg());
		address = (await row(page, 'plate.jpg').locator('img').getAttribute('src')) ?? '';
		expect((await page.request.get(address)).status()).toBe(200);
	});
	await onFiles(async (page) => {
		expect((await page.request.get(address)).status()).toBe(404);
		const state = address.replace(/\/thumb\?.*/, '/state');
		expect((await page.request.get(state)).status()).toBe(404);
	});
});
