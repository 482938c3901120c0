/** The lined layouts of this maker. */
import type { LinedLayout } from '../../engine/lined-layout';
import { chryslerCastingStamp } from './casting';
import { chryslerEnginePad } from './engine-pad';
import { chryslerEnginePadFigure } from './engine-pad-figure';
import { chryslerEngineSerial } from './engine-serial';
import { chryslerFenderTag1967, chryslerFenderTag1968 } from './fender-tag-1967-1968';
import { chryslerFenderTag1969 } from './fender-tag-1969-1974';
import { chryslerPartialSerial } from './partial-serial';
import { chryslerAutomaticStamp, chryslerFourSpeedStamp } from './transmission-stamps';

export const CHRYSLER_LINED: readonly LinedLayout[] = [
	chryslerFenderTag1969,
	chryslerFenderTag1968,
	chryslerFenderTag1967,
	chryslerEnginePad,
	chryslerEnginePadFigure,
	chryslerEngineSerial,
	chryslerPartialSerial,
	chryslerCastingStamp,
	chryslerAutomaticStamp,
	chryslerFourSpeedStamp
];
