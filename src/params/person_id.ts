import type { ParamMatcher } from '@sveltejs/kit';

/** The id of a person, as an address carries it. */
export const match: ParamMatcher = (param) => /^(?:[0-9a-f]{32}|demo-[a-z]{1,20})$/.test(param);
