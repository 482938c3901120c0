import type { ParamMatcher } from '@sveltejs/kit';
import { MAKERS } from '$lib/types';

/** A corporation's key. */
export const match: ParamMatcher = (param) => (MAKERS as readonly string[]).includes(param);
