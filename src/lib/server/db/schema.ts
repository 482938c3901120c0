/**
 * Changes of the schema. Apart from `index.ts`, so that a server, which makes none, does not carry what
 * they need.
 */
export { dumpSchema } from './dump';
export { migrateDown, migrateUp, pendingMigrations } from './migrator';
