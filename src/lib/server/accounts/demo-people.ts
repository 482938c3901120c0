import type { Division, Role } from '../../types';
import { config } from '../config';
import { inTransaction } from '../db';
import { users, type UserRecord } from '../db/repositories';
import type { Ground } from '../ground';
import { DATA_LICENSE } from './sign-up';
import { hashPassword } from './passwords';

/** Somebody made up, for each kind of person that the product is for. */
export interface DemoPerson {
	readonly key: string;
	readonly name: string;
	/** As whom they stand there: "appraiser". */
	readonly stands: string;
	readonly role: Role;
	readonly areas: readonly Division[];
}

const GM: readonly Division[] = ['Chevrolet', 'Pontiac', 'Oldsmobile', 'Buick', 'Cadillac'];
const CHRYSLER: readonly Division[] = ['Plymouth', 'Dodge', 'Chrysler', 'Imperial'];
const FORD_AND_AMC: readonly Division[] = ['Ford', 'Mercury', 'Lincoln', 'AMC'];

const member = (key: string, name: string, stands: string): DemoPerson => ({
	key,
	name,
	stands,
	role: 'member',
	areas: []
});

/** Nobody of these names is meant. */
export const DEMO_PEOPLE: readonly DemoPerson[] = [
	member('ruth', 'Ruth Castellane', 'appraiser'),
	member('walt', 'Walt Jurgensmeyer', 'restorer'),
	member('inez', 'Inez Okonski', 'contributor, marque historian'),
	member('theo', 'Theo Marchbank', 'buyer'),
	{
		key: 'dolores',
		name: 'Dolores Whitacre',
		stands: 'moderator, General Motors',
		role: 'moderator',
		areas: GM
	},
	{
		key: 'hollis',
		name: 'Hollis Traskell',
		stands: 'moderator, Chrysler Corporation',
		role: 'moderator',
		areas: CHRYSLER
	},
	{
		key: 'marguerite',
		name: 'Marguerite Bellamy-Roe',
		stands: 'moderator, Ford and American Motors',
		role: 'moderator',
		areas: FORD_AND_AMC
	},
	{
		key: 'edwin',
		name: 'Edwin Pazderka',
		stands: 'administrator',
		role: 'administrator',
		areas: []
	},
	{
		key: 'joan',
		name: 'Joan Lindquister',
		stands: 'administrator',
		role: 'administrator',
		areas: []
	}
];

/** No secret: it stands on the sign-in page while the demonstration runs, and is worth nothing elsewhere. */
export const DEMO_PASSWORD = 'plates and tags';

/** An address that no mail leaves this machine for. */
export const demoAddress = ({ key }: DemoPerson): string => `${key}@demo.tallyplate.example`;

const recordOf = (person: DemoPerson, password_hash: string, now: Date): UserRecord => ({
	id: `demo-${person.key}`,
	name: person.name,
	email: demoAddress(person),
	email_verified_at: now,
	password_hash,
	role: person.role,
	areas: [...person.areas],
	paused_until: null,
	pause_reason: null,
	consented_to: DATA_LICENSE,
	consented_at: now,
	demo: true,
	version: 1,
	created_at: now,
	deleted_at: null
});

/**
 * Puts the people of the demonstration where they are missing, or have left; what else became of them stays.
 * @throws {DatabaseAwayError}
 */
export async function ensureDemoPeople({ database, clock }: Ground): Promise<void> {
	const password_hash = await hashPassword(DEMO_PASSWORD);
	for (const person of DEMO_PEOPLE) {
		const { id, version: _, ...rest } = recordOf(person, password_hash, clock());
		await inTransaction(database, async (transaction) => {
			if (await users.userById(database, id, transaction)) return;
			if (await users.changeUser(database, id, rest, transaction)) return;
			await users.addUser(database, { ...rest, id, version: 1 }, transaction);
		});
	}
}

/** Somebody of the demonstration, as the sign-in page offers them; null while none runs. */
export const demoPeople = (): readonly (DemoPerson & { readonly address: string })[] | null =>
	config().demo ? DEMO_PEOPLE.map((person) => ({ ...person, address: demoAddress(person) })) : null;
