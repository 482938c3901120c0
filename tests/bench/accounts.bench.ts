import { setTimeout as pause } from 'node:timers/promises';
import { hash } from '@node-rs/argon2';
import { connect } from '../../src/lib/server/db';
import { addPerson } from '../fixtures/people';
import { load } from './lib/load';
import { ratioOf } from './lib/rounds';
import { withBuiltServer } from './lib/served';

const PASSWORD = 'a cowl tag and two screws';
const ADDRESS = 'bench@example.org';
/** A page that is drawn for each request, with a session and without. */
const PAGE = '/tables/chrysler/engine?division=Plymouth&year=1970';
const READINGS = Array.from(
	{ length: 500 },
	(_, n) => `/api/v1/readings?kind=serial&text=RM23N0G${100_001 + n * 7}`
);
const SECONDS = 3;
const ATTEMPTS_A_SECOND = 25;

/** One press of the button of the sign-in page. */
const signIn = (origin: string, password: string): Promise<Response> =>
	fetch(`${origin}/signin`, {
		method: 'POST',
		headers: { origin, accept: 'text/html' },
		body: new URLSearchParams({ address: ADDRESS, password }),
		redirect: 'manual'
	});

/** Somebody who can sign in, whatever was counted in a run before. */
async function addBenchPerson(databaseUrl: string): Promise<void> {
	const database = connect(databaseUrl, { pool: 1 });
	await database.models.sharedCounters.destroy({ where: {} });
	await addPerson(database, { email: ADDRESS, password_hash: await hash(PASSWORD) });
	await database.close();
}

/** The cookie of somebody who has signed in. */
async function cookieOf(origin: string): Promise<string> {
	const [cookie] = (await signIn(origin, PASSWORD)).headers.getSetCookie();
	if (cookie === undefined) throw new Error('Nobody is signed in.');
	return cookie.split(';')[0]!;
}

/** Tries passwords at a steady pace until it is stopped. Answers how many were refused for being too many. */
function guessing(origin: string) {
	const stopped = new AbortController();
	const answers: Promise<number>[] = [];
	const done = (async () => {
		while (!stopped.signal.aborted) {
			answers.push(signIn(origin, 'not this one').then(({ status }) => status));
			await pause(1000 / ATTEMPTS_A_SECOND);
		}
		return (await Promise.all(answers)).filter((status) => status === 429).length;
	})();
	return {
		stop: () => {
			stopped.abort();
			return done;
		}
	};
}

export const figures = [
	{
		name: 'Page with a session, against the same page without',
		bound: 0.7,
		unit: '×',
		direction: 'at least',
		run: () =>
			withBuiltServer(async ({ origin }, databaseUrl) => {
				await addBenchPerson(databaseUrl);
				const cookie = await cookieOf(origin);
				const rate = (headers: Record<string, string>) => async () =>
					(await load(origin + PAGE, { seconds: SECONDS, headers })).rate;
				return ratioOf(rate({ cookie }), rate({}));
			})
	},
	{
		name: `Readings while ${ATTEMPTS_A_SECOND} sign-ins a second are refused, against readings alone`,
		bound: 0.8,
		unit: '×',
		direction: 'at least',
		run: () =>
			withBuiltServer(async ({ origin }, databaseUrl) => {
				await addBenchPerson(databaseUrl);
				const alone = async () => (await load(origin, { seconds: SECONDS, paths: READINGS })).rate;
				const beside = async () => {
					const guesses = guessing(origin);
					const rate = await alone();
					if ((await guesses.stop()) < ATTEMPTS_A_SECOND)
						throw new Error('The sign-ins were not refused.');
					return rate;
				};
				return ratioOf(beside, alone);
			})
	}
] as const;
