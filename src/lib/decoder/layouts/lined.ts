/** Every lined layout that readings try: body tags, engine stamps, castings. One folder and one list a maker. */
import type { LinedLayout } from '../engine/lined-layout';
import { AMC_LINED } from './amc';
import { CHRYSLER_LINED } from './chrysler';
import { FORD_LINED } from './ford';
import { GM_LINED } from './gm';

export const LINED_LAYOUTS: readonly LinedLayout[] = [
	...GM_LINED,
	...CHRYSLER_LINED,
	...FORD_LINED,
	...AMC_LINED
];
