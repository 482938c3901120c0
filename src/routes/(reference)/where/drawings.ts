/**
 * Our own line drawings of where stamps sit: path data in px of each drawing's own frame, and for every place the spot
 * itself and its number, which stands aside so that it covers nothing.
 */
import type { View, Zone } from '$lib/text/en/where';

type Point = readonly [x: number, y: number];
export interface Mark {
	readonly spot: Point;
	readonly number: Point;
	/** The pad, plate or tag itself, filled; only where a row speaks of it. Empty for none. */
	readonly face: string;
}
export interface Drawing {
	readonly width: number;
	readonly height: number;
	/** Where the paths lie in the frame, and how large. */
	readonly place?: string;
	/** The outer edge, drawn heaviest; edges that are seen; edges that lie behind others, in broken lines. */
	readonly outline: string;
	readonly seen: string;
	readonly hidden: string;
	readonly marks: Readonly<Partial<Record<Zone, Mark>>>;
}

/** Three shapes of car, each of no particular make. */
export type Era = 'early' | 'middle' | 'late';

const circle = (x: number, y: number, r: number): string =>
	`M${x - r} ${y}a${r} ${r} 0 1 0 ${2 * r} 0a${r} ${r} 0 1 0 ${-2 * r} 0`;
const mark = (spot: Point, number: Point, face = ''): Mark => ({ spot, number, face });

/** The shape of the years until 1964, until 1973 and after; the one between where the year is not known. */
export function eraOf(year: number | undefined): Era {
	if (year === undefined) return 'middle';
	if (year <= 1964) return 'early';
	return year <= 1973 ? 'middle' : 'late';
}

/** Wheels, sills and what lies under the skin are where they were in all three. */
const UNDER = 'H474A38 38 0 0 0 398 158H168A38 38 0 0 0 92 158H46Z';
const WHEELS = [130, 436].map((x) => `${circle(x, 156, 29)}${circle(x, 156, 15)}`).join('');
const BODIES: Readonly<Record<Era, { readonly outline: string; readonly seen: string }>> = {
	early: {
		outline: `M46 158L34 150L30 120C30 110 36 106 48 104C96 98 152 96 196 96L192 86L214 54C256 44 334 44 364 56L392 88C436 84 492 78 546 70L540 104L546 150L532 158${UNDER}`,
		seen: 'M206 94L224 62C260 54 326 54 352 62L374 90ZM292 56V92M52 118C140 108 300 116 536 92M204 98C200 118 202 142 206 158M310 94V158M290 112H304M30 134H62M508 134H544'
	},
	middle: {
		outline: `M46 158L36 150L30 124C31 114 36 110 44 108C92 100 152 97 198 97L240 62C270 54 322 54 348 62L404 93C448 90 494 94 530 102C537 110 538 128 534 150L526 158${UNDER}`,
		seen: 'M216 96L246 68C272 61 316 61 342 68L386 94ZM46 122C124 110 236 124 330 116C402 104 470 106 528 116M212 98C207 118 208 142 214 158M318 96C320 118 320 140 318 158M296 110H310M34 136H62M500 136H535'
	},
	late: {
		outline: `M46 158L40 150V106L48 101H200L242 64C268 58 334 58 352 64L384 98H520L530 106V150L522 158${UNDER}`,
		seen: 'M216 99L248 70C266 66 310 66 314 66V99ZM326 68L346 70L364 97H326ZM44 118H528M212 101C208 120 209 142 214 158M320 100V158M298 112H312M24 126H40V142H24ZM530 126H546V142H530ZM60 104V126'
	}
};
/** Engine, gearbox, shaft, axle, frame rail, seat and radiator, behind the skin. */
const WITHIN = `M100 106H178V146H100ZM178 116L200 126H246V146H178M246 138L420 154${circle(436, 156, 10)}M62 166H106M160 166H400M74 108V150M262 150L268 112M262 150H304`;

const [LEFT, TOP, SCALE] = [4, 26, 0.68];
/** A spot of the car, given in px of its paths. */
const onCar = (x: number, y: number, number: Point): Mark =>
	mark([LEFT + x * SCALE, TOP + y * SCALE], number);
/** Numbers stand in two rows, wide enough apart for a finger on the phone. */
const [ABOVE, BELOW] = [24, 190];

/** The car from the driver's side, front to the left, in the shape of an era. */
export function carDrawing(era: Era): Drawing {
	const { outline, seen } = BODIES[era];
	return {
		width: 400,
		height: 214,
		place: `translate(${LEFT} ${TOP}) scale(${SCALE})`,
		outline,
		seen: `${seen}${WHEELS}M8 185H568`,
		hidden: WITHIN,
		marks: {
			support: onCar(74, 112, [26, ABOVE]),
			engine: onCar(126, 118, [76, ABOVE]),
			fender: onCar(152, 104, [126, ABOVE]),
			transmission: onCar(222, 136, [166, BELOW]),
			seat: onCar(276, 132, [230, ABOVE]),
			frame: onCar(300, 166, [218, BELOW]),
			axle: onCar(436, 156, [284, BELOW]),
			trunk: onCar(486, 110, [346, ABOVE])
		}
	};
}
/** Where the car's drawing points to those of engine, cowl and door. */
export const POINTERS: Readonly<Record<'engine' | 'cowl' | 'door', Mark>> = {
	engine: onCar(156, 134, [100, BELOW]),
	cowl: onCar(206, 97, [178, ABOVE]),
	door: onCar(316, 128, [284, ABOVE])
};

