export * as claims from './claims';
export * as editions from './editions';
export * as jobs from './jobs';
export * as outbox from './outbox';
export * as referenceRows from './reference-rows';
export * as releases from './releases';
export * as sources from './sources';
export type { RowEntry, RowVersion } from './reference-rows';
export type { ReleaseConflict } from './releases';
