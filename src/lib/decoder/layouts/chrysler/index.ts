/** The lined layouts of this maker. */
import type { LinedLayout } from '../../engine/lined-layout';

export const CHRYSLER_LINED: readonly LinedLayout[] = [];
