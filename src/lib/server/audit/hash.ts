import { createHash } from 'node:crypto';
import type { AuditRecord } from '../db/repositories';

/** What the first entry comes after. */
export const GENESIS = '0'.repeat(64);

/** A value as JSON in one form only: keys in order. */
function canonical(value: unknown): string {
	if (Array.isArray(value)) return `[${value.map(canonical).join(',')}]`;
	if (typeof value !== 'object' || value === null) return JSON.stringify(value);
	const entries = Object.entries(value).sort(([a], [b]) => (a < b ? -1 : a > b ? 1 : 0));
	return `{${entries.map(([key, one]) => `${JSON.stringify(key)}:${canonical(one)}`).join(',')}}`;
}

/** The hash of an entry: SHA-256 over all of it, the hash of the one before included. */
export const hashOf = (entry: Omit<AuditRecord, 'hash'>): string =>
	createHash('sha256')
		.update(
			canonical([
				entry.number,
				entry.hash_before,
				entry.actor,
				entry.action,
				entry.subject_kind,
				entry.subject_id,
				entry.detail,
				entry.at.toISOString()
			])
		)
		.digest('hex');
