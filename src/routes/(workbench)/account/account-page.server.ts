/** What the page of one's own account shows. */
import { day } from '$lib/format/editions';
import { ownAccount, ownSessions } from '$lib/server/accounts';
import type { Actor } from '$lib/server/actor';
import { ground } from '$lib/server/ground';
import { accountText } from '$lib/text/en/account';
import { accountsText } from '$lib/text/en/accounts';

const dayOf = (date: Date): string => day(date.toISOString());

/** @throws {SignInNeededError} @throws {DatabaseAwayError} */
export async function accountPage(actor: Actor) {
	const account = await ownAccount(ground(), actor);
	const sessions = await ownSessions(ground(), actor);
	const role = accountsText.roles[account.role];
	const { factor, consent, paused } = account;
	return {
		name: account.name,
		address: account.address,
		standing:
			account.areas.length > 0
				? accountText.standingWithArea(role, dayOf(account.since), account.areas.join(', '))
				: accountText.standingPlain(role, dayOf(account.since)),
		consent: consent && accountText.consent(consent.license, dayOf(consent.at)),
		paused: paused && accountText.paused(dayOf(paused.until), paused.reason),
		needsFactor: account.needsFactor ? accountText.needsFactor(role) : null,
		factor: factor && accountText.factor.on(dayOf(factor.since), factor.codesLeft),
		sessions: sessions.map(({ id, device, way, since, seen, here }) => ({
			id,
			device,
			way: accountText.sessions.ways[way] ?? way,
			since: dayOf(since),
			seen: dayOf(seen),
			here
		}))
	};
}
