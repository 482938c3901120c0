import type { Finding } from '../finding';
import type { Data } from '../read';
import * as candidates from './candidates';
import * as canonical from './canonical';
import * as citations from './citations';
import * as claims from './claims';
import * as codes from './codes';
import * as colors from './colors';
import * as exceptions from './exceptions';
import * as mapping from './mapping';
import * as memory from './memory';
import * as overlap from './overlap';
import * as place from './place';
import * as schema from './schema';
import * as scope from './scope';
import * as services from './services';
import * as sources from './sources';
import * as unique from './unique';
import * as words from './words';
import * as years from './years';

/** One rule of the data folder. */
export interface Check {
	readonly name: string;
	readonly check: (data: Data) => Finding[];
}

/** All rules, in the order in which they are reported: shape first, then sense. */
export const CHECKS: readonly Check[] = [
	schema,
	place,
	unique,
	canonical,
	codes,
	years,
	scope,
	sources,
	citations,
	memory,
	overlap,
	colors,
	claims,
	exceptions,
	mapping,
	candidates,
	services,
	words
];
