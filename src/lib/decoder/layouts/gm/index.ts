/** The lined layouts of this maker. */
import type { LinedLayout } from '../../engine/lined-layout';

export const GM_LINED: readonly LinedLayout[] = [];
