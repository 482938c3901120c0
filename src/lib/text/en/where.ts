/** Where stamps, plates and tags sit, by maker and model year. */
import { counted } from './counts';

/** A place in the drawing of the car. */
export const CAR_ZONES = [
	'support',
	'engine',
	'fender',
	'transmission',
	'firewall',
	'cowl',
	'dash',
	'pillar',
	'door',
	'seat',
	'frame',
	'axle',
	'trunk'
] as const;
export type CarZone = (typeof CAR_ZONES)[number];

/** A place in the drawing of the engine. */
export const ENGINE_ZONES = ['front', 'right', 'left', 'top', 'rear'] as const;
export type EngineZone = (typeof ENGINE_ZONES)[number];

export const whereText = {
	title: 'Where the stamps sit',
	intro:
		'Plates, tags and stamps by maker and model year: each place from a row of the tables, with its source.',
	maker: 'Maker',
	year: 'Model year, if known',
	show: 'Show',
	choose: 'Choose a maker',
	anyYear: 'any',
	usual: 'The usual places of most American makers. Choose a maker for its own, with sources.',

	heading: (maker: string, year: string): string => (year === '' ? maker : `${year} ${maker}`),
	count: (places: number): string => counted(places, 'place', 'places'),
	nothing: (maker: string, year: string): string =>
		`No place is in the tables for ${year === '' ? maker : `${maker} of ${year}`}. That says nothing against a car.`,
	allYears: 'Show all model years',
	drawing: {
		car: (zones: readonly string[]): string =>
			`A car from above, front to the left. Marked: ${zones.join('; ')}.`,
		engine: (zones: readonly string[]): string =>
			`An engine from above, its front to the left, the driver’s side below. Marked: ${zones.join('; ')}.`,
		carCaption: 'From above, front to the left: the driver’s side is below.',
		engineCaption: 'The engine from above, its fan to the left.',
		generic: 'One drawing for all of a maker’s cars: the words beside it decide.'
	},
	zones: {
		support: 'Radiator support',
		engine: 'Engine',
		fender: 'Inner fender',
		transmission: 'Transmission',
		firewall: 'Firewall',
		cowl: 'Cowl',
		dash: 'Dash top, at the windshield',
		pillar: 'Front door pillar',
		door: 'Door and its lock pillar',
		seat: 'Under seats and trim',
		frame: 'Frame',
		axle: 'Rear axle',
		trunk: 'Trunk'
	} satisfies Record<CarZone, string>,
	engineZones: {
		front: 'Engine, front',
		right: 'Engine, passenger’s side',
		left: 'Engine, driver’s side',
		top: 'Engine, heads and intake',
		rear: 'Engine, rear of the block'
	} satisfies Record<EngineZone, string>,
	unplaced: 'Not in the drawing',
	law: 'By federal rule',
	lawNote: 'For cars of any maker, under the rules named; years stand in the rows.',
	row: 'Row and sources',
	help: 'How to read a plate without harm',

	cautions: {
		heading: 'Before you look',
		lines: [
			'Chock the wheels, and never lie under a car that stands on a jack alone: use stands, on firm ground.',
			'Engine cold, key out, battery disconnected before you reach past it or near the fan.',
			'No wire wheel, no grinder, no sandpaper on a pad or plate: that destroys what you came to read.',
			'Never remove an identity plate. Photograph it with its fixings, and ask the state first.'
		]
	},
	limit:
		'A stamp in its usual place proves neither title nor origin, and one elsewhere is no proof of the contrary.'
} as const;
