import { createHash } from 'node:crypto';
import { afterAll, describe, expect, inject, it } from 'vitest';
import { ask, cookieFor, cookieSet, type Asked } from '../fixtures/asking';
import { startBuiltServer } from '../fixtures/built-server';
import { openPage } from '../fixtures/browser';
import { linkIn, mailTo } from '../fixtures/mailbox';
import { addMember, builtDatabase, newAddress, PASSWORD } from '../fixtures/members';

const database = builtDatabase();
afterAll(() => database.close());

const EVIL = 'https://elsewhere.example';
const tokenOf = (link: string): string =>
	new URL(link, inject('origin')).searchParams.get('token')!;
/** Whether a cookie is somebody's session: the page of the account is theirs alone. */
const isSession = async (cookie: string): Promise<boolean> =>
	(await ask('/account', { cookie })).status === 200;

describe('a session', () => {
	it('is carried by a cookie that no script reads and no other site sends along', async () => {
		const { email } = await addMember(database);
		const { headers } = await ask('/signin', { form: { address: email, password: PASSWORD } });
		const cookies = headers['set-cookie'] ?? [];
		expect(cookies).toHaveLength(1);
		expect(cookies[0]).toMatch(/^tallyplate-session=[^;]+; /);
		for (const part of ['HttpOnly', 'SameSite=Lax', 'Path=/']) expect(cookies[0]).toContain(part);
		expect(headers['cache-control']).toBe('private, no-store');
	});

	it('that was planted is worth nothing after the sign-in: somebody’s own, or an invented one', async () => {
		const mallory = await addMember(database);
		const planted = await cookieFor(mallory.email);
		const { email } = await addMember(database);
		const cookie = await cookieFor(email, { cookie: planted });
		expect(cookie).not.toBe(planted);
		expect([await isSession(cookie), await isSession(planted)]).toEqual([true, false]);
		const invented = `tallyplate-session=${'f'.repeat(64)}.4000000000.x`;
		expect(await cookieFor(email, { cookie: invented })).not.toBe(invented);
		expect(await isSession(invented)).toBe(false);
	});

	it('that was stolen ends with the session it was taken from', async () => {
		const { email } = await addMember(database);
		const cookie = await cookieFor(email);
		const out = await ask('/signout', { form: {}, cookie });
		expect(out.headers.location).toBe('/signin?said=out');
		expect(await isSession(cookie)).toBe(false);
	});

	it('is no business of whoever else asks: its pages are kept by nobody, others set no cookie', async () => {
		const { email } = await addMember(database);
		const cookie = await cookieFor(email);
		const own = await ask('/', { cookie });
		expect(own.body).toContain('Ann Oyster');
		expect(own.headers['cache-control']).toBe('private, no-store');
		const anybody = await ask('/');
		expect(anybody.body).not.toContain('Ann Oyster');
		expect(anybody.headers['set-cookie']).toBeUndefined();
		expect(anybody.headers['cache-control'] ?? '').not.toContain('no-store');
		expect(anybody.headers.vary).toContain('cookie');
	});

	it('goes on where somebody wanted to go, and never to another site', async () => {
		const { email } = await addMember(database);
		const form = { address: email, password: PASSWORD };
		const to = async (next: string) =>
			(await ask(`/signin?next=${encodeURIComponent(next)}`, { form })).headers.location;
		expect(await to('/tables?q=hemi')).toBe('/tables?q=hemi');
		for (const next of [EVIL, '//elsewhere.example', '/\\elsewhere.example', 'javascript:alert(1)'])
			expect(await to(next)).toBe('/account');
	});
});

