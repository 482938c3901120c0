import { redirect, type RequestEvent } from '@sveltejs/kit';
import { actorOf } from '../accounts';
import { VISITOR, type Actor, type Person } from '../actor';
import { config, ConfigurationError } from '../config';
import { DatabaseAwayError } from '../db';
import { ground } from '../ground';
import { cookieName } from './cookie';

/** Whether a request carries a session at all. */
export const hasSession = ({ cookies }: Pick<RequestEvent, 'cookies'>): boolean =>
	cookies.get(cookieName()) !== undefined;

/**
 * Who asks: one query where there is a cookie, none where there is not.
 * @throws {DatabaseAwayError}
 */
export async function actorOfRequest({ cookies }: Pick<RequestEvent, 'cookies'>): Promise<Actor> {
	const cookie = cookies.get(cookieName());
	return cookie === undefined ? VISITOR : actorOf(ground(), cookie);
}

/** Who asks, as the head of every page shows them. Named fields only. */
export interface Viewer {
	readonly name: string;
	readonly role: Person['role'];
	/** The role on record asks for a second factor. */
	readonly needsFactor: boolean;
	/** Notices in their inbox that they have not read. */
	readonly unread: number;
}

/**
 * Who is signed in, for the head of a page. Without the database nobody is, and the page stands all the same.
 * @param actor asks once for a request
 */
export async function viewerOf(actor: () => Promise<Actor>): Promise<Viewer | null> {
	try {
		const found = await actor();
		if (found.role === 'visitor') return null;
		return {
			name: found.name,
			role: found.role,
			needsFactor: found.role !== found.granted,
			unread: found.unread
		};
	} catch (error) {
		if (error instanceof DatabaseAwayError) return null;
		throw error;
	}
}

const OWN_PATH = /^\/(?![/\\])[^\\\p{Cc}]*$/u;

/** A path of ours to go on to; anything else leads to `otherwise`. */
export const ownPath = (path: string | null, otherwise = '/account'): string =>
	path !== null && OWN_PATH.test(path) ? path : otherwise;

/**
 * For pages of who is signed in: anybody else is asked to sign in first, and comes back afterwards. What is done there
 * has its own guard.
 */
export async function signedIn({
	locals,
	url
}: Pick<RequestEvent, 'locals' | 'url'>): Promise<Person> {
	const actor = await locals.actor();
	if (actor.role !== 'visitor') return actor;
	const next = encodeURIComponent(url.pathname + url.search);
	redirect(303, actor.awaitsCode ? `/signin/code?next=${next}` : `/signin?next=${next}`);
}

/**
 * Looks whether sign-in rests on what it must: the library takes its own name from AUTH_URL, or else from whatever a
 * request says of itself.
 * @throws {ConfigurationError}
 */
export function checkSignIn(): void {
	const { authSecret, authUrl, origin } = config();
	if (authSecret === undefined) throw new ConfigurationError('AUTH_SECRET is not set.');
	if (authUrl !== origin)
		throw new ConfigurationError(`AUTH_URL is not set; expected the origin, ${origin}.`);
}
