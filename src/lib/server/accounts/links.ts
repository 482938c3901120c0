import { config } from '../config';
import type { Transaction } from '../db';
import { accountTokens } from '../db/repositories';
import type { Ground } from '../ground';
import { hashOfSecret, installationSecret, newSecret } from './secrets';

/** What a link in a mail is good for, once, and for how long. */
export const LINKS = {
	/** Opens the account of a new address. */
	sign_up: { minutes: 24 * 60, holds: '24 hours', path: '/confirm' },
	/** Moves an account to a new address. */
	new_address: { minutes: 24 * 60, holds: '24 hours', path: '/confirm' },
	/** Lets choose a new password. */
	reset: { minutes: 30, holds: '30 minutes', path: '/reset' },
	/** Signs in. */
	sign_in: { minutes: 15, holds: '15 minutes', path: '/signin/link' }
} as const;
export type LinkPurpose = keyof typeof LINKS;

/** What came of a link. */
export interface Link<Detail> {
	readonly user_id: string | null;
	readonly address: string;
	readonly detail: Detail;
}

/** How the token of a link is kept, as the sign-in library does it with its own. */
const hashOfToken = (token: string): string => hashOfSecret(token + installationSecret());

/** The address of a link, always at the configured origin, whatever name the visitor called us by. */
export const linkFor = (purpose: LinkPurpose, token: string): string =>
	`${config().origin}${LINKS[purpose].path}?token=${token}`;

/**
 * Makes a link; it holds once the transaction has ended well.
 * @param token one that was made elsewhere
 * @returns its address
 */
export async function issueLink<Detail>(
	{ database, clock }: Ground,
	transaction: Transaction,
	purpose: LinkPurpose,
	{ user_id, address, detail }: Link<Detail>,
	token = newSecret()
): Promise<string> {
	const now = clock();
	await accountTokens.addToken(
		database,
		{
			hash: hashOfToken(token),
			purpose,
			user_id,
			address,
			detail,
			created_at: now,
			expires_at: new Date(now.getTime() + LINKS[purpose].minutes * 60_000)
		},
		transaction
	);
	return linkFor(purpose, token);
}

/** Looks at a link and leaves it as it is: programs that look after mail open links too. */
export async function lookAtLink(
	{ database, clock }: Ground,
	purpose: LinkPurpose,
	token: string
): Promise<Link<unknown> | null> {
	return accountTokens.tokenOf(database, hashOfToken(token), purpose, clock());
}

/** Uses a link up. Null when it was used before, has lapsed, or was never ours. */
export const useLink = (
	ground: Ground,
	transaction: Transaction,
	purpose: LinkPurpose,
	token: string
): Promise<Link<unknown> | null> => useLinkByHash(ground, transaction, purpose, hashOfToken(token));

/** As `useLink`, for whoever has the hash of its token. */
export const useLinkByHash = (
	{ database, clock }: Ground,
	transaction: Transaction,
	purpose: LinkPurpose,
	hash: string
): Promise<Link<unknown> | null> =>
	accountTokens.takeToken(database, hash, purpose, clock(), transaction);

/** Links that have lapsed. */
export const LINK_CLEANERS = [
	({ database, clock }: Ground) => accountTokens.forgetLapsedTokens(database, clock())
] as const;
