/** The lined layouts of this maker. */
import type { LinedLayout } from '../../engine/lined-layout';
import { amcBodyPlate } from './body-plate';
import { amcEngineNumber } from './engine-number';

export const AMC_LINED: readonly LinedLayout[] = [amcBodyPlate, amcEngineNumber];
