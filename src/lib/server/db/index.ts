export { connect, ping, type ConnectOptions, type Database } from './connection';
export { asking, DatabaseAwayError, isAway } from './errors';
export { inTransaction, type Transaction } from './transaction';
