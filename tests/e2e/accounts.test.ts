import { Secret, TOTP } from 'otpauth';
import type { Page } from 'playwright-core';
import { afterAll, describe, expect, it } from 'vitest';
import { openPage, type View } from '../fixtures/browser';
import { linkIn, mailsTo, mailTo } from '../fixtures/mailbox';
import {
	addMember,
	builtDatabase,
	expectHead,
	newAddress,
	openLink,
	PASSWORD,
	signedInOn,
	signInOn
} from '../fixtures/members';

const database = builtDatabase();
afterAll(() => database.close());

const main = (page: Page) => page.locator('main');
const press = (page: Page, name: string | RegExp) =>
	main(page).getByRole('button', { name }).click();
const field = (page: Page, name: string) => main(page).getByRole('textbox', { name });
const faults = (page: Page) => main(page).locator('.error').allTextContents();
const OTHER = 'another cowl tag';

/** A page of its own, closed afterwards; nothing may go wrong on it. */
async function on(view: View, use: (page: Page) => Promise<void>, path = '/signin') {
	const { page, complaints } = await openPage(path, view);
	page.setDefaultTimeout(10_000);
	try {
		await use(page);
		// A refused form is a 400, which the browser mentions.
		expect(complaints.filter((one) => !one.includes('status of 4'))).toEqual([]);
	} finally {
		await page.context().close();
	}
}

/** Opens the menu of who is signed in, and signs out there. */
async function signOut(page: Page) {
	await page.locator('header .account summary').click();
	await page.locator('header .account').getByRole('button', { name: 'Sign out' }).click();
	await page.waitForURL('**/signin?said=out');
}

