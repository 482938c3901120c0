import { QueryTypes } from 'sequelize';
import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import {
	actorOf,
	changeOwnName,
	changeOwnPassword,
	confirmNewAddress,
	deleteOwnAccount,
	ensureDemoPeople,
	exportOwnData,
	lookAtNewAddress,
	ownAccount,
	requestNewAddress,
	requestReset,
	resetPassword
} from '../../src/lib/server/accounts';
import { verifyChain } from '../../src/lib/server/audit';
import { inTransaction } from '../../src/lib/server/db';
import { files, notices } from '../../src/lib/server/db/repositories';
import { queueMail } from '../../src/lib/server/mail';
import { personNameSchema, mailAddressSchema } from '../../src/lib/types';
import {
	configureAccounts,
	FROM,
	join,
	mailsFor,
	PASSWORD,
	signIn,
	tokenFor
} from '../fixtures/accounts';
import { MINUTE, standingClock } from '../fixtures/clock';
import { openTestDatabase, type TestDatabase } from '../fixtures/database';
import { addPerson } from '../fixtures/people';

configureAccounts();
let database: TestDatabase;
let { clock, ahead } = standingClock();
let count = 0;
let address = '';
const ground = () => ({ database, clock });

beforeAll(async () => {
	database = await openTestDatabase();
});
beforeEach(() => {
	({ clock, ahead } = standingClock());
	address = `somebody-${(count += 1)}@example.org`;
});

describe('a name', () => {
	it('is changed, and is text whatever stands in it', async () => {
		const { actor, cookie } = await join(ground(), address);
		const name = '<script>alert(1)</script>';
		await changeOwnName(ground(), actor, personNameSchema.parse(name));
		expect(await actorOf(ground(), cookie)).toMatchObject({ name });
	});

	it.each([
		['  Ann\t\n Oyster ', 'Ann Oyster'],
		['Ann\u202eretsyO', 'Ann retsyO'],
		['Ren\u0065\u0301', 'Ren\u00e9']
	])('is one line that can be seen: %j', (typed, kept) => {
		expect(personNameSchema.parse(typed)).toBe(kept);
	});

	it.each(['', ' A ', 'x'.repeat(61)])(
		'is refused when it is too short or too long: %j',
		(typed) => {
			expect(personNameSchema.safeParse(typed).success).toBe(false);
		}
	);
});

describe('a mail address', () => {
	it.each([
		[' Ann@Example.ORG ', 'ann@example.org'],
		['ann\uff20example.org', 'ann@example.org'],
		["o'brien+cars@mail.example.co", "o'brien+cars@mail.example.co"]
	])('is kept in one form: %j', (typed, kept) => {
		expect(mailAddressSchema.parse(typed)).toBe(kept);
	});

	it.each([
		'',
		'ann',
		'ann@example',
		'ann@evil.test,bob@example.org',
		'"ann@evil.test"@example.org',
		'ann@evil.test bob@example.org',
		'ann@example.org\r\nbcc: all@example.org',
		'Ann <ann@example.org>',
		`${'x'.repeat(65)}@example.org`
	])('is refused when it could be none, or two: %j', (typed) => {
		expect(mailAddressSchema.safeParse(typed).success).toBe(false);
	});
});

describe('a password', () => {
	it('is changed with the one before; other sessions end and the owner is told', async () => {
		const here = await join(ground(), address);
		const there = await signIn(ground(), address);
		const change = (current: string) =>
			changeOwnPassword(ground(), here.actor, { current, chosen: 'another cowl tag' });
		await expect(change('not this one')).rejects.toMatchObject({ code: 'wrong_password' });
		await change(PASSWORD);
		expect(await actorOf(ground(), here.cookie)).toMatchObject({ id: here.user_id });
		expect(await actorOf(ground(), there.cookie)).toMatchObject({ role: 'visitor' });
		await signIn(ground(), address, { password: 'another cowl tag' });
		expect((await mailsFor(database, address)).at(-1)?.subject).toMatch(/password .* was changed/);
	});

	it('of who is signed in is guessed ten times in a quarter of an hour', async () => {
		const { actor } = await join(ground(), address);
		const change = (current: string) =>
			changeOwnPassword(ground(), actor, { current, chosen: 'another cowl tag' });
		for (let n = 0; n < 10; n += 1)
			await expect(change('not this one')).rejects.toMatchObject({ code: 'wrong_password' });
		await expect(change(PASSWORD)).rejects.toMatchObject({ code: 'too_often' });
	});
});

