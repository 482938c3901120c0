/** Where stamps, plates and tags sit, by maker and model year. */
import { counted } from './counts';

/** The drawings, and the places that each shows. */
export const VIEW_ZONES = {
	car: ['support', 'engine', 'fender', 'transmission', 'seat', 'frame', 'axle', 'trunk'],
	'engine-front': ['front', 'coil'],
	'engine-side': ['side-left', 'side-right', 'rail', 'starter'],
	'engine-top': ['top', 'rear-right', 'rear', 'rear-left'],
	cowl: ['firewall', 'cowl', 'dash', 'post'],
	door: ['pillar', 'door', 'lock']
} as const;
export type View = keyof typeof VIEW_ZONES;
export type Zone = (typeof VIEW_ZONES)[View][number];
export const VIEWS = Object.keys(VIEW_ZONES) as readonly View[];

export const whereText = {
	title: 'Where the stamps sit',
	intro:
		'Plates, tags and stamps by maker and model year: each place from a row of the tables, with its source.',
	maker: 'Maker',
	year: 'Model year, if known',
	show: 'Show',
	choose: 'Choose a maker',
	anyYear: 'any',
	makers: 'Makers with places in the tables',
	usual: 'The drawing shows what most makers did; their own places come from rows with sources.',

	heading: (maker: string, year: string): string => (year === '' ? maker : `${year} ${maker}`),
	count: (places: number): string => counted(places, 'place', 'places'),
	nothing: (maker: string, year: string): string =>
		`No place is in the tables for ${year === '' ? maker : `${maker} of ${year}`}. That says nothing against a car.`,
	allYears: 'Show all model years',
	drawing: (view: string, marked: readonly string[]): string =>
		`${view}: a drawing. Marked: ${marked.join('; ')}.`,
	numbers: (first: number, last: number): string =>
		first === last ? String(first) : `${first}–${last}`,
	/** Numbers that a further drawing shows. */
	pointer: (numbers: string, view: string): string =>
		`${numbers}, in the drawings further down: ${view}`,
	views: {
		car: {
			heading: 'The car',
			caption: 'From the driver’s side, in the shape of its years and of no particular make.'
		},
		'engine-front': {
			heading: 'Engine, from the front',
			caption: 'Seen from before the car: the passenger’s side is at the left.'
		},
		'engine-side': {
			heading: 'Engine, from the side',
			caption: 'One drawing for both sides, fan to the left: the words say which side.'
		},
		'engine-top': {
			heading: 'Engine, from above',
			caption: 'Fan to the left: the passenger’s side is above.'
		},
		cowl: {
			heading: 'Cowl and windshield',
			caption: 'Over the engine, from the front: the driver’s side is at the right.'
		},
		door: {
			heading: 'Driver’s door, open',
			caption: 'Hinge pillar, end of the door and lock pillar; the front is at the left.'
		}
	} satisfies Record<View, { heading: string; caption: string }>,
	onward: 'In the drawings further down',
	generic: 'Drawings show the kind of place. Where words and drawing differ, the words hold.',
	zones: {
		support: 'Radiator support',
		engine: 'Engine',
		fender: 'Inner fender',
		transmission: 'Transmission',
		seat: 'Under seats and trim',
		frame: 'Frame',
		axle: 'Rear axle',
		trunk: 'Trunk',
		front: 'Pad at the front',
		coil: 'At the coil',
		'side-left': 'Driver’s side',
		'side-right': 'Passenger’s side',
		rail: 'Oil-pan rail',
		starter: 'Above the starter',
		top: 'Heads, deck, intake',
		'rear-right': 'Rear, passenger’s side',
		rear: 'Rear of the block',
		'rear-left': 'Rear, driver’s side',
		firewall: 'Firewall',
		cowl: 'Cowl',
		dash: 'Dash top',
		post: 'Windshield post',
		pillar: 'Hinge pillar',
		door: 'Door',
		lock: 'Lock pillar'
	} satisfies Record<Zone, string>,
	unplaced: 'Without a place in the drawings',
	unplacedNote: 'Their words name no one place that is drawn.',
	law: 'By federal rule',
	lawNote: 'For cars of any maker, under the rules named; years stand in the rows.',
	row: 'Row',
	sources: (more: number): string => (more === 0 ? '' : `and ${more} more`),
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
