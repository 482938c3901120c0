/** Tells the time. Handed in wherever time decides something, so that a test can hand in its own. */
export type Clock = () => Date;

/** The time of this machine. */
export const machineClock: Clock = () => new Date();
