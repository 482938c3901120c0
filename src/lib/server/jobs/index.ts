/** Background work: queued in the transaction that causes it, done by a worker, seen and stopped by its owner. */
export {
	HopelessJobError,
	JobBrokenOffError,
	NotNowError,
	UnknownJobError,
	type JobKind,
	type JobRun,
	type Progress
} from './kinds';
export { stopWork, workFor, type WorkInHand } from './mine';
export { queueJob, type Work } from './queue';
export { queueRepeated, type Repeated } from './repeated';
export { runNext, type Done, type Working } from './run';
