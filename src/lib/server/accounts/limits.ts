import { config } from '../config';
import type { Ground } from '../ground';
import { giveBack, take, TooOftenError, type Limit } from '../limits';
import { accountOf } from '../networks';

const HOUR = 3600;
const QUARTER = 900;

/** For one network address, whoever it tries to be. */
const attempts = (what: string): Limit => ({
	what,
	most: config().attemptsPerHour,
	seconds: HOUR
});
/** From one network address at one account: guessing ends here, and locks nobody else out. */
const GUESSES: Limit = { what: 'guess', most: 10, seconds: QUARTER };
/** At one account, from wherever: many machines guess together. */
const ALL_GUESSES: Limit = { what: 'all_guesses', most: 100, seconds: HOUR };
/** Codes of a second factor have a million forms and no more. */
const CODES: Limit = { what: 'code', most: 10, seconds: QUARTER };
/** Mails that somebody else can have sent to an address. */
const MAILS: Limit = { what: 'mail', most: 5, seconds: HOUR };

type Counted = readonly (readonly [Limit, string])[];

/** Counts an attempt before it is looked at, and gives it back where it was right. */
async function counting<T>(
	ground: Ground,
	counted: Counted,
	attempt: () => Promise<T>
): Promise<T> {
	for (const [limit, who] of counted) await take(ground, limit, who);
	const done = await attempt();
	for (const [limit, who] of counted) await giveBack(ground, limit, who);
	return done;
}

/**
 * An attempt to get in with a password: only those count that go wrong.
 * @param from the visitor's network address
 * @throws {TooOftenError}
 */
export const countingGuess = <T>(
	ground: Ground,
	address: string,
	from: string,
	attempt: () => Promise<T>
): Promise<T> =>
	counting(
		ground,
		[
			[attempts('sign_in'), accountOf(from)],
			[GUESSES, `${accountOf(from)} ${address}`],
			[ALL_GUESSES, address]
		],
		attempt
	);

/** An attempt at a code, or at the password of who is signed in. @throws {TooOftenError} */
export const countingCode = <T>(
	ground: Ground,
	user_id: string,
	attempt: () => Promise<T>
): Promise<T> => counting(ground, [[CODES, user_id]], attempt);

/** Somebody asks for a mail. @throws {TooOftenError} */
export const takeRequest = (ground: Ground, what: string, from: string): Promise<void> =>
	take(ground, attempts(what), accountOf(from));

/** Whether an address may be written to once more; whoever asked is not told. */
export async function mayWriteTo(ground: Ground, address: string): Promise<boolean> {
	try {
		await take(ground, MAILS, address);
		return true;
	} catch (error) {
		if (error instanceof TooOftenError) return false;
		throw error;
	}
}
