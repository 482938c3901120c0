/** Which place of the drawings a row speaks of, by its words. */
import { VIEW_ZONES, VIEWS, type View, type Zone } from '$lib/text/en/where';

/** In the order in which they are numbered: drawing by drawing. */
export const ZONES: readonly Zone[] = VIEWS.flatMap((view): readonly Zone[] => VIEW_ZONES[view]);

const VIEW_OF = new Map<Zone, View>(
	VIEWS.flatMap((view) => VIEW_ZONES[view].map((zone: Zone) => [zone, view] as const))
);
/** The drawing that shows a place. @example viewOf('lock') // 'door' */
export const viewOf = (zone: Zone): View => VIEW_OF.get(zone) ?? 'car';

const ENGINE_PART = /\b(engine|block|head|casting date|casting number|part number)\b/;
const ON_ENGINE = /\b(cylinder|engine) block\b/;
const CAR: readonly (readonly [RegExp, Zone])[] = [
	[/radiator support/, 'support'],
	[/trunk/, 'trunk'],
	[/seat springs|glove box/, 'seat'],
	[/axle|third member/, 'axle'],
	[/gearbox|transmission|toploader|automatic/, 'transmission'],
	[/fender/, 'fender'],
	[/firewall/, 'firewall'],
	[/\bframe\b/, 'frame'],
	[/windshield (?:post|support)/, 'post'],
	[/instrument panel|\bdash\b|left windshield pillar|left pillar/, 'dash'],
	[/lock pillar/, 'lock'],
	[/\bdoor\b(?! pillar| jamb)/, 'door'],
	[/(?<!lock )(?<!windshield )(?<!the left )pillar|hinge|door jamb/, 'pillar'],
	[/cowl/, 'cowl']
];
const REAR = /rear of the (?!engine mount)|at the rear|bell ?housing|rear upper/;
const ENGINE: readonly (readonly [RegExp, Zone])[] = [
	[/oil.pan rail/, 'rail'],
	[/starter/, 'starter'],
	[/coil/, 'coil'],
	[/front|water pump|timing cover/, 'front'],
	[/rocker|valve cover|intake|\bdeck\b/, 'top'],
	[/right side|passenger side|oil filter|on the side of the block/, 'side-right'],
	[/left corner|driver.s side/, 'side-left']
];
/** Words that name as many places as this are a list of parts, and no one place. */
const MANY = 4;

/** The zone that is named first; none where nearly all are. */
function carZone(words: string): Zone | null {
	const named = CAR.map(([pattern, zone]) => ({ at: words.search(pattern), zone }))
		.filter(({ at }) => at >= 0)
		.sort((a, b) => a.at - b.at);
	return named.length >= MANY ? null : (named[0]?.zone ?? null);
}

/** The rear of a block has two flanks; the one that is named first counts. */
function rearZone(words: string): Zone {
	const side = /\b(left|driver|right|passenger)\b/.exec(words)?.[1];
	if (side === undefined) return 'rear';
	return side === 'left' || side === 'driver' ? 'rear-left' : 'rear-right';
}

function engineZone(words: string): Zone {
	if (REAR.test(words) && !/starter/.test(words)) return rearZone(words);
	return ENGINE.find(([pattern]) => pattern.test(words))?.[1] ?? 'engine';
}

/**
 * The place of a row: by what is stamped and by the words for where. Null where they name none that is drawn.
 * @example zoneOf('axle code', 'On the front right side of the axle tube') // 'axle'
 */
export function zoneOf(part: string, where: string): Zone | null {
	const [stamped, words] = [part.toLowerCase(), where.toLowerCase()];
	if (ENGINE_PART.test(stamped) || ON_ENGINE.test(words)) return engineZone(words);
	return carZone(words) ?? carZone(stamped);
}
