/**
 * A chip for a paint that nobody has measured, by the color words of its name. It shows what kind of color the name
 * promises, never the paint itself; a name without a color word has none.
 */

type Rgb = readonly [red: number, green: number, blue: number];

/** Each color with the words that stand for it, or for a shade close by, in names of paints. */
const COLORS: Readonly<Record<string, readonly string[]>> = {
	'#161718': ['black', 'ebony', 'onyx'],
	'#f3f2ec': ['white'],
	'#efe9d6': ['ivory', 'cream', 'pearl'],
	'#85898b': ['gray', 'grey', 'graystone', 'pewter', 'slate'],
	'#3c4043': ['charcoal', 'graphite'],
	'#b9bec1': ['silver', 'platinum', 'silverglaze'],
	'#a3201f': ['red', 'scarlet', 'crimson', 'vermilion'],
	'#6d1a24': ['maroon', 'burgundy', 'claret', 'ruby', 'garnet', 'cranberry', 'cherry', 'wine'],
	'#d2561e': ['orange', 'persimmon', 'tangerine'],
	'#a65a34': ['copper', 'ginger', 'cinnamon', 'rust', 'umber', 'sienna'],
	'#8a6b45': ['bronze', 'saddle', 'amber'],
	'#5b3d2a': ['brown', 'chestnut', 'mahogany', 'walnut', 'cocoa', 'chocolate', 'rosewood'],
	'#b99a6f': ['tan', 'buckskin', 'camel', 'chamois', 'fawn', 'sandalwood', 'butterscotch'],
	'#d3c5a6': ['beige', 'sand', 'sandstone', 'champagne', 'taupe', 'parchment'],
	'#b18d3f': ['gold', 'goldenrod', 'saffron'],
	'#e3bf3a': ['yellow', 'lemon', 'maize', 'banana', 'citron', 'butternut'],
	'#8ea63a': ['lime', 'limelight', 'chartreuse'],
	'#6f7038': ['olive', 'moss', 'avocado'],
	'#2f6146': ['green', 'emerald', 'jade', 'ivy', 'sherwood'],
	'#a9c9b4': ['mint'],
	'#2f8f8c': ['turquoise', 'aqua', 'aquamarine', 'teal'],
	'#254f86': ['blue'],
	'#1c2b4a': ['navy', 'midnight'],
	'#4d2d63': ['purple', 'plum', 'violet', 'grape'],
	'#8d7196': ['lavender', 'lilac', 'orchid', 'mauve'],
	'#b4336b': ['magenta', 'fuchsia'],
	'#d99aa0': ['pink', 'rose'],
	'#dfa37f': ['peach', 'coral', 'salmon']
};
const BY_WORD = new Map(
	Object.entries(COLORS).flatMap(([hex, words]) => words.map((word) => [word, hex] as const))
);

/** What a word before the color does to it: how far towards white or black. */
const SHADES: Readonly<Record<string, readonly [towards: Rgb, share: number]>> = {
	light: [[255, 255, 255], 0.4],
	pale: [[255, 255, 255], 0.5],
	dark: [[0, 0, 0], 0.4],
	deep: [[0, 0, 0], 0.3]
};

/** Words after which another name of the same paint follows. */
const OTHER_NAMES = /, also called | or | \(/;
/** Between the colors of a car in two tones. */
const TWO_TONES = / over | and | with | & |\//;

const rgb = (hex: string): Rgb => [
	parseInt(hex.slice(1, 3), 16),
	parseInt(hex.slice(3, 5), 16),
	parseInt(hex.slice(5, 7), 16)
];
const hexOf = (color: Rgb): string =>
	`#${color.map((part) => Math.round(part).toString(16).padStart(2, '0')).join('')}`;
const mixed = (a: Rgb, b: Rgb, share: number): Rgb => [
	a[0] + (b[0] - a[0]) * share,
	a[1] + (b[1] - a[1]) * share,
	a[2] + (b[2] - a[2]) * share
];

/** One tone: the last color word is the color, one before it tints it, light and dark shade it. */
function toneOf(name: string): string | null {
	const words = name.toLowerCase().match(/[a-z]+/g) ?? [];
	const colors = words.flatMap((word) => BY_WORD.get(word) ?? []).map(rgb);
	const last = colors.at(-1);
	if (last === undefined) return null;
	const tint = colors.at(-2);
	const shade = words.map((word) => SHADES[word]).find((one) => one !== undefined);
	const tinted = tint === undefined ? last : mixed(last, tint, 0.3);
	return hexOf(shade === undefined ? tinted : mixed(tinted, ...shade));
}

/**
 * The tones of a paint, "#rrggbb" each: one, two for a car in two tones, none where the name has no color word.
 * @example chipTones('Dark Green Metallic') // ['#1c3a2a']
 */
export function chipTones(name: string): string[] {
	const [own = ''] = name.split(OTHER_NAMES);
	return own
		.split(TWO_TONES)
		.flatMap((part) => toneOf(part) ?? [])
		.slice(0, 2);
}
