import { at, type Finding } from '../finding';
import type { Data } from '../read';

export const name = 'services';

/** An address that offers to read numbers for visitors; an article about reading them is no such thing. */
const READS_NUMBERS = new RegExp(
	[
		String.raw`vin[-_.]?(decod|check|look-?up|search|find|report|histor|inspect|valid)`,
		String.raw`(decod(e|er|ing)|check|look-?up|free)[-_.]?(a[-_.]|your[-_.])?vin`,
		String.raw`(serial|chassis|engine|number|plate|tag)s?[-_.]?decod`,
		String.raw`\bdecoders?\b`
	].join('|')
);

/** Sources are works and marque sites, not services whose business is to read numbers for visitors. */
export const check = (data: Data): Finding[] =>
	data.sources
		.filter(({ value }) => READS_NUMBERS.test(value.seen_at.toLowerCase()))
		.map((source) => at(source, `${source.value.seen_at} looks like a service that reads numbers`));
