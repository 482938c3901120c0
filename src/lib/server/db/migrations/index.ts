import type { SchemaStep } from '../migrator';
import { step as editions } from './202612010430-editions';
import { step as editionCounter } from './202612010431-edition-counter';
import { step as editionCounterRow } from './202612010432-edition-counter-row';
import { step as users } from './202612010433-users';
import { step as sources } from './202612010434-sources';
import { step as referenceRows } from './202612010435-reference-rows';
import { step as citations } from './202612010436-citations';
import { step as claims } from './202612010437-claims';
import { step as releaseLoads } from './202612010438-release-loads';
import { step as releaseConflicts } from './202612010439-release-conflicts';
import { step as savedReadings } from './202612010440-saved-readings';
import { step as savedReadingUses } from './202612010441-saved-reading-uses';
import { step as sessions } from './202612010442-sessions';
import { step as outbox } from './202612010443-outbox';
import { step as jobs } from './202612010444-jobs';
import { step as files } from './202612010445-files';
import { step as audit } from './202612010446-audit';
import { step as sharedCounters } from './202612010447-shared-counters';
import { step as outboxLease } from './202612010910-outbox-lease';
import { step as jobsForPeople } from './202612010925-jobs-for-people';
import { step as people } from './202612010931-people';
import { step as sessionsOfPeople } from './202612010932-sessions-of-people';
import { step as accountTokens } from './202612010933-account-tokens';
import { step as secondFactors } from './202612010934-second-factors';
import { step as recoveryCodes } from './202612010935-recovery-codes';
import { step as filesChecked } from './202612010950-files-checked';
import { step as filePieces } from './202612010951-file-pieces';
import { step as notices } from './202612011000-notices';
import { step as noticePreferences } from './202612011001-notice-preferences';

/** Every migration by name, in order. Imported one by one so that they also work inside the server's build. */
export const MIGRATIONS: readonly (readonly [name: string, step: SchemaStep])[] = [
	['202612010430-editions', editions],
	['202612010431-edition-counter', editionCounter],
	['202612010432-edition-counter-row', editionCounterRow],
	['202612010433-users', users],
	['202612010434-sources', sources],
	['202612010435-reference-rows', referenceRows],
	['202612010436-citations', citations],
	['202612010437-claims', claims],
	['202612010438-release-loads', releaseLoads],
	['202612010439-release-conflicts', releaseConflicts],
	['202612010440-saved-readings', savedReadings],
	['202612010441-saved-reading-uses', savedReadingUses],
	['202612010442-sessions', sessions],
	['202612010443-outbox', outbox],
	['202612010444-jobs', jobs],
	['202612010445-files', files],
	['202612010446-audit', audit],
	['202612010447-shared-counters', sharedCounters],
	['202612010910-outbox-lease', outboxLease],
	['202612010925-jobs-for-people', jobsForPeople],
	['202612010931-people', people],
	['202612010932-sessions-of-people', sessionsOfPeople],
	['202612010933-account-tokens', accountTokens],
	['202612010934-second-factors', secondFactors],
	['202612010935-recovery-codes', recoveryCodes],
	['202612010950-files-checked', filesChecked],
	['202612010951-file-pieces', filePieces],
	['202612011000-notices', notices],
	['202612011001-notice-preferences', noticePreferences]
];
