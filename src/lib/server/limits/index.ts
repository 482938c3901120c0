/** Limits that hold across processes and nodes: how often something may be tried in a while. */
export { COUNTER_CLEANERS, giveBack, take, TooOftenError, type Limit } from './take';
