/** The lined layouts of this maker. */
import type { LinedLayout } from '../../engine/lined-layout';
import { buickEngine } from './buick-engine';
import { gmCastingStamp } from './casting';
import { gmAxleStamp } from './axle-stamp';
import { gmBodyPlate1976 } from './body-plate-1976-1980';
import { chevroletEnginePad } from './chevrolet-engine-pad';
import { corvettePlate } from './corvette-plate';
import { gmFisherTag1964, gmFisherTag1965 } from './fisher-tag-1964-1968';
import { gmFisherTag1969 } from './fisher-tag-1969-1975';
import { GEARBOXES } from './gearboxes';
import { gmPartialSerial } from './partial-serial';
import { pontiacEngine } from './pontiac-engine';

export const GM_LINED: readonly LinedLayout[] = [
	chevroletEnginePad,
	pontiacEngine,
	buickEngine,
	gmPartialSerial,
	gmCastingStamp,
	...GEARBOXES,
	gmAxleStamp,
	gmFisherTag1964,
	gmFisherTag1965,
	gmFisherTag1969,
	gmBodyPlate1976,
	corvettePlate
];
