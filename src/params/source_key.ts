import type { ParamMatcher } from '@sveltejs/kit';

/** The key of a source. */
export const match: ParamMatcher = (param) =>
	param.length <= 80 && /^[a-z0-9][a-z0-9-]*$/.test(param);
