import { randomBytes } from 'node:crypto';
import { afterAll, describe, expect, inject, it } from 'vitest';
import type { Page } from 'playwright-core';
import { machineClock } from '../../src/lib/server/clock';
import { inTransaction } from '../../src/lib/server/db';
import { giveNotice, ownPreferences } from '../../src/lib/server/inbox';
import { queueJob } from '../../src/lib/server/jobs';
import { ask } from '../fixtures/asking';
import type { View } from '../fixtures/browser';
import { mailTo } from '../fixtures/mailbox';
import { addMember, builtDatabase, signedInOn } from '../fixtures/members';
import { actorOf } from '../fixtures/people';
import { expectSound, onPage } from '../fixtures/sound';

// What gives notices here stands beside the built server, and signs as it does.
process.env['DATABASE_URL'] = inject('builtDatabaseUrl');
process.env['AUTH_SECRET'] = inject('builtEnvironment')['AUTH_SECRET'];
process.env['ORIGIN'] = inject('origin');

const database = builtDatabase();
const theirs = { database, clock: machineClock };
afterAll(() => database.close());

type Member = Awaited<ReturnType<typeof addMember>>;
const causing = (use: (ground: Parameters<typeof giveNotice>[0]) => Promise<unknown>) =>
	inTransaction(database, (transaction) => use({ ...theirs, transaction }));

const tellOfFile = ({ id: user_id }: Member, name: string) =>
	causing((ground) =>
		giveNotice(ground, { user_id, template: 'file_refused', data: { name, refusal: 'broken' } })
	);
const tellOfRole = ({ id: user_id }: Member) =>
	causing((ground) =>
		giveNotice(ground, {
			user_id,
			template: 'role_changed',
			data: { role: 'moderator', areas: ['Pontiac'] }
		})
	);

/** Somebody new, on a page of theirs. */
async function onTheirs(
	next: string,
	before: (member: Member) => Promise<unknown>,
	use: (page: Page, member: Member) => Promise<void>,
	view?: View
) {
	const member = await addMember(database);
	await before(member);
	await onPage(
		'/signin',
		async (page) => {
			await signedInOn(page, member.email, { next });
			await use(page, member);
		},
		view
	);
}

const notice = (page: Page, title: string) =>
	page.getByRole('listitem').filter({ has: page.getByRole('heading', { name: title }) });
const REFUSED = '“door.jpg” was not kept';

describe.each([
	['with script', true],
	['without script', false]
])('the inbox, %s', (_how, script) => {
	it('leads from a notice to what it is about, and counts it as read', async () => {
		await onTheirs(
			'/inbox',
			(member) => tellOfFile(member, 'door.jpg'),
			async (page) => {
				expect(await notice(page, REFUSED).innerText()).toContain('new,');
				if (script) await expectSound(page, 'inbox');
				await page.getByRole('button', { name: `Open: ${REFUSED}` }).click();
				await page.waitForURL('**/account/files');
				await page.goto('/inbox');
				expect(await notice(page, REFUSED).innerText()).not.toContain('new,');
			},
			{ script }
		);
	});

	it('puts notices away and back', async () => {
		await onTheirs(
			'/inbox',
			(member) => tellOfFile(member, 'door.jpg'),
			async (page) => {
				await page.getByRole('button', { name: `Put away: ${REFUSED}` }).click();
				await page.getByRole('heading', { name: 'Nothing in your inbox' }).waitFor();
				await page.getByRole('link', { name: 'Archive', exact: true }).click();
				await page.getByRole('button', { name: `Back to the inbox: ${REFUSED}` }).click();
				await page.getByRole('heading', { name: 'Nothing in your archive' }).waitFor();
				if (script) await expectSound(page, 'archive-empty');
				await page.goto('/inbox');
				expect(await notice(page, REFUSED).count()).toBe(1);
			},
			{ script }
		);
	});

	it('keeps how notices come by mail', async () => {
		await onTheirs(
			'/inbox/preferences',
			() => Promise.resolve(),
			async (page) => {
				const work = page.getByRole('group', { name: /^Your work/ });
				await work.getByLabel('All of a day in one mail').check();
				await page.getByRole('button', { name: 'Save' }).click();
				await page.getByText('Saved.').waitFor();
				expect(await work.getByLabel('All of a day in one mail').isChecked()).toBe(true);
				if (script) await expectSound(page, 'preferences');
			},
			{ script }
		);
	});
});

