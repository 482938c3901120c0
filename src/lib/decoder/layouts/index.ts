/** Every layout that readings try, and nothing else: adding one here adds it to the product. */
import { prepare, type PreparedLayout } from '../engine/plan';
import type { Layout } from '../engine/layout';
import { amc1968, amc1974 } from './amc-1968-1979';
import { amc1980 } from './amc-1980';
import { chrysler1966 } from './chrysler-1966-1980';
import { ford1960 } from './ford-1960-1980';
import { gm1965 } from './gm-1965-1971';
import { gm1972 } from './gm-1972-1980';
import { gmChevrolet1964 } from './gm-chevrolet-1964';
import { iso17, iso17FewVehicles } from './iso-17';

export const LAYOUTS: readonly Layout[] = [
	gm1965,
	gm1972,
	gmChevrolet1964,
	chrysler1966,
	ford1960,
	amc1968,
	amc1974,
	amc1980,
	iso17,
	iso17FewVehicles
];

export const PREPARED: readonly PreparedLayout[] = LAYOUTS.map(prepare);