describe('a change of address', () => {
	it('needs the password and the mail of the new address; the old one is told', async () => {
		const { actor } = await join(ground(), address);
		const to = `new-${address}`;
		const ask = (password: string) => requestNewAddress(ground(), actor, { address: to, password });
		await expect(ask('not this one')).rejects.toMatchObject({ code: 'wrong_password' });
		await ask(PASSWORD);
		expect(await ownAccount(ground(), actor)).toMatchObject({ address });
		const token = await tokenFor(database, to);
		expect(await lookAtNewAddress(ground(), token)).toBe(to);

		await confirmNewAddress(ground(), token);
		expect(await ownAccount(ground(), actor)).toMatchObject({ address: to });
		expect((await mailsFor(database, address)).at(-1)?.subject).toMatch(/address .* was changed/);
		await signIn(ground(), to);
		await expect(signIn(ground(), address)).rejects.toMatchObject({ code: 'wrong_sign_in' });
		await expect(confirmNewAddress(ground(), token)).rejects.toMatchObject({ code: 'lapsed_link' });
	});

	it('lets a link that went to the old address lapse', async () => {
		const { actor } = await join(ground(), address);
		await requestReset(ground(), address, FROM);
		const reset = await tokenFor(database, address);
		await requestNewAddress(ground(), actor, { address: `new-${address}`, password: PASSWORD });
		await confirmNewAddress(ground(), await tokenFor(database, `new-${address}`));
		await expect(resetPassword(ground(), reset, 'another cowl tag')).rejects.toMatchObject({
			code: 'lapsed_link'
		});
	});

	it('to one that has an account tells only its owner', async () => {
		const { actor } = await join(ground(), address);
		const taken = `taken-${address}`;
		await addPerson(database, { email: taken });
		await requestNewAddress(ground(), actor, { address: taken, password: PASSWORD });
		expect((await mailsFor(database, taken)).map(({ subject }) => subject)).toEqual([
			'You already have an account at Tallyplate'
		]);
	});

	it('to one that has got an account meanwhile does not come about', async () => {
		const { actor } = await join(ground(), address);
		const to = `new-${address}`;
		await requestNewAddress(ground(), actor, { address: to, password: PASSWORD });
		const token = await tokenFor(database, to);
		await addPerson(database, { email: to });
		await expect(confirmNewAddress(ground(), token)).rejects.toMatchObject({ code: 'lapsed_link' });
		expect(await ownAccount(ground(), actor)).toMatchObject({ address });
	});
});

const SAVED = `INSERT INTO saved_readings
	(id, owner, kind, text, context, edition, reader, result, saved_at)
	VALUES (:id, :owner, 'serial', 'RM23N0G100123', '{}', 1, 'r', '{"readings":[]}', NOW(3))`;

