/** What the page of one person shows. */
import { day } from '$lib/format/editions';
import type { Person } from '$lib/server/actor';
import { trail } from '$lib/server/audit';
import { ground } from '$lib/server/ground';
import { showPerson } from '$lib/server/people';
import { accountText } from '$lib/text/en/account';
import { accountsText } from '$lib/text/en/accounts';
import { peopleText as text } from '$lib/text/en/people';
import { ALL_DIVISIONS, ROLES } from '$lib/types';
import { entryLine } from '../entry-lines';

const dayOf = (date: Date): string => day(date.toISOString());

/** @throws what `showPerson` throws */
export async function personPage(actor: Person, id: string) {
	const person = await showPerson(ground(), actor, id);
	const { entries, next } = await trail(ground(), actor, { about: id });
	const { role, areas, pausedUntil, pauseReason } = person;
	return {
		id,
		name: person.name,
		address: person.address,
		version: person.version,
		own: id === actor.id,
		standing: accountText.standingOf(accountsText.roles[role], dayOf(person.since)),
		role,
		roles: ROLES.map((one) => ({ value: one, label: accountsText.roles[one] })),
		divisions: ALL_DIVISIONS.map((name) => ({ name, chosen: areas.includes(name) })),
		paused: pausedUntil && text.person.paused(dayOf(pausedUntil), pauseReason ?? ''),
		/** The first day and the last that a pause can end on. */
		days: {
			first: ground().clock().toISOString().slice(0, 10),
			last: new Date(ground().clock().getTime() + 365 * 86_400_000).toISOString().slice(0, 10)
		},
		sessions: person.sessions.map(({ id: session, device, way, since, seen }) => ({
			id: session,
			device,
			way: accountText.sessions.ways[way] ?? way,
			since: dayOf(since),
			seen: dayOf(seen)
		})),
		entries: entries.map(entryLine),
		more: next !== null
	};
}
