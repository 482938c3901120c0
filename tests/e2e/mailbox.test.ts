import { afterAll, describe, expect, inject, it } from 'vitest';
import { machineClock } from '../../src/lib/server/clock';
import { inTransaction } from '../../src/lib/server/db';
import { giveNotice } from '../../src/lib/server/inbox';
import { ask } from '../fixtures/asking';
import { mailTo } from '../fixtures/mailbox';
import { addMember, builtDatabase } from '../fixtures/members';
import { expectSound, onPage } from '../fixtures/sound';

// What gives notices here stands beside the built server, and signs as it does.
process.env['DATABASE_URL'] = inject('builtDatabaseUrl');
process.env['AUTH_SECRET'] = inject('builtEnvironment')['AUTH_SECRET'];
process.env['ORIGIN'] = inject('origin');

const database = builtDatabase();
afterAll(() => database.close());

const SCRIPT = '<img src=x onerror=alert(1)>';

/** A mail that somebody was sent, with script where a division is named. */
async function sentMail() {
	const { id: user_id, email } = await addMember(database);
	await inTransaction(database, (transaction) =>
		giveNotice(
			{ database, transaction, clock: machineClock },
			{ user_id, template: 'role_changed', data: { role: 'moderator', areas: [SCRIPT] } }
		)
	);
	return { email, mail: await mailTo(email, /./) };
}

describe.each([
	['with script', true],
	['without script', false]
])('the mailbox of a demonstration, %s', (_how, script) => {
	it('lists what was sent to whom, and opens it in both its forms', async () => {
		const { email, mail } = await sentMail();
		await onPage(
			'/mailbox',
			async (page) => {
				if (script) await expectSound(page, 'mailbox');
				const row = page.getByRole('row').filter({ hasText: email });
				await row.getByRole('link', { name: mail.subject }).click();
				await page.waitForURL(`**/mailbox/${mail.id}`);
				expect(await page.locator('h1').innerText()).toBe(mail.subject);
				expect(await page.locator('pre').innerText()).toContain(SCRIPT);
				expect(await page.locator('iframe').getAttribute('sandbox')).toBe('');
				if (script) await expectSound(page, 'mailbox-mail');
			},
			{ script }
		);
	});
});

describe('a mail in the mailbox', () => {
	it('is shown as formatted where nothing of it can run, load or send', async () => {
		const { mail } = await sentMail();
		const { status, headers, body } = await ask(`/mailbox/${mail.id}/html`);
		expect(status).toBe(200);
		expect(headers['content-security-policy']).toMatch(
			/^default-src 'none'.*form-action 'none'.*sandbox$/
		);
		expect(body).not.toContain(SCRIPT);
		expect(body).toContain('&lt;img src=x');
	});

	it.each(['none', '..%2F..%2Fpackage.json', '0'.repeat(400)])(
		'of no such name is not found: %s',
		async (name) => {
			expect((await ask(`/mailbox/${name}`)).status).toBe(404);
			expect((await ask(`/mailbox/${name}/html`)).status).toBe(404);
		}
	);
});
