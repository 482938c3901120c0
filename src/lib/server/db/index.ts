export { connect, ping, type ConnectOptions, type Database } from './connection';
export { dumpSchema } from './dump';
export { asking, DatabaseAwayError, isAway } from './errors';
export { migrateDown, migrateUp, pendingMigrations } from './migrator';
export { inTransaction, type Transaction } from './transaction';
