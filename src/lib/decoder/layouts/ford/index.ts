/** The lined layouts of this maker. */
import type { LinedLayout } from '../../engine/lined-layout';
import { fordAxleTagStamp } from './axle-tag';
import { fordEngineTagStamp } from './engine-tag';
import { fordLabel1970 } from './label-1970-1980';
import { fordLabel1977 } from './label-1977-1978';
import { fordPartialSerial } from './partial-serial';
import { fordCastingNumber, fordPartNumber } from './part-number';
import { fordPlate1960, fordPlate1962 } from './plate-1960-1969';
import { fordTransmissionTag } from './transmission-tag';

export const FORD_LINED: readonly LinedLayout[] = [
	fordPlate1960,
	fordPlate1962,
	fordLabel1970,
	fordLabel1977,
	fordEngineTagStamp,
	fordPartialSerial,
	fordPartNumber,
	fordCastingNumber,
	fordAxleTagStamp,
	fordTransmissionTag
];
