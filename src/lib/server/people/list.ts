import type { Division, Role } from '../../types';
import { requireAdministrator, type Actor } from '../actor';
import { asking } from '../db';
import { sessions, users, type UserRecord } from '../db/repositories';
import type { Ground } from '../ground';
import { UnknownPersonError } from './errors';

/** Somebody in the list. */
export interface PersonListed {
	readonly id: string;
	readonly name: string;
	readonly address: string;
	readonly role: Role;
	readonly areas: readonly Division[];
	/** While it lasts. */
	readonly pausedUntil: Date | null;
	readonly since: Date;
	readonly demo: boolean;
}

/** Somebody by themselves. */
export interface PersonShown extends PersonListed {
	readonly pauseReason: string | null;
	/** To be sent along with a change, so that two administrators do not undo each other. */
	readonly version: number;
	readonly sessions: readonly {
		readonly id: string;
		readonly device: string;
		readonly way: string;
		readonly since: Date;
		readonly seen: Date;
	}[];
}

const listed = (user: UserRecord, now: Date): PersonListed => ({
	id: user.id,
	name: user.name ?? '',
	address: user.email ?? '',
	role: user.role,
	areas: user.areas,
	pausedUntil: user.paused_until !== null && user.paused_until > now ? user.paused_until : null,
	since: user.created_at,
	demo: Boolean(user.demo)
});

export interface PeopleQuery {
	/** Part of a name or an address. */
	readonly text?: string;
	readonly role?: Role;
	readonly paused?: boolean;
	/** From 1 on. */
	readonly page?: number;
}

/** People on a page of the list. */
export const PEOPLE_A_PAGE = 50;

/**
 * People by name.
 * @throws what `requireAdministrator` throws @throws {DatabaseAwayError}
 */
export async function listPeople(
	{ database, clock }: Ground,
	actor: Actor,
	{ text, role, paused, page = 1 }: PeopleQuery = {}
): Promise<{ total: number; people: readonly PersonListed[] }> {
	requireAdministrator(actor);
	const now = clock();
	const found = await asking(() =>
		users.findPeople(
			database,
			{ text, role, pausedAt: paused ? now : undefined },
			{ limit: PEOPLE_A_PAGE, offset: (page - 1) * PEOPLE_A_PAGE }
		)
	);
	return { total: found.total, people: found.people.map((user) => listed(user, now)) };
}

/**
 * Somebody, with the sessions that they have open.
 * @throws what `requireAdministrator` throws @throws {UnknownPersonError} @throws {DatabaseAwayError}
 */
export async function showPerson(
	{ database, clock }: Ground,
	actor: Actor,
	id: string
): Promise<PersonShown> {
	requireAdministrator(actor);
	const now = clock();
	const user = await asking(() => users.userById(database, id));
	if (user === null) throw new UnknownPersonError();
	const open = await asking(() => sessions.sessionsOf(database, id, now));
	const person = listed(user, now);
	return {
		...person,
		pauseReason: person.pausedUntil && user.pause_reason,
		version: user.version,
		sessions: open.map(({ id: session, device, way, created_at, seen_at }) => ({
			id: session,
			device,
			way,
			since: created_at,
			seen: seen_at
		}))
	};
}
