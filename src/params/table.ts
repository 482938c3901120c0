import type { ParamMatcher } from '@sveltejs/kit';
import { TABLE_NAMES } from '$lib/types';

/** The name of a table. */
export const match: ParamMatcher = (param) => (TABLE_NAMES as readonly string[]).includes(param);
