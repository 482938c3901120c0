import { config } from '../config';
import { asking } from '../db';
import { users } from '../db/repositories';
import type { Ground } from '../ground';
import { WrongSignInError } from './errors';
import { countingGuess } from './limits';
import { isPassword } from './passwords';

/** Whether somebody may sign in at all, by whatever way. */
export const maySignIn = (user: { deleted_at: Date | null; demo: boolean }): boolean =>
	user.deleted_at === null && (!user.demo || config().demo);

export interface PasswordAttempt {
	/** As `mailAddressSchema` gives it. */
	readonly address: string;
	readonly password: string;
	/** The visitor's network address. */
	readonly from: string;
}

/**
 * Whose address and password these are. An unknown address, a wrong password and an account that may not
 * sign in are told apart neither by the answer nor by its time.
 * @throws {WrongSignInError} @throws {TooOftenError} @throws {DatabaseAwayError}
 */
export const signInByPassword = (
	ground: Ground,
	{ address, password, from }: PasswordAttempt
): Promise<{ user_id: string }> =>
	countingGuess(ground, address, from, async () => {
		const user = await asking(() => users.userByAddress(ground.database, address));
		const usable = user !== null && maySignIn(user);
		const right = await isPassword(password, usable ? user.password_hash : null);
		if (!usable || !right) throw new WrongSignInError();
		return { user_id: user.id };
	});
