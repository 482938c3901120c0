/** Results of a line of the tally, in the order in which rows stand. */
export const RESULTS = ['does_not_tally', 'cannot_be_told', 'tallies', 'not_looked_at'] as const;
export type Result = (typeof RESULTS)[number];
