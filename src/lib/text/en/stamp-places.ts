/** What is struck or fixed in a place, and where that usually is. */
export interface StampPlace {
	/** The spot in the drawing. */
	readonly spot:
		| 'dash'
		| 'pillar'
		| 'door'
		| 'lock'
		| 'firewall'
		| 'cowl'
		| 'fender'
		| 'support'
		| 'pad-front'
		| 'pad-side'
		| 'coil'
		| 'transmission'
		| 'axle-tube'
		| 'axle-nut';
	readonly name: string;
	readonly where: string;
	/** Model years; left out where it holds throughout. */
	readonly years?: readonly [from: number, to: number];
}

const transmission: StampPlace = {
	spot: 'transmission',
	name: 'Transmission',
	where: 'case: partial serial from 1968, date'
};
const engineFront: StampPlace = {
	spot: 'pad-front',
	name: 'Engine pad',
	where: 'front of the block: unit code, date'
};

/** The usual places by maker: a first orientation, not the tables. */
export const stampPlaceText = {
	heading: 'Where the stamps sit',
	note: 'Usual places; they differ by line and year.',
	follow: 'Choose maker and year and the drawing follows.',
	front: 'front',
	drawing: (maker: string) => `Plan of a car, front to the left, with the usual places: ${maker}.`,
	makers: {
		any: 'most American makers',
		gm: 'General Motors',
		chrysler: 'Chrysler Corporation',
		ford: 'Ford Motor Company'
	} as Readonly<Record<string, string>>,
	places: {
		any: [
			{ spot: 'support', name: 'Radiator support', where: 'partial serial, some makers' },
			engineFront,
			{ ...transmission },
			{ spot: 'axle-tube', name: 'Axle', where: 'tube or tag: code, date' },
			{ spot: 'firewall', name: 'Body tag', where: 'cowl, firewall or inner fender' },
			{ spot: 'dash', name: 'Serial plate', where: 'from 1968: dash top, through the glass' },
			{ spot: 'pillar', name: 'Serial plate', where: 'to 1967: door or its pillar' }
		],
		gm: [
			engineFront,
			transmission,
			{ spot: 'axle-tube', name: 'Axle', where: 'front of the right tube: code, date' },
			{ spot: 'firewall', name: 'Body tag', where: 'firewall, upright', years: [1955, 1967] },
			{ spot: 'cowl', name: 'Body tag', where: 'cowl, under the hood', years: [1968, 1980] },
			{
				spot: 'pillar',
				name: 'Serial plate',
				where: 'front door pillar, door open',
				years: [1955, 1967]
			},
			{
				spot: 'dash',
				name: 'Serial plate',
				where: 'dash top, through the glass',
				years: [1968, 1980]
			}
		],
		chrysler: [
			{
				spot: 'support',
				name: 'Radiator support',
				where: 'partial serial',
				years: [1968, 1980]
			},
			{ spot: 'pad-side', name: 'Engine pad', where: 'right side of the block: partial serial' },
			{ ...transmission, where: 'pad: partial serial from 1968' },
			{ spot: 'fender', name: 'Body tag', where: 'inner fender, driver’s side' },
			{
				spot: 'pillar',
				name: 'Serial plate',
				where: 'hinge pillar, door open',
				years: [1955, 1967]
			},
			{
				spot: 'dash',
				name: 'Serial plate',
				where: 'dash top, through the glass',
				years: [1968, 1980]
			}
		],
		ford: [
			{ spot: 'coil', name: 'Engine tag', where: 'under the coil bracket bolt' },
			transmission,
			{ spot: 'axle-nut', name: 'Axle tag', where: 'under a nut of the carrier: code, date' },
			{
				spot: 'pillar',
				name: 'Data plate',
				where: 'hinge pillar, door open',
				years: [1960, 1963]
			},
			{
				spot: 'door',
				name: 'Data plate',
				where: 'edge of the door, by the lock',
				years: [1964, 1973]
			},
			{ spot: 'lock', name: 'Label', where: 'lock pillar of the body', years: [1974, 1980] },
			{
				spot: 'dash',
				name: 'Serial tab',
				where: 'cowl top, through the glass',
				years: [1968, 1980]
			}
		]
	}
} as const satisfies {
	places: Record<string, readonly StampPlace[]>;
	[word: string]: unknown;
};