describe('a link in a mail', () => {
	it('names the configured origin, whatever name the visitor called us by', async () => {
		const { email } = await addMember(database);
		const headers = { host: 'elsewhere.example', 'x-forwarded-host': 'elsewhere.example' };
		await ask('/reset?/ask', { form: { address: email }, headers });
		await ask('/signin/link', { form: { address: email }, headers });
		const fresh = newAddress();
		await ask('/signup', { form: { name: 'Ann Oyster', address: fresh, consent: 'on' }, headers });
		for (const { text, html } of [
			await mailTo(email, /^Choose a new password/),
			await mailTo(email, /sign-in link/),
			await mailTo(fresh, /^Confirm your address/)
		]) {
			expect(text).toContain(`${inject('origin')}/`);
			expect(text + html).not.toContain('elsewhere');
		}
	});

	it('is good for what it was sent for, and for nothing else', async () => {
		const { email } = await addMember(database);
		await ask('/reset?/ask', { form: { address: email } });
		const token = tokenOf(linkIn(await mailTo(email, /^Choose a new password/)));
		expect((await ask(`/confirm?token=${token}`)).body).toContain('This link has lapsed');
		const signIn = await ask(`/auth/callback/link?token=${token}&callbackUrl=%2Faccount`);
		expect(cookieSet(signIn)).toBeUndefined();
		expect((await ask(`/reset?token=${token}`)).body).toContain('Change the password');
	});

	it('that is forged, reused or over is answered alike', async () => {
		const { email } = await addMember(database);
		const choose = (token: string) =>
			ask(`/reset?/choose&token=${encodeURIComponent(token)}`, {
				form: { token, new_password: 'another cowl tag' }
			});
		const newToken = async () => {
			await ask('/reset?/ask', { form: { address: email } });
			return tokenOf(linkIn(await mailTo(email, /^Choose a new password/)));
		};
		const used = await newToken();
		expect((await choose(used)).status).toBe(303);

		const over = `${'0'.repeat(63)}1`;
		const hash = createHash('sha256')
			.update(over + inject('builtEnvironment')['AUTH_SECRET'])
			.digest('hex');
		await database.models.accountTokens.create({
			hash,
			purpose: 'reset',
			user_id: null,
			address: email,
			detail: {},
			created_at: new Date(Date.now() - 3_600_000),
			expires_at: new Date(Date.now() - 1000)
		});
		const answers = [];
		for (const token of [used, over, 'f'.repeat(64), '', '../../etc', '%00'])
			answers.push(await choose(token));
		for (const { status, body } of answers) {
			expect(status).toBe(400);
			expect(body).toContain('This link has lapsed');
		}
	});
});

describe('where no demonstration runs', () => {
	it('its people are nowhere, and cannot sign in', async () => {
		const server = await startBuiltServer({
			...inject('builtEnvironment'),
			DEMO: 'off',
			LOG_LEVEL: 'warn'
		});
		try {
			const { origin } = server;
			const page = await (await fetch(`${origin}/signin?as=edwin`)).text();
			for (const word of ['Demonstration', 'Edwin', 'plates and tags'])
				expect(page).not.toContain(word);
			expect((await fetch(`${origin}/mailbox`)).status).toBe(404);
			const tried = await fetch(`${origin}/signin`, {
				method: 'POST',
				headers: { origin, accept: 'text/html' },
				body: new URLSearchParams({
					address: 'edwin@demo.tallyplate.example',
					password: 'plates and tags'
				})
			});
			expect(tried.status).toBe(400);
			expect(await tried.text()).toContain('Address and password do not belong together.');
		} finally {
			await server.end();
		}
	});
});

describe('a flood of attempts', () => {
	it('is turned away before anything is looked at; who reads goes on', async () => {
		const server = await startBuiltServer({
			...inject('builtEnvironment'),
			ENTRIES_PER_MINUTE: '3',
			LOG_LEVEL: 'warn'
		});
		try {
			const { origin } = server;
			const body = new URLSearchParams({ address: newAddress(), password: 'not this one' });
			const post = (path: string) =>
				fetch(origin + path, { method: 'POST', headers: { origin, accept: 'text/html' }, body });
			for (const path of ['/signin', '/signin/link', '/signup'])
				expect((await post(path)).status).not.toBe(429);
			const refused = await post('/signin');
			expect(refused.status).toBe(429);
			expect(Number(refused.headers.get('retry-after'))).toBeGreaterThan(0);
			expect(await refused.json()).toMatchObject({ title: 'Too Many Requests' });
			expect((await fetch(`${origin}/signin`)).status).toBe(200);
			expect((await fetch(`${origin}/api/v1/readings?text=EB5`)).status).toBe(200);
		} finally {
			await server.end();
		}
	});
});