describe.each([
	['with script', true],
	['without script', false]
])('%s', (_, script) => {
	const view = { script };

	it('somebody opens an account, leaves, and comes back with the password', async () => {
		const address = newAddress();
		await on(
			view,
			async (page) => {
				await field(page, 'Name').fill('Ann Oyster');
				await page.getByLabel('Mail address').fill(address);
				await page.getByLabel(/What I contribute/).check();
				await press(page, 'Send the confirmation');
				await expectHead(page, 'Look into your mail');

				const link = linkIn(await mailTo(address, /^Confirm your address/));
				await page.goto(link);
				expect(await main(page).textContent()).toContain('Welcome, Ann Oyster.');
				await page.getByLabel('Password', { exact: true }).fill('too short');
				await main(page)
					.locator('form')
					.evaluate((form: HTMLFormElement) => (form.noValidate = true));
				await press(page, 'Open the account');
				await page.locator('.error').waitFor();
				expect(await faults(page)).toEqual([
					expect.stringContaining('A password has 10 characters or more.')
				]);
				await page.getByLabel('Password', { exact: true }).fill(PASSWORD);
				await press(page, 'Open the account');
				await expectHead(page, 'Your account');
				expect(await page.locator('header .account').textContent()).toContain('Ann Oyster');
				expect(await main(page).textContent()).toContain('under CC BY-SA 4.0, as you agreed on');

				await signOut(page);
				expect(await main(page).textContent()).toContain('You are signed out.');
				await page.goto('/account');
				expect(new URL(page.url()).search).toBe('?next=%2Faccount');
				await signedInOn(page, address);

				await page.goto(link);
				await expectHead(page, 'This link has lapsed');
			},
			'/signup'
		);
	});

	it('a form with faults says them beside its fields and keeps what was typed', async () => {
		await on(
			view,
			async (page) => {
				await main(page)
					.locator('form')
					.evaluate((form: HTMLFormElement) => (form.noValidate = true));
				await field(page, 'Name').fill('A');
				await page.getByLabel('Mail address').fill('nobody at all');
				await press(page, 'Send the confirmation');
				await page.locator('.error').first().waitFor();
				expect((await faults(page)).map((one) => one.trim())).toEqual([
					'A name has 2 characters or more.',
					'This is not one mail address.',
					'Without this, nothing that you contribute could be kept.'
				]);
				expect(await field(page, 'Name').inputValue()).toBe('A');
				expect(await page.getByLabel('Mail address').inputValue()).toBe('nobody at all');
				const described = await field(page, 'Name').getAttribute('aria-describedby');
				expect(described).toContain('name-error');
			},
			'/signup'
		);
	});

	it('a wrong password and an unknown address are answered alike', async () => {
		const { email } = await addMember(database);
		await on(view, async (page) => {
			const said: string[] = [];
			for (const address of [email, newAddress()]) {
				await signInOn(page, address, { password: 'not this one at all' });
				await page.locator('.error').waitFor();
				said.push(...(await faults(page)));
				expect(await page.getByLabel('Mail address').inputValue()).toBe(address);
				expect(
					await page.getByLabel('Password', { exact: true }).getAttribute('value')
				).toBeFalsy();
			}
			expect(said[0]).toContain('Address and password do not belong together.');
			expect(said[1]).toBe(said[0]);
		});
	});

	it('a link signs in once', async () => {
		const { email } = await addMember(database);
		await on(
			view,
			async (page) => {
				await page.getByLabel('Mail address').fill(email);
				await press(page, 'Send the link');
				await expectHead(page, 'Look into your mail');
				const link = linkIn(await mailTo(email, /sign-in link/));
				await page.goto(link);
				await page.goto(link);
				await press(page, 'Sign in now');
				await expectHead(page, 'Your account');
				expect(await main(page).textContent()).toContain('by link');
				await signOut(page);
				await page.goto(link);
				await press(page, 'Sign in now');
				await page.waitForURL('**/signin/link?*');
				expect(await main(page).textContent()).toContain('This link has lapsed.');
				await page.goto('/account');
				await expectHead(page, 'Sign in');
			},
			'/signin/link'
		);
	});

	it('a forgotten password is chosen anew, and every session ends', async () => {
		const { email } = await addMember(database);
		await on(view, async (other) => {
			await signedInOn(other, email);
			await on(
				view,
				async (page) => {
					await page.getByLabel('Mail address').fill(email);
					await press(page, 'Send the link');
					await expectHead(page, 'Look into your mail');
					await openLink(page, email, /^Choose a new password/);
					await page.getByLabel('New password', { exact: true }).fill(OTHER);
					await press(page, 'Change the password');
					await page.waitForURL('**/signin?said=changed');
					await signInOn(page, email);
					await page.locator('.error').waitFor();
					await signedInOn(page, email, { password: OTHER });
				},
				'/reset'
			);
			await other.goto('/account');
			await expectHead(other, 'Sign in');
		});
	});

	it('an address is changed once the new one is confirmed', async () => {
		const { email } = await addMember(database);
		const to = newAddress();
		await on(view, async (page) => {
			await signedInOn(page, email);
			await page.getByLabel('New mail address').fill(to);
			await page.locator('#address-password').fill(PASSWORD);
			await press(page, 'Change the address');
			await page.waitForURL('**/account?saved=address');
			expect(await main(page).textContent()).toContain('We have written to the new address.');
			await openLink(page, to, /^Confirm your new address/);
			await press(page, 'Use this address');
			await expectHead(page, 'Your address is changed');
			await page.goto('/account');
			expect(await main(page).textContent()).toContain(`Your address is ${to}.`);
			expect(await mailTo(email, /was changed/)).toMatchObject({ to: email });
		});
	});

	it('name and password are changed, and the page says so', async () => {
		const { email } = await addMember(database);
		await on(view, async (page) => {
			await signedInOn(page, email);
			await field(page, 'Name').fill('Ann <b>Oyster</b>');
			await press(page, 'Change the name');
			await page.waitForURL('**/account?saved=name');
			expect(await main(page).textContent()).toContain('Your name is changed.');
			expect(await page.locator('header .account .name').textContent()).toBe('Ann <b>Oyster</b>');
			await page.getByLabel('Present password').fill(PASSWORD);
			await page.getByLabel('New password', { exact: true }).fill(OTHER);
			await press(page, 'Change the password');
			await page.waitForURL('**/account?saved=password');
			expect(await main(page).textContent()).toContain('Your password is changed.');
			expect(await page.getByLabel('Present password').inputValue()).toBe('');
		});
	});

	it('a second factor is added, asked for, stood in for, and removed', async () => {
		const { email } = await addMember(database);
		await on(view, async (page) => {
			await signedInOn(page, email, { next: '/account/second-factor' });
			const secret = (await page.locator('figcaption .code').textContent())!.replaceAll(' ', '');
			const totp = new TOTP({ secret: Secret.fromBase32(secret) });
			await field(page, 'Code').fill('000000');
			await press(page, 'Put it in force');
			await page.locator('.error').waitFor();
			// The step before this one, so that the one of now is still good for the way in.
			await field(page, 'Code').fill(totp.generate({ timestamp: Date.now() - 30_000 }));
			await press(page, 'Put it in force');
			await page.locator('li.code').first().waitFor();
			const codes = await page.locator('li.code').allTextContents();
			expect(codes).toHaveLength(10);

			await signOut(page);
			await signInOn(page, email);
			await page.waitForURL('**/signin/code?*');
			await page.goto('/account');
			await expectHead(page, 'One step more');
			await field(page, 'Code').fill(totp.generate());
			await press(page, 'Go on');
			await expectHead(page, 'Your account');

			await signOut(page);
			await signInOn(page, email);
			await page.waitForURL('**/signin/code?*');
			await field(page, 'Code').fill(codes[0]!);
			await press(page, 'Go on');
			await expectHead(page, 'Your account');
			expect(await main(page).textContent()).toContain('9 recovery codes are left.');

			await page.goto('/account/second-factor');
			await page.getByLabel('Your password').fill(PASSWORD);
			await page.locator('#remove-code').fill(codes[1]!);
			await press(page, 'Remove the second factor');
			await page.waitForURL(/\/account(\?.*)?$/);
			expect(await main(page).textContent()).toContain('asks for your password alone');
		});
	});

	it('another browser is signed out at once, and all are', async () => {
		const { email } = await addMember(database);
		await on(view, async (first) => {
			await signedInOn(first, email);
			await on(view, async (second) => {
				await signedInOn(second, email);
				await main(second)
					.getByRole('button', { name: /^Sign out .+, since/ })
					.click();
				await second.waitForURL('**/account?saved=session');
				await first.goto('/account');
				await expectHead(first, 'Sign in');
				await signedInOn(first, email);
				await press(second, 'Sign out everywhere');
				await second.waitForURL('**/signin?said=out');
			});
			await first.goto('/account');
			await expectHead(first, 'Sign in');
		});
	});

	it('one’s own data are taken along, and the account is deleted for good', async () => {
		const { email } = await addMember(database);
		await on(view, async (page) => {
			await signedInOn(page, email);
			const [download] = await Promise.all([
				page.waitForEvent('download'),
				page.getByRole('link', { name: 'Take a copy of your data' }).click()
			]);
			expect(download.suggestedFilename()).toBe('tallyplate-your-data.json');
			const copy = await page.request.get('/account/export');
			expect(await copy.json()).toMatchObject({ account: { address: email } });

			await page.getByRole('link', { name: 'Delete your account' }).click();
			await expectHead(page, 'Delete your account');
			await page.getByLabel('Your password').fill(PASSWORD);
			await page.getByLabel(/I am sure/).check();
			await press(page, 'Delete the account');
			await expectHead(page, 'Your account is gone');
			await signInOn(page, email);
			await page.locator('.error').waitFor();
			expect(await mailTo(email, /is gone$/)).toMatchObject({ to: email });
		});
	});

	it('a person of the demonstration fills the form in', async () => {
		await on(view, async (page) => {
			await page.getByRole('link', { name: /^Dolores Whitacre/ }).click();
			await page.waitForURL('**/signin?as=dolores');
			await page.waitForFunction(
				() => document.querySelector<HTMLInputElement>('#address')?.value !== ''
			);
			await press(page, 'Sign in');
			await expectHead(page, 'Your account');
			expect(await main(page).textContent()).toContain('You are a moderator for Chevrolet');
		});
	});
});

describe('a mail', () => {
	it('that nobody may have is not sent: a link for an unknown address', async () => {
		const address = newAddress();
		await on(
			{},
			async (page) => {
				await page.getByLabel('Mail address').fill(address);
				await press(page, 'Send the link');
				await expectHead(page, 'Look into your mail');
				expect(await mailsTo(address)).toEqual([]);
			},
			'/signin/link'
		);
	});
});