const engineFront: Drawing = {
	width: 400,
	height: 272,
	outline:
		'M152 224L140 168L96 122L140 84L186 130H214L260 84L304 122L260 168L248 224ZM96 122L74 98L118 60L140 84ZM304 122L326 98L282 60L260 84Z',
	seen: `M74 98L58 82C70 62 84 50 102 44L118 60M326 98L342 82C330 62 316 50 298 44L282 60M140 84L160 68H240L260 84M172 68V46H228V68M126 46V26H274V46ZM166 146H234L242 224H158ZM148 224H252L240 256H160Z${circle(200, 206, 26)}${circle(200, 206, 7)}${circle(200, 150, 19)}${circle(200, 150, 6)}M276 112L292 126M124 112L108 126`,
	hidden: `${circle(200, 150, 62)}`,
	marks: {
		front: mark([132, 98], [42, 146], 'M118 102L138 85L147 94L127 112Z'),
		coil: mark([252, 83], [358, 146], 'M246 76L258 74V92H246Z')
	}
};
const engineSide: Drawing = {
	width: 400,
	height: 252,
	outline: 'M96 110H304V182H96ZM88 76H302V110H88ZM304 100L346 82V202L304 194Z',
	seen: `M88 76L98 52H290L302 76M96 118H80V176H96M72 140H80M104 182H312L304 194H246L236 226H142L124 194H104ZM164 52V36H236V52M138 36V20H262V36Z${[146, 200, 254].map((x) => circle(x, 148, 9)).join('')}${[116, 164, 212, 260].map((x) => `M${x} 84H${x + 22}V102H${x}Z`).join('')}M250 186H330V204H250Z`,
	hidden: 'M62 84V196M70 92V188',
	marks: {
		'side-left': mark([112, 116], [30, 60], 'M100 110H124V122H100Z'),
		'side-right': mark([200, 125], [30, 112], 'M184 118H216V132H184Z'),
		starter: mark([296, 166], [374, 128]),
		rail: mark([277, 178], [330, 232], 'M262 174H292V182H262Z')
	}
};
const engineTop: Drawing = {
	width: 400,
	height: 236,
	outline: 'M78 66H318V170H78ZM318 54L336 48V188L318 182Z',
	seen: `M92 36H306V70H92ZM92 166H306V200H92ZM78 78L62 88V148L78 158M62 118H44M336 64L366 88V148L336 172M110 78H294V158H110Z${circle(200, 118, 38)}${circle(200, 118, 6)}`,
	hidden: 'M44 62V174M126 78V158M158 70V166M242 70V166M276 78V158',
	marks: {
		top: mark([262, 92], [262, 18]),
		'rear-right': mark([327, 71], [372, 40], 'M320 62H334V80H320Z'),
		rear: mark([327, 118], [386, 118], 'M320 110H334V126H320Z'),
		'rear-left': mark([327, 165], [372, 200], 'M320 156H334V174H320Z')
	}
};
/** From over the engine, so that the driver's side is at the right. */
const cowl: Drawing = {
	width: 400,
	height: 272,
	outline:
		'M52 34C140 22 260 22 348 34L380 118C270 106 130 106 20 118ZM20 124C130 112 270 112 380 124L364 160H36ZM44 160H356V244H250C240 222 160 222 150 244H44Z',
	seen: `M64 46C146 35 254 35 336 46M88 128H176M224 128H312M84 136H172M228 136H316M136 118L208 96M262 116L330 88${circle(300, 200, 23)}${circle(300, 200, 9)}M78 178H150V226H78ZM90 190H138V214H90ZM226 176H250V190H226Z`,
	hidden: 'M32 100C130 88 270 88 368 100M250 94C252 62 318 60 330 96M286 74V92',
	marks: {
		post: mark([362, 72], [380, 32]),
		dash: mark([338, 103], [300, 52], 'M322 98L352 101L354 108L322 105Z'),
		cowl: mark([200, 146], [96, 84], 'M180 140H220V152H180Z'),
		firewall: mark([193, 181], [200, 262], 'M174 174H212V188H174Z')
	}
};
/** The driver's door open, seen from outside: front to the left. */
const door: Drawing = {
	width: 400,
	height: 272,
	outline:
		'M170 84L204 30H326L340 84V236H170ZM152 84H170V236H152ZM170 84L54 70V254L152 232M54 70L34 66V252L54 254',
	seen: 'M322 34V228H182V88L210 40H322M346 30L372 96V228H340M152 108H166V124H152ZM152 192H166V208H152ZM54 70L70 20L156 54L170 84M66 72L78 34L148 60L158 80M72 154L136 150V164L72 172ZM84 118L108 116V124L84 126ZM38 144H50V164H38ZM324 140H336V156H324ZM204 226C204 190 212 178 236 176L250 118C256 108 280 108 282 120V226',
	hidden: 'M182 104C196 104 206 110 212 122',
	marks: {
		pillar: mark([161, 151], [216, 66], 'M155 136H167V166H155Z'),
		door: mark([44, 108], [20, 40], 'M37 90H51V126H37Z'),
		lock: mark([331, 111], [384, 66], 'M325 96H337V126H325Z')
	}
};

/** The drawing of a view; only the car's differs by era. */
export const drawingOf = (view: View, era: Era): Drawing =>
	view === 'car'
		? carDrawing(era)
		: {
				'engine-front': engineFront,
				'engine-side': engineSide,
				'engine-top': engineTop,
				cowl,
				door
			}[view];
