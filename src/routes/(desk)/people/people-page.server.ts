/** What the list of people shows for an address. */
import { day } from '$lib/format/editions';
import { pagingOf, type Paging } from '$lib/format/paging';
import type { Actor } from '$lib/server/actor';
import { ground } from '$lib/server/ground';
import { listPeople, PEOPLE_A_PAGE } from '$lib/server/people';
import { accountsText } from '$lib/text/en/accounts';
import { peopleText as text } from '$lib/text/en/people';
import { ROLES } from '$lib/types';

const dayOf = (date: Date): string => day(date.toISOString());

/** @throws what `listPeople` throws */
export async function peoplePage(actor: Actor, url: URL) {
	const asked = (name: string): string => url.searchParams.get(name)?.trim().slice(0, 100) ?? '';
	const role = ROLES.find((one) => one === asked('role'));
	const page = Math.max(1, Number.parseInt(asked('page'), 10) || 1);
	const paused = asked('paused') === 'on';
	const q = asked('q');
	const query = { text: q === '' ? undefined : q, role, paused, page };
	const { total, people } = await listPeople(ground(), actor, query);
	const paging: Paging = pagingOf(url, page, total, PEOPLE_A_PAGE, 'list');
	return {
		q,
		role: role ?? '',
		paused,
		roles: [
			{ value: '', label: text.find.allRoles },
			...ROLES.map((one) => ({ value: one, label: accountsText.roles[one] }))
		],
		count: text.count(total),
		people: people.map(({ id, name, address, role: of, areas, pausedUntil, since, demo }) => ({
			id,
			name,
			address,
			role: accountsText.roles[of],
			areas: areas.join(', '),
			since: dayOf(since),
			state: [
				...(pausedUntil ? [text.pausedUntil(dayOf(pausedUntil))] : []),
				...(demo ? [text.demo] : [])
			].join(', ')
		})),
		paging
	};
}
