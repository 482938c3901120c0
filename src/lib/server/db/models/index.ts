import type { Sequelize } from 'sequelize';
import { defineCitation } from './citation';
import { defineClaim } from './claim';
import { defineEdition } from './edition';
import { defineEditionCounter } from './edition-counter';
import { defineJob } from './job';
import { defineOutboxMail } from './outbox-mail';
import { defineReferenceRow } from './reference-row';
import { defineReleaseConflict } from './release-conflict';
import { defineReleaseLoad } from './release-load';
import { defineSource } from './source';

export type { CitationRecord } from './citation';
export type { ClaimRecord } from './claim';
export type { EditionRecord } from './edition';
export type { JobRecord } from './job';
export type { OutboxMailRecord } from './outbox-mail';
export type { ReferenceRowRecord } from './reference-row';
export type { ReleaseConflictRecord } from './release-conflict';
export type { ReleaseLoadRecord } from './release-load';
export type { SourceRecord } from './source';
export type { Versioned } from './versioned';

/** Models are defined on a connection, so that several databases can be open at once. */
export const defineModels = (sequelize: Sequelize) => ({
	citations: defineCitation(sequelize),
	claims: defineClaim(sequelize),
	editionCounter: defineEditionCounter(sequelize),
	editions: defineEdition(sequelize),
	jobs: defineJob(sequelize),
	outbox: defineOutboxMail(sequelize),
	referenceRows: defineReferenceRow(sequelize),
	releaseConflicts: defineReleaseConflict(sequelize),
	releaseLoads: defineReleaseLoad(sequelize),
	sources: defineSource(sequelize)
});
export type Models = ReturnType<typeof defineModels>;
