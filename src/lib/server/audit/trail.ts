import { requireAdministrator, requireMember, type Actor } from '../actor';
import { asking } from '../db';
import { audit, users, type AuditDetail, type AuditRecord } from '../db/repositories';
import type { Ground } from '../ground';

/** An entry as it is shown: names are those of today, null where the account is gone. */
export interface TrailEntry {
	readonly number: number;
	readonly at: Date;
	readonly action: string;
	readonly actor: { readonly id: string; readonly name: string | null } | null;
	readonly subject: { readonly id: string; readonly name: string | null };
	readonly detail: AuditDetail;
}

export interface TrailPage {
	readonly entries: readonly TrailEntry[];
	/** Number below which the next page begins; null at the end. */
	readonly next: number | null;
}

async function shown(ground: Ground, entries: readonly AuditRecord[]): Promise<TrailEntry[]> {
	const ids = entries.flatMap(({ actor, subject_id }) => [actor, subject_id]);
	const names = await users.namesOf(
		ground.database,
		ids.filter((id) => id !== null)
	);
	const named = (id: string) => ({ id, name: names.get(id) ?? null });
	return entries.map(({ number, at, action, actor, subject_id, detail }) => ({
		number,
		at,
		action,
		actor: actor === null ? null : named(actor),
		subject: named(subject_id),
		detail
	}));
}

const PAGE = 50;

/**
 * The trail, newest first.
 * @param about only what somebody did, and what was done to them
 * @throws what `requireAdministrator` throws @throws {DatabaseAwayError}
 */
export async function trail(
	ground: Ground,
	actor: Actor,
	{ about, below }: { about?: string; below?: number } = {}
): Promise<TrailPage> {
	requireAdministrator(actor);
	return asking(async () => {
		const found = await audit.newestEntries(ground.database, { person: about, below }, PAGE + 1);
		const entries = await shown(ground, found.slice(0, PAGE));
		return { entries, next: found.length > PAGE ? (entries.at(-1)?.number ?? null) : null };
	});
}

/**
 * What is on record about somebody, and what they did: for the copy of their own data.
 * @throws {SignInNeededError} @throws {DatabaseAwayError}
 */
export async function ownTrail(ground: Ground, actor: Actor): Promise<AuditRecord[]> {
	requireMember(actor);
	return asking(() => audit.newestEntries(ground.database, { person: actor.id }, 10_000));
}
