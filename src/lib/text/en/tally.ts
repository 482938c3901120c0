/** Every word of the tally. It says what agrees and on what that rests; never what a car is worth or whether it is genuine. */
import type { Dated, Strength, TallyAttribute } from '../../types';
import { decoderText } from './decoder';

const { counted, lower, listed } = decoderText;

const NAMES: Readonly<Record<TallyAttribute, readonly [one: string, many: string]>> = {
	maker: ['maker', 'makers'],
	division: ['division', 'divisions'],
	model_year: ['model year', 'model years'],
	line: ['car line', 'car lines'],
	series: ['series', 'series'],
	body_style: ['body style', 'body styles'],
	assembly_plant: ['assembly plant', 'assembly plants'],
	sequence_number: ['sequence number', 'sequence numbers'],
	engine: ['engine', 'engines'],
	transmission: ['gearbox', 'gearboxes'],
	axle: ['axle', 'axles'],
	paint: ['paint code', 'paint codes'],
	trim: ['trim code', 'trim codes'],
	roof: ['roof code', 'roof codes'],
	order_number: ['order number', 'order numbers'],
	body_number: ['body number', 'body numbers'],
	date_order: ['date', 'dates'],
	build_window: ['date', 'dates']
};
const one = (attribute: TallyAttribute): string => NAMES[attribute][0];
const many = (attribute: TallyAttribute): string => NAMES[attribute][1];
const days = (n: number): string => counted(n, 'day', 'days');
const ofDays = (n: number): string => lower(days(n));

const STRENGTHS: Readonly<Record<Strength, string>> = {
	firm: 'firm',
	fair: 'fair',
	thin: 'thin',
	contested: 'contested',
	not_rated: 'unrated'
};

/** "Rests on two firm rows and a thin one." in the shortest form that says it. */
function rests(rows: readonly { readonly strength: Strength }[]): string {
	if (rows.length === 0) return 'Rests on no row of ours.';
	const counts = new Map<Strength, number>();
	for (const { strength } of rows) counts.set(strength, (counts.get(strength) ?? 0) + 1);
	const parts = [...counts]
		.sort(([a], [b]) => Object.keys(STRENGTHS).indexOf(a) - Object.keys(STRENGTHS).indexOf(b))
		.map(([strength, n]) =>
			lower(counted(n, `${STRENGTHS[strength]} row`, `${STRENGTHS[strength]} rows`))
		);
	return `Rests on ${listed(parts)}.`;
}

const WHAT: Readonly<Partial<Record<Dated, string>>> = {
	cast: 'The casting',
	part_made: 'The part',
	unit_assembled: 'The unit'
};
const what = (dates: Dated): string => WHAT[dates] ?? 'The date';

export const tallyText = {
	attribute: one,

	ground: {
		characters: 'Rests on the characters themselves; no row is needed.',
		rows: rests,
		dates: (rows: readonly { readonly strength: Strength }[], rule: boolean): string =>
			rule
				? `${rests(rows)} How far they may stand apart is a rule of thumb, a row of its own.`
				: rests(rows)
	},

	notLookedAt: 'Only one place that was read says it.',

	agree: (attribute: TallyAttribute) => `The two name the same ${one(attribute)}.`,
	differ: (attribute: TallyAttribute) => `The two name different ${many(attribute)}.`,
	thin: (attribute: TallyAttribute) =>
		`They seem to name different ${many(attribute)}, but not every row of ours on it is firm or fair.`,
	noCommonGround: (attribute: TallyAttribute) =>
		`What the two say of the ${one(attribute)} cannot be held against each other: they tell different things, or our tables word them differently.`,
	gap: (
		gap: 'contested' | 'not_used' | 'not_listed' | 'illegible' | 'undecided' | 'none',
		label: string,
		code: string
	): string => {
		const name = lower(label);
		switch (gap) {
			case 'contested':
				return `Sources differ on ${code} as ${name}.`;
			case 'not_used':
				return `${code} as ${name} was not used, by a source that lists all. Read it again first.`;
			case 'not_listed':
				return `We have no row for ${code} as ${name}. That says nothing against the car.`;
			case 'illegible':
				return `The ${name} is not wholly read. The missing character would settle it.`;
			default:
				return `The ${name} could still be one of several. Division, line or year would settle it.`;
		}
	},

	sameCharacters: (code: string) => `Both carry ${code}.`,
	unreadCharacters: 'A character that decides is unread.',
	otherLength: 'One is too short to be held against the other.',
	otherCharacters: (left: string, right: string) =>
		`They read ${left} and ${right}. The two places need not carry the same code.`,
	either: (agrees: string, others: readonly string[]) =>
		`Read as ${listed([agrees, ...others]).replace(/ and (?!.* and )/, ' or ')}. As ${agrees} it is the same car; as ${listed(others).replace(/ and (?!.* and )/, ' or ')} it is another.`,
	lookAlike: ({ place, left, right }: { place: number; left: string; right: string }) =>
		`They differ in one place only, ${left} against ${right}, which are easily taken for one another: look again at character ${place}.`,
	neighbor: (code: string, label: string, place: number) =>
		`${code} as ${lower(label)} would agree: look again at character ${place}.`,

	dates: {
		agree: (sort: 'hard' | 'soft' | 'window', rule: boolean) => {
			if (sort === 'window') return 'The two dates agree.';
			return rule
				? 'The dates agree: no later than the other, and no earlier than usual.'
				: 'The dates agree: no later than the other.';
		},
		open: 'A year, or the form of a date, is open: what gives it settles it.',
		decade:
			'One of the dates can be of more than one year: the casting or part number, or what else gives the year, settles it.',
		reaches: 'The days that the dates can be overlap: the order cannot be told.',
		early: (least: number, most: number) =>
			`At least ${ofDays(least)} before the other, where ${most} are usual at most. Unusual, not impossible: parts sat in stores.`,
		noRule: (later: number) => `${days(later)} later, and no row says how far a plan may slip.`,
		mayHaveSlipped: (dates: Dated, later: number, most: number) =>
			dates === 'scheduled'
				? `${days(later)} later. A scheduled date may slip: up to ${most} days are taken as possible.`
				: `${days(later)} later. A body or its tag may be dated before the rest: up to ${most} days are taken as possible.`,
		later: (dates: Dated, later: number, sort: 'hard' | 'soft' | 'window', slip: number) => {
			const by = `${ofDays(later)} later`;
			switch (sort) {
				case 'hard':
					return `${what(dates)} is dated ${by}: not fitted at first assembly, if both readings stand.`;
				case 'soft':
					return `${what(dates)} is dated ${by}, more than the ${slip} by which the other may slip: not fitted when the car was built, or the part was changed, or a date misread.`;
				case 'window':
					return `The date that should come before is ${by}, more than the ${slip} by which it may slip: the two are not of one car, or one is misread.`;
			}
		},
		thin: (later: number) =>
			`${days(later)} later, if the dates are read right; how they are read rests on too little to say more.`
	}
} as const;
