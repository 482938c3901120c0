import type { Sequelize } from 'sequelize';
import { defineAccountToken } from './account-token';
import { defineAuditEntry } from './audit-entry';
import { defineCitation } from './citation';
import { defineClaim } from './claim';
import { defineEdition } from './edition';
import { defineEditionCounter } from './edition-counter';
import { defineFile, defineFilePiece } from './file';
import { defineJob } from './job';
import { defineNotice, defineNoticePreference } from './notice';
import { defineOutboxMail } from './outbox-mail';
import { defineRecoveryCode } from './recovery-code';
import { defineReferenceRow } from './reference-row';
import { defineReleaseConflict } from './release-conflict';
import { defineReleaseLoad } from './release-load';
import { defineSecondFactor } from './second-factor';
import { defineSession } from './session';
import { defineSharedCounter } from './shared-counter';
import { defineSource } from './source';
import { defineUser } from './user';

export type { AccountTokenRecord } from './account-token';
export type { AuditDetail, AuditRecord } from './audit-entry';
export type { CitationRecord } from './citation';
export type { ClaimRecord } from './claim';
export type { EditionRecord } from './edition';
export type { FilePieceRecord, FileRecord } from './file';
export type { JobRecord } from './job';
export type { NoticePreferenceRecord, NoticeRecord } from './notice';
export type { OutboxMailRecord } from './outbox-mail';
export type { RecoveryCodeRecord } from './recovery-code';
export type { ReferenceRowRecord } from './reference-row';
export type { ReleaseConflictRecord } from './release-conflict';
export type { ReleaseLoadRecord } from './release-load';
export type { SecondFactorRecord } from './second-factor';
export type { SessionRecord } from './session';
export type { SharedCounterRecord } from './shared-counter';
export type { SourceRecord } from './source';
export type { UserRecord } from './user';
export type { Versioned } from './versioned';

/** Models are defined on a connection, so that several databases can be open at once. */
export const defineModels = (sequelize: Sequelize) => ({
	accountTokens: defineAccountToken(sequelize),
	audit: defineAuditEntry(sequelize),
	citations: defineCitation(sequelize),
	claims: defineClaim(sequelize),
	editionCounter: defineEditionCounter(sequelize),
	editions: defineEdition(sequelize),
	filePieces: defineFilePiece(sequelize),
	files: defineFile(sequelize),
	jobs: defineJob(sequelize),
	noticePreferences: defineNoticePreference(sequelize),
	notices: defineNotice(sequelize),
	outbox: defineOutboxMail(sequelize),
	recoveryCodes: defineRecoveryCode(sequelize),
	referenceRows: defineReferenceRow(sequelize),
	releaseConflicts: defineReleaseConflict(sequelize),
	releaseLoads: defineReleaseLoad(sequelize),
	secondFactors: defineSecondFactor(sequelize),
	sessions: defineSession(sequelize),
	sharedCounters: defineSharedCounter(sequelize),
	sources: defineSource(sequelize),
	users: defineUser(sequelize)
});
export type Models = ReturnType<typeof defineModels>;
