import { interfaceText } from '../../text/en/interface';
import { fault, Refusal } from './refusal';

interface Range {
	readonly type: string;
	readonly weight: number;
}

const rangesOf = (accept: string): Range[] =>
	accept
		.split(',')
		.map((part) => {
			const [type = '', ...parameters] = part.split(';').map((text) => text.trim().toLowerCase());
			const q = parameters.find((text) => text.startsWith('q='))?.slice(2);
			const weight = q === undefined ? 1 : Number(q);
			return { type, weight: Number.isFinite(weight) ? weight : 0 };
		})
		.filter(({ type }) => type !== '');

/** How gladly a type is taken: the most exact range decides (RFC 9110, 12.5.1). */
function weightOf(type: string, ranges: readonly Range[]): number {
	const [family] = type.split('/');
	for (const pattern of [type, `${family}/*`, '*/*']) {
		const range = ranges.find((one) => one.type === pattern);
		if (range) return range.weight;
	}
	return 0;
}

/**
 * The first of the offered types that is taken most gladly.
 * @throws {Refusal} 406 when none is taken
 * @example chooseType('text/csv, text/html', ['application/json', 'text/csv']) // 'text/csv'
 */
export function chooseType<Type extends string>(
	accept: string | null,
	offered: readonly [Type, ...Type[]]
): Type {
	if (accept === null || accept === '*/*' || accept === offered[0]) return offered[0];
	const ranges = rangesOf(accept);
	if (ranges.length === 0) return offered[0];
	let best: Type | undefined;
	let most = 0;
	for (const type of offered) {
		const weight = weightOf(type, ranges);
		if (weight > most) {
			best = type;
			most = weight;
		}
	}
	if (best !== undefined) return best;
	const message = interfaceText.notAcceptable(offered);
	throw new Refusal(406, [fault('Accept', 'not_acceptable', message, offered)]);
}
