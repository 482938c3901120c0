import { machineClock, type Clock } from './clock';
import { connect, type Database } from './db';

/** What every subject stands on that keeps something: handed to its functions, so that a test hands in its own. */
export interface Ground {
	readonly database: Database;
	readonly clock: Clock;
}

let laid: Ground | null = null;

/** Opens the pool that the subjects of this process share; connects on the first query. */
export function layGround(databaseUrl: string, clock: Clock = machineClock): Ground {
	laid = { database: connect(databaseUrl), clock };
	return laid;
}

/** What this process stands on. @throws before `layGround` */
export function ground(): Ground {
	if (laid === null) throw new Error('The ground is not laid: the server has not started.');
	return laid;
}

/** Closes the pool. */
export async function clearGround(): Promise<void> {
	const cleared = laid;
	laid = null;
	await cleared?.database.close();
}