describe('one’s own data', () => {
	beforeAll(async () => {
		await database.sequelize.query(
			`INSERT INTO editions (number, digest, cause, made_at) VALUES (1, '', 'release', NOW(3))`
		);
	});
	/** A saved reading, a file and a choice of somebody's. */
	async function save(owner: string, name = 'cowl tag.jpg') {
		const id = owner.slice(0, 8);
		await database.sequelize.query(SAVED, { replacements: { id: `reading-${id}`, owner } });
		const file = { id: `file-${id}`, owner, name, storage_key: `files/${id}`, bytes: 9 };
		await files.addFile(database, { ...file, created_at: clock() });
		await inTransaction(database, (transaction) =>
			notices.putPreferences(database, [{ user_id: owner, kind: 'work', mail: 'off' }], transaction)
		);
	}

	it('are taken along as JSON, without what is secret', async () => {
		const { actor, user_id, cookie } = await join(ground(), address);
		await save(user_id);
		await changeOwnPassword(ground(), actor, { current: PASSWORD, chosen: 'another cowl tag' });
		const data = JSON.parse(JSON.stringify(await exportOwnData(ground(), actor)));
		expect(data).toMatchObject({
			account: { id: user_id, name: 'Ann Oyster', address, role: 'member' },
			sessions: [{ device: 'Firefox on Linux', here: true }],
			record: [{ action: 'person.password_changed', by: 'you', about: 'you' }],
			saved_readings: [{ text: 'RM23N0G100123', result: { readings: [] } }],
			files: [{ name: 'cowl tag.jpg', state: 'arriving' }],
			inbox: { notices: [], preferences: [{ kind: 'work', mail: 'off' }] },
			mails: [{ recipient: address, subject: expect.stringContaining('password') }]
		});
		const written = JSON.stringify(data);
		expect(written).not.toContain('argon2');
		expect(written).not.toContain(cookie.split('.')[0]);
	});

	it('go with the account: name, address and all that is theirs; the record stands under a former member', async () => {
		const { actor, user_id, cookie } = await join(ground(), address);
		await save(user_id);
		await requestReset(ground(), address, FROM);
		await changeOwnPassword(ground(), actor, { current: PASSWORD, chosen: 'another cowl tag' });
		await expect(deleteOwnAccount(ground(), actor, PASSWORD)).rejects.toMatchObject({
			code: 'wrong_password'
		});
		ahead(MINUTE);
		await deleteOwnAccount(ground(), actor, 'another cowl tag');

		expect(await actorOf(ground(), cookie)).toMatchObject({ role: 'visitor' });
		await expect(signIn(ground(), address, { password: 'another cowl tag' })).rejects.toMatchObject(
			{ code: 'wrong_sign_in' }
		);
		const user = await database.models.users.findByPk(user_id, { raw: true });
		expect(user).toMatchObject({
			name: null,
			email: null,
			password_hash: null,
			deleted_at: clock()
		});
		expect(await files.filesOf(database, user_id)).toEqual([]);
		expect(await files.deletedFiles(database, 9)).toMatchObject([{ owner: null, name: '' }]);
		expect(await notices.preferencesOf(database, user_id)).toEqual([]);
		const left = await mailsFor(database, address);
		expect(left.map(({ subject, user_id: of }) => [subject, of])).toEqual([
			['Your account at Tallyplate is gone', null]
		]);
		const about = await database.models.audit.findAll({ where: { subject_id: user_id } });
		expect(about.map((entry) => entry.get('action'))).toEqual([
			'person.password_changed',
			'person.left'
		]);
		expect(await verifyChain(database)).toMatchObject({ holds: true });
	});

	it('leave nothing of the name or the address in any table', async () => {
		const name = 'Zebulon Quagmire-Featherstone';
		const { actor, user_id } = await join(ground(), address, { name });
		await save(user_id, `${name}.jpg`);
		await requestReset(ground(), address, FROM);
		await requestNewAddress(ground(), actor, { address: `new-${address}`, password: PASSWORD });
		await deleteOwnAccount(ground(), actor, PASSWORD);
		await database.models.outbox.destroy({ where: { recipient: [address, `new-${address}`] } });
		const columns = await database.sequelize.query<{ of: string; name: string }>(
			`SELECT table_name AS of, column_name AS name FROM information_schema.columns
			WHERE table_schema = DATABASE() AND data_type IN ('varchar', 'char', 'text', 'mediumtext', 'longtext')`,
			{ type: QueryTypes.SELECT }
		);
		for (const { of, name: column } of columns) {
			const [found] = await database.sequelize.query<{ n: number }>(
				`SELECT COUNT(*) AS n FROM \`${of}\`
				WHERE INSTR(\`${column}\`, :name) > 0 OR INSTR(\`${column}\`, :address) > 0`,
				{ replacements: { name, address }, type: QueryTypes.SELECT }
			);
			expect([of, column, found?.n]).toEqual([of, column, 0]);
		}
	});

	it('of the last administrator stay: nobody would be left to appoint another', async () => {
		const { actor } = await join(ground(), address, { role: 'administrator' });
		await expect(deleteOwnAccount(ground(), actor, PASSWORD)).rejects.toMatchObject({
			code: 'last_administrator'
		});
		await addPerson(database, { role: 'administrator' });
		await deleteOwnAccount(ground(), actor, PASSWORD);
	});
});

