/**
 * Goes through the audit trail and makes every hash anew; exits 1 when an entry is not what it was.
 *   npm run audit:verify                    prints number and hash of the last entry: note it elsewhere
 *   npm run audit:verify -- 120:5f0c…       an entry noted earlier has to stand as it was
 */
import { verifyChain } from '../../src/lib/server/audit';
import { runCommand, withDatabase } from '../db/database';

const REASONS = {
	changed: 'was changed',
	missing: 'is missing',
	not_after: 'does not follow the one before it',
	not_as_noted: 'is not the one that was noted'
} as const;

function notedOf(argument: string | undefined) {
	if (argument === undefined) return undefined;
	const [, number, hash] = /^(\d{1,9}):([0-9a-f]{64})$/.exec(argument) ?? [];
	if (number === undefined || hash === undefined)
		throw new Error(`What was noted is a number, a colon and 64 figures, not "${argument}".`);
	return { number: Number(number), hash };
}

runCommand(async () => {
	const noted = notedOf(process.argv[2]);
	const verdict = await withDatabase((database) => verifyChain(database, noted));
	if (!verdict.holds)
		throw new Error(`The audit trail is broken: entry ${verdict.number} ${REASONS[verdict.why]}.`);
	console.log(`The audit trail holds: ${verdict.entries} entries`);
	if (verdict.entries > 0) console.log(`${verdict.entries}:${verdict.last}`);
});
