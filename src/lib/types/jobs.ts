/**
 * How a piece of background work stands.
 * - `due`: waits for its time or for a worker
 * - `running`: a worker has it
 * - `done`, `failed`: at its end, or given up after several attempts
 * - `stopped`: by whoever it was done for
 */
export const JOB_STATES = ['due', 'running', 'done', 'failed', 'stopped'] as const;
export type JobState = (typeof JOB_STATES)[number];
