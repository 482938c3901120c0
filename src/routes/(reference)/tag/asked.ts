/** What the address of the tag page asks. */
import type { TagQuery } from '$lib/format/addresses';

/** What divides lines where several were pasted into one. */
const LINE_BREAK = /[\r\n\u2028\u2029]+|\s\/+\s/u;
const MOST_BLANK = 14;

/** Lines of a tag that is written in one text. */
export const splitLines = (text: string): string[] => text.split(LINE_BREAK);

const isBlank = (line: string): boolean => line.trim() === '';

/** Blank lines at the foot that nobody needs, so that an address cannot ask for a thousand fields. */
function withoutIdle(lines: readonly string[]): string[] {
	const kept = lines.filter((line, index) => !isBlank(line) || index < MOST_BLANK);
	return kept.length > 0 ? kept : [...lines];
}

export function askedTag(parameters: URLSearchParams): TagQuery {
	return {
		maker: parameters.get('maker')?.trim() ?? '',
		year: parameters.get('year')?.trim() ?? '',
		serial: parameters.get('serial') ?? '',
		lines: withoutIdle(parameters.getAll('text').flatMap(splitLines))
	};
}
