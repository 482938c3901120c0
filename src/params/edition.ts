import type { ParamMatcher } from '@sveltejs/kit';

/** The number of an edition. */
export const match: ParamMatcher = (param) => /^[1-9]\d{0,8}$/.test(param);