it('marks all as read at once', async () => {
	await onTheirs(
		'/inbox',
		async (member) => {
			await tellOfFile(member, 'a.jpg');
			await tellOfFile(member, 'b.jpg');
		},
		async (page) => {
			await page.getByRole('button', { name: 'Mark all as read' }).click();
			await page.getByRole('button', { name: 'Mark all as read' }).waitFor({ state: 'detached' });
			expect(await page.getByRole('listitem').filter({ hasText: 'new,' }).count()).toBe(0);
		}
	);
});

it('shows to nobody what others were told', async () => {
	await onTheirs(
		'/inbox',
		async () => tellOfFile(await addMember(database), 'door.jpg'),
		async (page) => {
			expect(await page.getByRole('heading', { name: 'Nothing in your inbox' }).count()).toBe(1);
		}
	);
});

describe('the link in a mail that asks for no more of them', () => {
	const linkOf = async (member: Member): Promise<string> => {
		await tellOfRole(member);
		const mail = await mailTo(member.email, /^You are a moderator now$/);
		const { pathname, search } = new URL(mail.unsubscribe!);
		return pathname + search;
	};

	it('asks before it does so, without a sign-in', async () => {
		const member = await addMember(database);
		const path = await linkOf(member);
		await onPage(
			path,
			async (page) => {
				await page.getByRole('button', { name: 'Send me no more of them' }).click();
				await page.getByText('You will get no more mails of this kind.').waitFor();
				await signedInOn(page, member.email, { next: '/inbox/preferences' });
				const account = page.getByRole('group', { name: /^Your account/ });
				expect(await account.getByLabel('Not by mail').isChecked()).toBe(true);
			},
			{ script: false }
		);
	});

	it('does so for a mail program that presses its own button', async () => {
		const member = await addMember(database);
		const answer = await ask(await linkOf(member), {
			method: 'POST',
			headers: { 'content-type': 'application/x-www-form-urlencoded' }
		});
		expect(answer.status).toBe(200);
		expect(JSON.parse(answer.body)).toMatchObject({ type: 'success' });
		expect((await ownPreferences(theirs, actorOf(member))).account).toBe('off');
	});

	it('says when it is not whole', async () => {
		const path = await linkOf(await addMember(database));
		await onPage(path.slice(0, -1), async (page) => {
			await page.getByText('This link is not whole.').waitFor();
			expect(await page.getByRole('button', { name: 'Send me no more' }).count()).toBe(0);
			await expectSound(page, 'unsubscribe-broken');
		});
	});
});

describe.each([
	['with script', true],
	['without script', false]
])('work in hand, %s', (_how, script) => {
	it('can be stopped before it begins', async () => {
		await onTheirs(
			'/account/work',
			({ id: user_id }) =>
				causing((ground) =>
					queueJob(ground, {
						kind: 'check_file',
						payload: { file: 'none' },
						user_id,
						dueAt: new Date(Date.now() + 3_600_000)
					})
				),
			async (page) => {
				await page.getByText('Check of a file: waits its turn').waitFor();
				if (script) await expectSound(page, 'work');
				await page.getByRole('button', { name: /^Stop: Check of a file/ }).click();
				await page.getByText('It ends as soon as it can.').waitFor();
				if (!script)
					await expect
						.poll(() => page.reload().then(() => page.content()))
						.toContain('Check of a file: stopped');
				await page.getByText('Check of a file: stopped').waitFor();
			},
			{ script }
		);
	});
});

it('work in hand says when there is none', async () => {
	await onTheirs(
		'/account/work',
		() => Promise.resolve(),
		async (page) => {
			expect(await page.getByRole('heading', { name: 'Nothing is being done' }).count()).toBe(1);
			await expectSound(page, 'work-none');
		}
	);
});

it('mail that could not go out stands before administrators, with the reason', async () => {
	const id = randomBytes(16).toString('hex');
	const at = new Date();
	await database.models.outbox.create({
		...{ id, user_id: null, recipient: 'ann@example.org', kind: 'access', once_key: null },
		...{
			message_id: `<${id}@example.org>`,
			subject: 'Confirm your address',
			unsubscribe_url: null
		},
		...{ body_text: '', body_html: null, created_at: at, due_at: at, attempts: 1 },
		...{ taken_by: null, taken_until: null, sent_at: null, failed_at: at },
		last_error: '550 no such mailbox'
	});
	const { email } = await addMember(database, { role: 'administrator' });
	await onPage('/signin', async (page) => {
		await signedInOn(page, email, { next: '/people/mail' });
		const row = page.getByRole('row').filter({ hasText: '550 no such mailbox' });
		expect(await row.innerText()).toContain('given up');
		await expectSound(page, 'mail-in-trouble');
	});
});
