/** A maker is a corporation; a division is the name on the car. */
export const MAKERS = ['gm', 'chrysler', 'ford', 'amc', 'other'] as const;
export type Maker = (typeof MAKERS)[number];

export const MAKER_NAMES: Readonly<Record<Maker, string>> = {
	gm: 'General Motors',
	chrysler: 'Chrysler Corporation',
	ford: 'Ford Motor Company',
	amc: 'American Motors',
	other: 'Other makers'
};

/** Divisions by corporation, in the order in which the pages list them. */
export const DIVISIONS = {
	gm: ['Chevrolet', 'Pontiac', 'Oldsmobile', 'Buick', 'Cadillac', 'GM of Canada'],
	chrysler: ['Plymouth', 'Dodge', 'Chrysler', 'Imperial'],
	ford: ['Ford', 'Mercury', 'Lincoln'],
	amc: ['AMC'],
	other: []
} as const satisfies Record<Maker, readonly string[]>;

export const ALL_DIVISIONS = Object.values(DIVISIONS).flat();
export type Division = (typeof DIVISIONS)[Maker][number];

/** Which corporation a division belongs to. */
export function makerOf(division: string): Maker | undefined {
	return MAKERS.find((maker) => (DIVISIONS[maker] as readonly string[]).includes(division));
}
