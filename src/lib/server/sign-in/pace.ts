import type { RequestEvent } from '@sveltejs/kit';
import { config } from '../config';
import { TokenBuckets } from '../http';

const ENTRY_PAGES = '/(entry)/';
let buckets: TokenBuckets | undefined;

/**
 * Seconds that a network address has to wait before the next form of the ways in; 0 when it need not. Asked before
 * anything is looked at and without the database, so that a flood of attempts costs those who read nothing: what
 * is guessed slowly is counted by the shared limits.
 */
export function waitBeforeEntry({
	route,
	getClientAddress
}: Pick<RequestEvent, 'route' | 'getClientAddress'>): number {
	if (!route.id?.startsWith(ENTRY_PAGES)) return 0;
	buckets ??= new TokenBuckets(config().entriesPerMinute);
	return buckets.take(getClientAddress());
}
