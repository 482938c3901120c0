import type { StampPlace } from '../../text/en/stamp-places';
import { yearSpan } from '../../format/years';

/** Where a spot lies in the plan, px from the car's upper left; the driver's side is below. */
const SPOTS: Readonly<Record<StampPlace['spot'], readonly [x: number, y: number]>> = {
	support: [64, 60],
	'pad-front': [96, 74],
	'pad-side': [142, 68],
	coil: [104, 92],
	transmission: [206, 88],
	'axle-tube': [418, 62],
	'axle-nut': [404, 92],
	fender: [92, 166],
	firewall: [186, 142],
	cowl: [192, 146],
	dash: [214, 146],
	pillar: [204, 180],
	door: [312, 184],
	lock: [326, 180]
};
const PLATES: readonly StampPlace['spot'][] = [
	'fender',
	'firewall',
	'cowl',
	'dash',
	'pillar',
	'door',
	'lock'
];
const WIDTH = 560;
const CAR = 200;
const LINE = 17;
/** Longest line of a label, characters. */
const CHARACTERS = 21;

export interface PlanLabel {
	readonly number: number;
	readonly name: string;
	readonly where: string;
	readonly lines: readonly string[];
	readonly plate: boolean;
	readonly x: number;
	readonly y: number;
	readonly leader: string;
	readonly textX: number;
	readonly textY: number;
	readonly numberX: number;
	readonly numberY: number;
}
export interface Plan {
	readonly height: number;
	/** How far down the car begins. */
	readonly carTop: number;
	readonly items: readonly PlanLabel[];
}

function wrapped(text: string): string[] {
	const lines: string[] = [];
	for (const word of text.split(' ')) {
		const last = lines.at(-1);
		if (last !== undefined && last.length + word.length < CHARACTERS)
			lines[lines.length - 1] = `${last} ${word}`;
		else lines.push(word);
	}
	return lines;
}

/** Left edges of labels: under or over their spots where there is room, else side by side. */
function places(wanted: readonly number[]): number[] {
	const step = Math.min(148, WIDTH / wanted.length);
	const left = wanted.map((x) => Math.max(0, x - 40));
	for (let i = 1; i < left.length; i += 1) left[i] = Math.max(left[i]!, left[i - 1]! + step);
	for (let i = left.length - 1; i >= 0; i -= 1)
		left[i] = Math.min(left[i]!, (left[i + 1] ?? WIDTH) - step);
	return left.map(Math.round);
}

type Point = readonly [x: number, y: number];
const side = (a: Point, b: Point, c: Point): number =>
	Math.sign((b[0] - a[0]) * (c[1] - a[1]) - (b[1] - a[1]) * (c[0] - a[0]));
const cross = (a: Point, b: Point, c: Point, d: Point): boolean =>
	side(a, b, c) !== side(a, b, d) && side(c, d, a) !== side(c, d, b);

/** Swaps neighbors whose leaders would cross. `turn` is where leaders bend, px in the car's own measure. */
function uncrossed<Spot extends { readonly x: number; readonly y: number }>(
	spots: readonly Spot[],
	turn: number
): Spot[] {
	const order = [...spots];
	const left = places(order.map(({ x }) => x));
	for (let pass = 0; pass < order.length; pass += 1)
		for (let i = 1; i < order.length; i += 1) {
			const [a, b] = [order[i - 1]!, order[i]!];
			if (cross([a.x, a.y], [left[i - 1]!, turn], [b.x, b.y], [left[i]!, turn]))
				[order[i - 1], order[i]] = [b, a];
		}
	return order;
}

/** The drawing's labels for the places that hold in a year; all of them, with their years, when none is given. */
export function planLabels(all: readonly StampPlace[], year: number | null): Plan {
	const holding = all.filter(
		({ years }) => years === undefined || year === null || (year >= years[0] && year <= years[1])
	);
	const described = holding.map((place) => {
		const [x, y] = SPOTS[place.spot];
		const where =
			place.years === undefined || year !== null
				? place.where
				: `${place.where}, ${yearSpan(...place.years)}`;
		return { place, x, y, where, lines: [place.name, ...wrapped(where)] };
	});
	const byX = (below: boolean) =>
		described.filter(({ y }) => y > CAR / 2 === below).sort((a, b) => a.x - b.x);
	const over = uncrossed(byX(false), -16);
	const under = uncrossed(byX(true), CAR + 14);
	const tall = (side: typeof over): number => Math.max(0, ...side.map(({ lines }) => lines.length));
	const carTop = tall(over) * LINE + 40;
	const bottom = carTop + CAR + 40;
	const overX = places(over.map(({ x }) => x));
	const underX = places(under.map(({ x }) => x));
	const item = (
		{ place, x, y, where, lines }: (typeof described)[number],
		textX: number,
		number: number,
		below: boolean
	): PlanLabel => {
		const spotY = carTop + y;
		const from = below ? bottom - 14 : carTop - 30;
		const turn = below ? bottom - 26 : carTop - 16;
		return {
			number,
			name: place.name,
			where,
			lines,
			plate: PLATES.includes(place.spot),
			x,
			y: spotY,
			leader: `M${textX + 6.5} ${from}V${turn}L${x} ${spotY}`,
			textX,
			textY: below ? bottom : carTop - 36 - (lines.length - 1) * LINE,
			numberX: textX,
			numberY: below ? bottom + 8 : carTop - 36
		};
	};
	return {
		height: bottom + tall(under) * LINE,
		carTop,
		items: [
			...over.map((own, index) => item(own, overX[index]!, index + 1, false)),
			...under.map((own, index) => item(own, underX[index]!, over.length + index + 1, true))
		]
	};
}
