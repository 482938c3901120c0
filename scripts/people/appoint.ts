/**
 * Makes somebody who has an account an administrator, where there is none yet to do it.
 *   npm run people:appoint -- somebody@example.org
 */
import { machineClock } from '../../src/lib/server/clock';
import { appointAdministrator } from '../../src/lib/server/people';
import { mailAddressSchema } from '../../src/lib/types';
import { runCommand, withDatabase } from '../db/database';

runCommand(async () => {
	const address = mailAddressSchema.safeParse(process.argv[2]);
	if (!address.success) throw new Error('Name the address of an account.');
	await withDatabase((database) =>
		appointAdministrator({ database, clock: machineClock }, address.data)
	);
	console.log(`${address.data} is an administrator from now on.`);
});