describe('another site', () => {
	const REQUESTS: readonly (readonly [string, string, Asked])[] = [
		['signs nobody in', '/signin', { form: { address: 'a@example.org', password: 'x' } }],
		['signs nobody out', '/signout', { form: {} }],
		['changes no name', '/account?/name', { form: { name: 'Mallory' } }],
		['deletes no account', '/account/delete', { form: { password: PASSWORD, sure: 'on' } }],
		['has nothing read in a visitor’s name', '/api/v1/readings', { method: 'POST' }]
	];
	it.each(REQUESTS)('%s', async (_, path, asked) => {
		const { email } = await addMember(database);
		const cookie = await cookieFor(email);
		for (const origin of [EVIL, 'null', `${inject('origin')}.elsewhere.example`]) {
			const types = asked.form ? ['application/x-www-form-urlencoded', 'text/plain'] : [];
			for (const type of [...types, 'application/json']) {
				const headers = { origin, 'content-type': type };
				const { status } = await ask(path, { ...asked, cookie, headers });
				expect([origin, type, status]).toEqual([origin, type, 403]);
			}
		}
		expect((await ask('/account', { cookie })).body).toContain('Ann Oyster');
	});

	it.each([
		'/auth/session',
		'/auth/signin',
		'/auth/signout',
		'/auth/csrf',
		'/auth/providers',
		'/auth/callback/password'
	])('finds none of the addresses of the sign-in library: %s', async (path) => {
		expect((await ask(path)).status).toBe(404);
		const posted = await ask(path, { form: { address: 'a@example.org', password: 'x' } });
		expect([404, 405]).toContain(posted.status);
		expect(cookieSet(posted)).toBeUndefined();
	});
});

describe('what is somebody else’s', () => {
	it('is not there: a session, a person, by whoever asks for it', async () => {
		const [ann, bob] = [await addMember(database), await addMember(database, { name: 'Bob' })];
		const [cookie, other] = [await cookieFor(ann.email), await cookieFor(bob.email)];
		const [session] = await database.models.sessions.findAll({
			where: { user_id: bob.id },
			raw: true
		});
		const { id } = session as unknown as { id: string };
		expect((await ask('/account?/session', { form: { id }, cookie })).status).toBe(404);
		expect(await isSession(other)).toBe(true);

		expect((await ask(`/people/${bob.id}`, { cookie })).status).toBe(403);
		const admin = await addMember(database, { role: 'administrator' });
		const theirs = await cookieFor(admin.email);
		expect((await ask(`/people/${bob.id}`, { cookie: theirs })).status).toBe(200);
		expect((await ask(`/people/${'0'.repeat(32)}`, { cookie: theirs })).status).toBe(404);
		expect(
			(await ask(`/people/${encodeURIComponent("' OR 1=1")}`, { cookie: theirs })).status
		).toBe(404);
		const role = { version: '1', role: 'administrator' };
		const made = await ask(`/people/${bob.id}?/role`, { form: role, cookie: other });
		expect(made.status).toBe(403);
	});
});

describe('a role', () => {
	it('that is taken in the middle of a session is gone with the next request', async () => {
		const admin = await addMember(database, { role: 'administrator' });
		const cookie = await cookieFor(admin.email);
		expect((await ask('/people', { cookie })).status).toBe(200);
		await database.models.users.update({ role: 'member' }, { where: { id: admin.id } });
		expect((await ask('/people', { cookie })).status).toBe(403);
		expect((await ask('/people/audit', { cookie })).status).toBe(403);
		expect(await isSession(cookie)).toBe(true);
	});
});

describe('a script in a name', () => {
	it('is text on every page that shows it', async () => {
		const name = '<script>document.title="taken"</script>';
		const { email, id } = await addMember(database, { name });
		const admin = await addMember(database, { role: 'administrator' });
		const { page, complaints } = await openPage('/signin');
		try {
			for (const [address, path] of [
				[email, '/account'],
				[admin.email, '/people?q=script'],
				[admin.email, `/people/${id}`]
			] as const) {
				const [key, value] = (await cookieFor(address)).split('=') as [string, string];
				await page.context().addCookies([{ name: key, value, url: inject('origin') }]);
				await page.goto(path);
				expect(await page.locator('body').textContent()).toContain(name);
				expect(await page.title()).not.toBe('taken');
			}
			expect(complaints).toEqual([]);
		} finally {
			await page.context().close();
		}
	});
});
