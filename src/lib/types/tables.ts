/**
 * Every kind of row. `match` says how a code is held against the rows:
 * - `exact`: the code as it stands;
 * - `range`: the row's code is `AA-AH` in the order A-Z without I, O, Q, then 1-9, 0 (ISO 3780);
 * - `none`: rows are found by scope alone (first sequence numbers, places, notes).
 */
export type TableMatch = 'exact' | 'range' | 'none';

export interface TableDefinition {
	readonly label: string;
	/** One sentence for the head of the table's page. */
	readonly about: string;
	readonly match: TableMatch;
	/** `code` tables are looked up by a stamp; `knowledge` tables are read, shown and used by the tally. */
	readonly sort: 'code' | 'knowledge';
}

const code = (label: string, about: string, match: TableMatch = 'exact'): TableDefinition => ({
	label,
	about,
	match,
	sort: 'code'
});
const knowledge = (label: string, about: string): TableDefinition => ({
	label,
	about,
	match: 'none',
	sort: 'knowledge'
});

export const TABLES = {
	layout: code('Layouts', 'Which characters of a stamp mean what; the code is the layout’s id.'),
	wmi: code('Manufacturer identifiers', 'The first three characters of a 17-character number.'),
	country: code('Countries', 'The first two characters of a 17-character number.', 'range'),
	division: code('Divisions', 'The character that names the division.'),
	line: code('Car lines', 'The character that names the car line.'),
	series: code('Series', 'The series of the serial number.'),
	price_class: code('Price classes', 'The price class of the serial number.'),
	body_style: code('Body styles', 'The body style of the serial number.'),
	body_serial: code('Body serials', 'The two figures that name line, series and body.'),
	cylinder_group: code('Cylinder groups', 'The character that tells six from eight cylinders.'),
	engine: code('Engine codes', 'The engine character of the serial number.'),
	model_year: code('Model years', 'The character that stands for the model year.'),
	assembly_plant: code('Assembly plants', 'The character that names the assembly plant.'),
	restraint: code('Restraint systems', 'The restraint character of a 17-character number.'),
	serial_transmission: code(
		'Transmissions in the serial',
		'The transmission character of a serial.'
	),
	sequence: {
		label: 'Sequence numbers',
		about: 'First and last sequence numbers by division, line, plant and year.',
		match: 'none',
		sort: 'code'
	},
	plant_abbreviation: code('Plant abbreviations', 'Plant abbreviations of body tags.'),
	style_number: code('Style numbers', 'Fisher and body style numbers of body tags.'),
	body_code: code('Body codes', 'Body codes of data plates and labels.'),
	tag_field: code('Fields of tags', 'What each line and field of a body tag holds.'),
	paint: code('Paint', 'Paint codes of body tags, plates and labels.'),
	paint_supplier: code('Paint suppliers’ numbers', 'Numbers of paint makers for a factory color.'),
	stripe: code('Stripes', 'Stripe codes.'),
	roof: code('Tops and roofs', 'Vinyl roof and convertible top codes.'),
	trim: code('Trim', 'Trim codes of body tags, plates and labels.'),
	option: code('Options', 'Option, group and package codes.'),
	axle: code('Axles', 'Axle codes.'),
	transmission: code('Transmissions', 'Transmission codes, tags and stamps.'),
	sales_district: code('Sales districts', 'District and special-order codes.'),
	order_number: code('Order numbers', 'What the order number’s characters say.'),
	unit_code: code('Engine unit codes', 'Suffix and unit codes stamped on the engine.'),
	engine_plant: code('Engine plants', 'The plant letter of an engine stamp.'),
	casting_number: code('Casting numbers', 'Numbers cast into blocks, heads, manifolds and cases.'),
	part_number: code('Part numbers', 'What the parts of a part number mean.'),
	engine_tag: code('Engine tags', 'Codes of tags fixed to the engine.'),
	date_code: code('Date codes', 'Letters and figures that stand for years, months and weeks.'),
	glass: code('Glass', 'Makers’ marks and dates in glass.'),
	component: code('Components', 'Marks, stamps and features of components.'),
	stamp_place: knowledge('Where stamps sit', 'Where a plate, tag or stamp is found.'),
	feature: knowledge('Features', 'Dimensions and visible features that tell parts apart.'),
	production: knowledge('Production figures', 'How many were built, by whose count.'),
	note: knowledge('Notes', 'What is known beside the codes: limits, traps, availability.'),
	item: knowledge('Items', 'Visible equipment that can be looked for on a car.'),
	package: knowledge('Packages', 'What a package requires, brings and excludes.'),
	rule: knowledge('Rules', 'Statements that the tally holds a car against.'),
	constraint: knowledge('Constraints', 'Which codes can stand beside which.'),
	lead_time: knowledge('Lead times', 'How far a part’s date usually stands before the car.'),
	plant_years: knowledge('Plant years', 'When a plant built cars.')
} as const satisfies Record<string, TableDefinition>;

export type TableName = keyof typeof TABLES;
export const TABLE_NAMES = Object.keys(TABLES) as TableName[];
export const tableDefinition = (name: TableName): TableDefinition => TABLES[name];
