/** The lined layouts of this maker. */
import type { LinedLayout } from '../../engine/lined-layout';

export const AMC_LINED: readonly LinedLayout[] = [];