describe('what is kept for people', () => {
	/** What becomes of each when the account goes. A table that is not here has to be thought about. */
	const THOUGHT_ABOUT: Readonly<Record<string, string>> = {
		'account_tokens.user_id': 'goes',
		'audit.actor': 'stays, under a former member',
		'files.owner': 'goes',
		'jobs.user_id': 'goes',
		'notices.user_id': 'goes',
		'notice_preferences.user_id': 'goes',
		'outbox.user_id': 'goes',
		'recovery_codes.user_id': 'goes',
		'release_conflicts.resolved_by': 'stays, under a former member',
		'saved_readings.owner': 'goes',
		'second_factors.user_id': 'goes',
		'sessions.user_id': 'goes'
	};

	it('goes with the account, or stays for a reason', async () => {
		const found = await database.sequelize.query<{ of: string }>(
			`SELECT CONCAT(table_name, '.', column_name) AS of FROM information_schema.key_column_usage
			WHERE table_schema = DATABASE() AND referenced_table_name = 'users' ORDER BY of`,
			{ type: QueryTypes.SELECT }
		);
		expect(found.map(({ of }) => of)).toEqual(Object.keys(THOUGHT_ABOUT));
	});
});

describe('the people of a demonstration', () => {
	it('are there once, come back when they have left, and keep what else became of them', async () => {
		await Promise.all([ensureDemoPeople(ground()), ensureDemoPeople(ground())]);
		const people = () =>
			database.models.users.findAll({ where: { demo: true }, order: ['id'], raw: true });
		const first = await people();
		expect(first).toHaveLength(9);
		const count = (role: string) =>
			(first as unknown as { role: string }[]).filter((one) => one.role === role).length;
		expect([count('moderator'), count('administrator')]).toEqual([3, 2]);
		await database.models.users.update(
			{ deleted_at: clock(), name: null, email: null },
			{ where: { id: 'demo-ruth' } }
		);
		await database.models.users.update({ name: 'Walter' }, { where: { id: 'demo-walt' } });
		await ensureDemoPeople(ground());
		const again = (await people()) as unknown as { id: string; name: string }[];
		expect(again).toHaveLength(9);
		expect(again.find(({ id }) => id === 'demo-ruth')?.name).toBe('Ruth Castellane');
		expect(again.find(({ id }) => id === 'demo-walt')?.name).toBe('Walter');
	});
});

describe('a name in a mail', () => {
	it('stands there as text', async () => {
		await inTransaction(database, (transaction) =>
			queueMail(
				{ ...ground(), transaction },
				{
					to: { address, user_id: null },
					template: 'account_deleted',
					data: { name: '<img src=x onerror=alert(1)>' },
					kind: 'access'
				}
			)
		);
		const [mail] = await mailsFor(database, address);
		expect(mail?.body_html).toContain('&lt;img src=x');
		expect(mail?.body_html).not.toContain('<img');
	});
});
