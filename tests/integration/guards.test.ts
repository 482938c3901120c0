import { describe, expect, it } from 'vitest';
import * as accounts from '../../src/lib/server/accounts';
import { VISITOR, type Actor } from '../../src/lib/server/actor';
import * as audit from '../../src/lib/server/audit';
import * as files from '../../src/lib/server/files';
import type { Ground } from '../../src/lib/server/ground';
import * as inbox from '../../src/lib/server/inbox';
import * as jobs from '../../src/lib/server/jobs';
import * as mail from '../../src/lib/server/mail';
import * as people from '../../src/lib/server/people';
import { configureAccounts } from '../fixtures/accounts';
import { actorOf, buildUser } from '../fixtures/people';

configureAccounts();

/** Who may call a function, at the least. */
type Least = 'anybody' | 'member' | 'writer' | 'administrator';

/**
 * Every function that a guarded subject offers, and who may call it. A function that is not here fails, so that
 * whoever adds one has to think of its guard. `anybody` acts for whoever holds a link, a password or a cookie, for
 * the console, or for nobody; or it answers over HTTP what the others refuse.
 */
const SUBJECTS: Readonly<
	Record<string, readonly [subject: object, functions: Readonly<Record<string, Least>>]>
> = {
	accounts: [
		accounts,
		{
			actorOf: 'anybody',
			changeOwnName: 'member',
			changeOwnPassword: 'member',
			confirmFactor: 'member',
			confirmNewAddress: 'anybody',
			confirmSignUp: 'anybody',
			deleteOwnAccount: 'member',
			demoPeople: 'anybody',
			deviceOf: 'anybody',
			endAllOwnSessions: 'member',
			endByCookie: 'anybody',
			endOwnSession: 'member',
			ensureDemoPeople: 'anybody',
			exportOwnData: 'member',
			inSteadyTime: 'anybody',
			installationSecret: 'anybody',
			isReset: 'anybody',
			lookAtNewAddress: 'anybody',
			lookAtSignUp: 'anybody',
			newSecret: 'anybody',
			offerFactor: 'member',
			openSession: 'anybody',
			ownAccount: 'member',
			ownSessions: 'member',
			readSessionToken: 'anybody',
			removeFactor: 'member',
			renewRecoveryCodes: 'member',
			requestNewAddress: 'member',
			requestReset: 'anybody',
			requestSignUp: 'anybody',
			requireOtherAdministrator: 'anybody',
			resetPassword: 'anybody',
			sendSignInLink: 'anybody',
			signInByCode: 'anybody',
			signInByPassword: 'anybody',
			signInUser: 'anybody',
			takeLinkRequest: 'anybody',
			useSignInLink: 'anybody',
			writeSessionToken: 'anybody'
		}
	],
	people: [
		people,
		{
			appointAdministrator: 'anybody',
			endSessionsOf: 'administrator',
			listPeople: 'administrator',
			pausePerson: 'administrator',
			resumePerson: 'administrator',
			setRole: 'administrator',
			showPerson: 'administrator'
		}
	],
	audit: [
		audit,
		{
			ownTrail: 'member',
			record: 'anybody',
			trail: 'administrator',
			verifyChain: 'anybody'
		}
	],
	files: [
		files,
		{
			answerTus: 'anybody',
			arrivalFor: 'writer',
			checkFileKind: 'anybody',
			configuredStore: 'anybody',
			deleteFile: 'member',
			endFile: 'writer',
			expectFile: 'writer',
			fileAddress: 'member',
			fileFor: 'member',
			fileGround: 'anybody',
			filesFor: 'member',
			giveUpAbandoned: 'anybody',
			openFile: 'member',
			queueRemoval: 'anybody',
			removeFilesKind: 'anybody',
			s3Store: 'anybody',
			settledFileFor: 'member',
			takeFileOfForm: 'writer',
			takePart: 'writer'
		}
	],
	inbox: [
		inbox,
		{
			archiveNotice: 'member',
			giveNotice: 'anybody',
			lookAtUnsubscription: 'anybody',
			noticesFor: 'member',
			openNotice: 'member',
			ownPreferences: 'member',
			readAllNotices: 'member',
			setOwnPreferences: 'member',
			unsubscribe: 'anybody'
		}
	],
	mail: [
		mail,
		{
			demoMailbox: 'anybody',
			keptMail: 'anybody',
			keptMails: 'anybody',
			queueMail: 'anybody',
			readUnsubscribeToken: 'anybody',
			sendNext: 'anybody',
			smtpPost: 'anybody',
			unsentMails: 'administrator'
		}
	],
	jobs: [
		jobs,
		{
			queueJob: 'anybody',
			queueRepeated: 'anybody',
			runNext: 'anybody',
			stopWork: 'member',
			workFor: 'member'
		}
	]
};

const member = actorOf(buildUser());
const moderator = actorOf(buildUser({ role: 'moderator' }));
const paused = { until: new Date('2027-01-01T00:00:00.000Z'), reason: 'Rest.' };
const UNKNOWN = [
	['a visitor', VISITOR, 'sign_in_needed'],
	['somebody whose code is awaited', { ...VISITOR, awaitsCode: true }, 'sign_in_needed']
] as const;
/** Those who may not, and what they hear. */
const REFUSED: Readonly<Record<Least, readonly (readonly [string, Actor, code: string])[]>> = {
	anybody: [],
	member: UNKNOWN,
	writer: [...UNKNOWN, ['a member who is paused', actorOf(buildUser(), { paused }), 'paused']],
	administrator: [
		...UNKNOWN,
		['a member', member, 'not_allowed'],
		['a moderator', moderator, 'not_allowed'],
		[
			'an administrator without a second factor',
			actorOf(buildUser(), { granted: 'administrator' }),
			'second_factor_needed'
		],
		[
			'an administrator who is paused',
			actorOf(buildUser({ role: 'administrator' }), { paused }),
			'paused'
		]
	]
};

/** Stands for a database that must not be asked before the guard has spoken. */
const untouchable: Ground = {
	database: new Proxy({} as Ground['database'], {
		get: () => {
			throw new Error('The database was asked.');
		}
	}),
	clock: () => {
		throw new Error('The clock was asked.');
	}
};

type Guarded = (ground: Ground, actor: Actor, ...rest: unknown[]) => Promise<unknown>;
const isClass = (value: unknown): boolean => String(value).startsWith('class');

describe.each(Object.entries(SUBJECTS))('the functions of %s', (_, [subject, functions]) => {
	const offered = Object.entries(subject).filter(
		([, value]) => typeof value === 'function' && !isClass(value)
	);

	it('are all thought about, and none that is gone', () => {
		expect(offered.map(([name]) => name).sort()).toEqual(Object.keys(functions).sort());
	});

	const guarded = offered.flatMap(([name, call]) =>
		REFUSED[functions[name] ?? 'administrator'].map(
			([who, actor, code]) => [name, who, code, call as Guarded, actor] as const
		)
	);
	it.each(guarded)('%s refuses %s: %s', async (_name, _who, code, call, actor) => {
		// What comes after the two must not matter yet.
		await expect((async () => call(untouchable, actor, {}, {}))()).rejects.toMatchObject({ code });
	});
});
