import type { Adapter, AdapterUser } from '@auth/core/adapters';
import { signInUser, useSignInLink } from '../accounts';
import { ground } from '../ground';

const SOON_MS = 60_000;

/**
 * What the library asks of a store for links by mail. Accounts are neither made nor changed through it, sessions
 * are ours, and a link is written together with its mail.
 */
export const linkAdapter: Adapter = {
	async getUserByEmail(address): Promise<AdapterUser | null> {
		const user = await signInUser(ground(), address);
		return user && { id: user.id, email: user.email ?? '', emailVerified: null };
	},
	createVerificationToken: async (token) => token,
	async useVerificationToken({ token }) {
		const address = await useSignInLink(ground(), token);
		// Whether it has lapsed was asked of our own clock.
		return address === null
			? null
			: { identifier: address, token, expires: new Date(Date.now() + SOON_MS) };
	},
	getUser: async () => null,
	updateUser: async (user) => user as AdapterUser,
	createUser: async () => {
		throw new Error('Nobody gets an account by a sign-in link.');
	}
};
