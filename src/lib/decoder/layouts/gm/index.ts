/** The lined layouts of this maker. */
import type { LinedLayout } from '../../engine/lined-layout';
import { gmCastingStamp } from './casting';
import { gmBodyPlate1976 } from './body-plate-1976-1980';
import { chevroletEnginePad } from './chevrolet-engine-pad';
import { corvettePlate1965, corvettePlate1973 } from './corvette-plate';
import { gmFisherTag1964, gmFisherTag1965 } from './fisher-tag-1964-1967';
import { gmFisherTag1968, gmFisherTag1969 } from './fisher-tag-1968-1972';
import { gmFisherTag1973 } from './fisher-tag-1973-1975';
import { gmPartialSerial } from './partial-serial';

export const GM_LINED: readonly LinedLayout[] = [
	chevroletEnginePad,
	gmPartialSerial,
	gmCastingStamp,
	gmFisherTag1964,
	gmFisherTag1965,
	gmFisherTag1968,
	gmFisherTag1969,
	gmFisherTag1973,
	gmBodyPlate1976,
	corvettePlate1965,
	corvettePlate1973
];
