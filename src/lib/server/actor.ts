/**
 * Who asks for something, and what they may. Guards stand in the functions that do the work: each takes
 * the one who asks and begins with a `require…`, so that no page and no interface can go around it.
 */
import type { Division, Role } from '../types';

/** Somebody without an account, or whose sign-in is not complete. */
export interface Visitor {
	readonly role: 'visitor';
	readonly id: null;
	/** Password or link was right, and the code of the second factor is still asked for. */
	readonly awaitsCode: boolean;
}

/** Somebody who is signed in. */
export interface Person {
	readonly id: string;
	/** Stands beside their work. */
	readonly name: string;
	/** The role that counts now. */
	readonly role: Role;
	/**
	 * The role on record. It counts only once a second factor was given, where one is required: until
	 * then a moderator or an administrator has the role of a member.
	 */
	readonly granted: Role;
	/** Divisions that a moderator decides for. */
	readonly areas: readonly Division[];
	/** Reads and takes away what is theirs, and writes nothing until then. */
	readonly paused: { readonly until: Date; readonly reason: string } | null;
	/** The session that they ask from. */
	readonly session: string;
	/** Notices in their inbox that they have not read; every page says how many, so they come with the session. */
	readonly unread: number;
}

export type Actor = Visitor | Person;

export const VISITOR: Visitor = { role: 'visitor', id: null, awaitsCode: false };

/** Nobody is signed in, and somebody has to be. */
export class SignInNeededError extends Error {
	readonly code = 'sign_in_needed';
	override readonly name = 'SignInNeededError';
	constructor() {
		super('Sign in first.');
	}
}

/** Whoever is signed in may not do this. */
export class NotAllowedError extends Error {
	readonly code = 'not_allowed';
	override readonly name = 'NotAllowedError';
	constructor(readonly needed: Role) {
		super(`This is for ${needed}s.`);
	}
}

/** The role would do, once a second factor stands beside it. */
export class SecondFactorNeededError extends Error {
	readonly code = 'second_factor_needed';
	override readonly name = 'SecondFactorNeededError';
	constructor() {
		super('This needs a second factor.');
	}
}

/** Somebody who is paused may not write. */
export class PausedError extends Error {
	readonly code = 'paused';
	override readonly name = 'PausedError';
	constructor(
		readonly until: Date,
		readonly reason: string
	) {
		super(`This account is paused until ${until.toISOString().slice(0, 10)}: ${reason}`);
	}
}

const RANK: Readonly<Record<Actor['role'], number>> = {
	visitor: 0,
	member: 1,
	moderator: 2,
	administrator: 3
};

/** For whatever is somebody's own: to see it, to take it along, to throw it away. @throws {SignInNeededError} */
export function requireMember(actor: Actor): asserts actor is Person {
	if (actor.role === 'visitor') throw new SignInNeededError();
}

/** For whatever changes what others see. @throws {SignInNeededError} @throws {PausedError} */
export function requireWriter(actor: Actor): asserts actor is Person {
	requireMember(actor);
	if (actor.paused) throw new PausedError(actor.paused.until, actor.paused.reason);
}

function requireRole(actor: Actor, needed: Role): asserts actor is Person {
	requireMember(actor);
	if (RANK[actor.role] >= RANK[needed]) return requireWriter(actor);
	if (RANK[actor.granted] >= RANK[needed]) throw new SecondFactorNeededError();
	throw new NotAllowedError(needed);
}

/**
 * For what moderators decide, and administrators where there are too few of them.
 * @throws {SignInNeededError} @throws {NotAllowedError} @throws {SecondFactorNeededError} @throws {PausedError}
 */
export function requireModerator(actor: Actor): asserts actor is Person {
	requireRole(actor, 'moderator');
}

/**
 * For what administrators do to the accounts of others.
 * @throws {SignInNeededError} @throws {NotAllowedError} @throws {SecondFactorNeededError} @throws {PausedError}
 */
export function requireAdministrator(actor: Actor): asserts actor is Person {
	requireRole(actor, 'administrator');
}
