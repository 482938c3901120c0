/** Which place of the drawings a row speaks of, by its words. */
import { CAR_ZONES, ENGINE_ZONES, type CarZone, type EngineZone } from '$lib/text/en/where';

export type Zone = CarZone | `engine-${EngineZone}`;

/** In the order in which they stand in lists: along the car, from the front. */
export const ZONES: readonly Zone[] = CAR_ZONES.flatMap((zone): Zone[] =>
	zone === 'engine' ? ['engine', ...ENGINE_ZONES.map((own) => `engine-${own}` as const)] : [zone]
);

const ENGINE_PART = /\b(engine|block|head|casting date|casting number|part number)\b/;
const ON_ENGINE = /\b(cylinder|engine) block\b/;
const CAR: readonly (readonly [RegExp, CarZone])[] = [
	[/radiator support/, 'support'],
	[/trunk/, 'trunk'],
	[/seat springs|glove box/, 'seat'],
	[/axle|third member/, 'axle'],
	[/gearbox|transmission|toploader|automatic/, 'transmission'],
	[/fender/, 'fender'],
	[/firewall/, 'firewall'],
	[/\bframe\b/, 'frame'],
	[/instrument panel|\bdash\b|windshield (?:post|support|pillar)|left pillar/, 'dash'],
	[/lock pillar|\bdoor\b(?! pillar)/, 'door'],
	[/(?<!lock )(?<!windshield )(?<!the left )pillar|hinge/, 'pillar'],
	[/cowl/, 'cowl']
];
const ENGINE: readonly (readonly [RegExp, EngineZone])[] = [
	[/rear of the (?!engine mount)|at the rear|bell ?housing|rear upper/, 'rear'],
	[/front|water pump|timing cover|coil/, 'front'],
	[/rocker|valve cover|intake|\bdeck\b/, 'top'],
	[/oil.pan rail|right side|passenger side|oil filter/, 'right'],
	[/left corner|driver.s side/, 'left']
];
/** Words that name as many places as this are a list of parts, and no one place. */
const MANY = 4;

/** The zone that is named first; none where nearly all are. */
function carZone(words: string): CarZone | null {
	const named = CAR.map(([pattern, zone]) => ({ at: words.search(pattern), zone }))
		.filter(({ at }) => at >= 0)
		.sort((a, b) => a.at - b.at);
	return named.length >= MANY ? null : (named[0]?.zone ?? null);
}

/**
 * The place of a row: by what is stamped and by the words for where. Null where they name none that is drawn.
 * @example zoneOf('axle code', 'On the front right side of the axle tube') // 'axle'
 */
export function zoneOf(part: string, where: string): Zone | null {
	const [stamped, words] = [part.toLowerCase(), where.toLowerCase()];
	if (ENGINE_PART.test(stamped) || ON_ENGINE.test(words)) {
		const place = ENGINE.find(([pattern]) => pattern.test(words))?.[1];
		return place === undefined ? 'engine' : `engine-${place}`;
	}
	return carZone(words) ?? carZone(stamped);
}
