import { afterAll, describe, expect, it } from 'vitest';
import type { Page } from 'playwright-core';
import { openPage, shoot, type View } from '../fixtures/browser';
import { faultsEverywhere, smallTargets } from '../fixtures/everywhere';
import { addMember, builtDatabase, expectHead, signedInOn } from '../fixtures/members';

const database = builtDatabase();
afterAll(() => database.close());

async function on(path: string, use: (page: Page) => Promise<void>, view: View = {}) {
	const { page, complaints } = await openPage(path, view);
	page.setDefaultTimeout(10_000);
	try {
		await use(page);
		expect(complaints.filter((one) => !one.includes('status of 4'))).toEqual([]);
	} finally {
		await page.context().close();
	}
}

async function isSound(page: Page, name: string) {
	expect(await faultsEverywhere(page)).toEqual([]);
	await page.setViewportSize({ width: 390, height: 844 });
	expect(await smallTargets(page)).toEqual([]);
	expect(await page.title()).toMatch(/ · Tallyplate$/);
	expect(await page.locator('h1').count()).toBe(1);
	expect(await page.locator('h3, h4, h5, h6').count()).toBe(0);
	if (process.env['SHOTS'] !== 'on') return;
	for (const width of [390, 1024, 1440])
		for (const colorScheme of ['light', 'dark'] as const) {
			await page.setViewportSize({ width, height: 900 });
			await page.emulateMedia({ colorScheme });
			await shoot(page, name);
		}
}

const ANYBODY = [
	['sign-in as a person of the demonstration', '/signin?as=edwin'],
	['sign-in by link', '/signin/link'],
	['a link that was opened', `/signin/link?token=${'0'.repeat(64)}`],
	['sign-up', '/signup'],
	['sign-up that was sent', '/signup?sent=yes'],
	['a confirmation that has lapsed', '/confirm?token=x'],
	['a forgotten password', '/reset'],
	['sign-out', '/signout'],
	['an account that is gone', '/account/gone'],
	['help about accounts', '/help/your-account-and-your-data']
] as const;

describe.each(ANYBODY)('%s', (name, path) => {
	it('is sound for axe and quiet, at each width and in both themes', async () => {
		await on(path, (page) => isSound(page, name.replaceAll(' ', '-')));
	});
});

describe('who is signed in', () => {
	it.each([
		['account', '/account'],
		['second-factor', '/account/second-factor'],
		['delete', '/account/delete']
	])('finds the page sound: %s', async (name, path) => {
		const { email } = await addMember(database, {
			paused_until: new Date(Date.now() + 86_400_000),
			pause_reason: 'Asked for a rest after a dispute about trim codes.'
		});
		await on('/signin', async (page) => {
			await signedInOn(page, email, { next: path });
			await page.locator('h1').waitFor();
			await isSound(page, name);
		});
	});

	it('finds faults of a form sound, and the menu in the head', async () => {
		const { email } = await addMember(database);
		await on('/signin', async (page) => {
			await signedInOn(page, email);
			await page.getByLabel('Present password').fill('not this one');
			await page.getByLabel('New password', { exact: true }).fill('another cowl tag');
			await page.getByRole('button', { name: 'Change the password' }).click();
			await page.locator('.error').waitFor();
			await page.locator('header .account summary').click();
			await isSound(page, 'account-fault');
		});
	});
});

describe('an administrator', () => {
	it.each([
		['people', '/people'],
		['people-none', '/people?q=nobody+of+this+name'],
		['person', '/people/demo-dolores'],
		['own', '/people/demo-joan'],
		['audit', '/people/audit']
	])('finds the page sound: %s', async (name, path) => {
		await on('/signin', async (page) => {
			await signedInOn(page, 'joan@demo.tallyplate.example', {
				password: 'plates and tags',
				next: path
			});
			await page.locator('h1').waitFor();
			await isSound(page, name);
		});
	});
});

describe.each([
	['with script', true],
	['without script', false]
])('%s', (_, script) => {
	it('somebody is found, gets a role and areas, is paused and signed out; all of it is on record', async () => {
		const admin = await addMember(database, { role: 'administrator', name: 'Edna Warden' });
		const name = `Otis ${script ? 'Script' : 'Plain'} Farraday`;
		const { email, id } = await addMember(database, { name });
		await on(
			'/signin',
			async (page) => {
				const main = page.locator('main');
				const press = (button: string) => main.getByRole('button', { name: button }).click();
				await on(
					'/signin',
					async (theirs) => {
						await signedInOn(theirs, email);
						await signedInOn(page, admin.email, { next: '/people' });
						await main.getByRole('searchbox', { name: 'Name or address' }).fill(email);
						await press('Show');
						await page.waitForURL('**/people?q=*');
						await main.getByRole('link', { name }).click();
						await expectHead(page, name);

						await main.getByLabel('Role', { exact: true }).selectOption('moderator');
						await main.getByLabel('Pontiac').check();
						await main.getByLabel('Buick').check();
						await press('Change the role');
						await page.waitForURL('**?saved=role');
						await theirs.goto('/account');
						expect(await theirs.locator('main').textContent()).toContain(
							'You are a moderator for Pontiac, Buick.'
						);

						await main.locator('form[action="?/pause"]').evaluate((form: HTMLFormElement) => {
							form.noValidate = true;
						});
						await main.getByLabel('Until the end of').fill('2020-01-01');
						await main.getByRole('textbox', { name: 'Reason' }).fill('Too hasty with declines.');
						await press('Pause until then');
						await main.locator('.error').waitFor();
						expect(await main.locator('.error').textContent()).toContain('This day has passed.');
						expect(await main.getByRole('textbox', { name: 'Reason' }).inputValue()).toBe(
							'Too hasty with declines.'
						);
						const until = new Date(Date.now() + 7 * 86_400_000).toISOString().slice(0, 10);
						await main.getByLabel('Until the end of').fill(until);
						await press('Pause until then');
						await page.waitForURL('**?saved=pause');
						await theirs.goto('/account');
						expect(await theirs.locator('main').textContent()).toContain(
							'The reason: Too hasty with declines.'
						);

						await press('End the pause now');
						await page.waitForURL('**?saved=resumed');
						await main.getByRole('button', { name: /^Sign out / }).click();
						await page.waitForURL('**?saved=sessions');
						await theirs.goto('/account');
						await expectHead(theirs, 'Sign in');
					},
					{ script }
				);
				await page.goto(`/people/audit?about=${id}`);
				const deeds = await main.locator('td.what').allTextContents();
				expect(deeds).toEqual([
					'signed out of one session',
					'ended the pause',
					expect.stringMatching(/^paused until .+: Too hasty with declines\.$/),
					'changed the role from member to moderator for Pontiac, Buick'
				]);
			},
			{ script }
		);
	});
});

it('two administrators do not undo each other, and nobody decides about themselves', async () => {
	const admin = await addMember(database, { role: 'administrator' });
	const { id } = await addMember(database);
	await on('/signin', async (page) => {
		const main = page.locator('main');
		await signedInOn(page, admin.email, { next: `/people/${id}` });
		await main.getByLabel('Role', { exact: true }).waitFor();
		await database.models.users.update({ version: 2 }, { where: { id } });
		await main.getByLabel('Role', { exact: true }).selectOption('moderator');
		await main.getByRole('button', { name: 'Change the role' }).click();
		await main.getByText('Another administrator has changed this person meanwhile.').waitFor();
		await page.goto(`/people/${admin.id}`);
		await main.getByText('This is your own account').waitFor();
		expect(await main.getByRole('button', { name: 'Change the role' }).count()).toBe(0);
	});
});
