/** The lined layouts of this maker. */
import type { LinedLayout } from '../../engine/lined-layout';
import { chryslerPartialSerial } from './partial-serial';
import { chryslerFenderTag1968 } from './fender-tag-1968';
import { chryslerFenderTag1969 } from './fender-tag-1969-1974';

export const CHRYSLER_LINED: readonly LinedLayout[] = [
	chryslerFenderTag1969,
	chryslerFenderTag1968,
	chryslerPartialSerial
];
