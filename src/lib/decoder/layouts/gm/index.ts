/** The lined layouts of this maker. */
import type { LinedLayout } from '../../engine/lined-layout';
import { gmCastingStamp } from './casting';
import { chevroletEnginePad } from './chevrolet-engine-pad';
import { gmPartialSerial } from './partial-serial';

export const GM_LINED: readonly LinedLayout[] = [
	chevroletEnginePad,
	gmPartialSerial,
	gmCastingStamp
];
