import type { ParamMatcher } from '@sveltejs/kit';

/** The key of a row. */
export const match: ParamMatcher = (param) =>
	param.length <= 80 && /^[a-z]+\.[a-z_]+\.[a-z0-9-]+\.[0-9]+$/.test(param);
