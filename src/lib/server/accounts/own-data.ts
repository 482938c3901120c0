import { requireMember, type Actor } from '../actor';
import { ownTrail } from '../audit';
import type { Ground } from '../ground';
import { BELONGINGS } from './belongings';
import { ownRecord } from './profile';
import { ownSessions } from './sessions';

/**
 * Everything that is kept about who is signed in, to take along as JSON. What is secret even to them (password,
 * second factor, links) is left out.
 * @throws {SignInNeededError} @throws {DatabaseAwayError}
 */
export async function exportOwnData(
	ground: Ground,
	actor: Actor
): Promise<Readonly<Record<string, unknown>>> {
	requireMember(actor);
	const user = await ownRecord(ground, actor);
	const trail = await ownTrail(ground, actor);
	const belongings: Record<string, unknown> = {};
	for (const { name, of } of BELONGINGS) belongings[name] = await of(ground, actor.id);
	return {
		made_at: ground.clock(),
		account: {
			id: user.id,
			name: user.name,
			address: user.email,
			address_confirmed_at: user.email_verified_at,
			role: user.role,
			areas: user.areas,
			consent: { license: user.consented_to, at: user.consented_at },
			paused_until: user.paused_until,
			pause_reason: user.pause_reason,
			since: user.created_at
		},
		sessions: await ownSessions(ground, actor),
		record: trail.map(({ number, at, action, actor: by, subject_id, detail }) => ({
			number,
			at,
			action,
			by: by === actor.id ? 'you' : by === null ? 'the product' : 'somebody else',
			about: subject_id === actor.id ? 'you' : 'somebody else',
			detail
		})),
		...belongings
	};
}
