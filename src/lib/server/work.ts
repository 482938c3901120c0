/** All that a worker knows how to do, and what it does again and again. */
import { cleanUpKind, EVERY_HOUR, RECORD_CLEANERS } from './clean-up';
import type { JobKind, Repeated } from './jobs';

export const KINDS: readonly JobKind[] = [cleanUpKind(RECORD_CLEANERS)];

export const REPEATED: readonly Repeated[] = [EVERY_HOUR];
