/** What stands in the way of a stamp of several lines, beside the line where it stands. Nothing is applied in silence. */
import { MAKER_NAMES, MAX_LINES, MAX_TEXT, type Maker, type Problem } from '../../types';
import { stampsText } from '../../text/en/stamps';
import type { LinedLayout } from './lined-layout';
import { matchLayout, type LinedMatch } from './lined-match';
import { isUnread, lineText, type Line, type Lines } from './lines';

const text = stampsText.problems;

const joined = (lines: readonly Line[]): string => lines.map(lineText).join(' / ');

/** What is wrong with the text whatever it is. */
export function textProblems({ lines, beyond }: Lines): Problem[] {
	const problems: Problem[] = [];
	if (beyond.characters > 0)
		problems.push({
			line: Math.max(1, lines.length),
			code: 'too_long',
			message: text.tooLong(MAX_TEXT.body_tag, beyond.characters),
			offers: []
		});
	if (beyond.lines > 0)
		problems.push({
			line: MAX_LINES + 1,
			code: 'too_many_lines',
			message: text.tooManyLines(MAX_LINES, beyond.lines),
			offers: []
		});
	if (lines.length > 1)
		for (const line of lines.filter(isUnread))
			problems.push({
				line: line.number,
				code: 'unread_line',
				message: text.unreadLine(line.number),
				offers: []
			});
	return problems;
}

function ofOrder({ layout, order, sorted }: LinedMatch): Problem[] {
	if (order === 'as_listed') return [];
	const message = order === 'turned' ? text.turned(layout.title) : text.swapped(layout.title);
	return [
		{
			layout: layout.id,
			code: order === 'turned' ? 'lines_turned' : 'lines_swapped',
			message,
			offers: [{ text: joined(sorted), why: text.inOrder }]
		}
	];
}

/** Lines that make a whole plate of their own, and what they would be. */
function secondPlate(
	left: readonly Line[],
	layouts: readonly LinedLayout[]
): LinedMatch | undefined {
	return layouts
		.map((layout) => matchLayout(layout, left))
		.filter(
			({ missing, lines }) =>
				missing.length === 0 &&
				lines.every((line) => line.missing.length + line.unplaced.length === 0)
		)
		.sort((a, b) => a.cost - b.cost)[0];
}

/** What is wrong with the lines under the layout that they are read in. */
export function lineProblems(match: LinedMatch, layouts: readonly LinedLayout[]): Problem[] {
	const { layout, lines, forms, missing, doubled } = match;
	const problems = ofOrder(match);
	const about = (code: string, message: string, line?: number): void => {
		const place = line === undefined ? {} : { line };
		problems.push({ layout: layout.id, ...place, code, message, offers: [] });
	};
	for (const [line, first] of doubled)
		about('line_doubled', text.doubled(line.number, first.number), line.number);
	const repeated = doubled.map(([line]) => line);
	const left = lines
		.filter(({ line }, index) => forms[index] === null && !repeated.includes(line))
		.map(({ line }) => line)
		.filter((line) => !isUnread(line));
	const second = left.length === 0 ? undefined : secondPlate(left, layouts);
	if (second !== undefined) {
		const others = lines.map(({ line }) => line).filter((line) => !left.includes(line));
		const numbers = left.map(({ number }) => number);
		problems.push({
			layout: layout.id,
			line: numbers[0] as number,
			code: 'two_plates',
			message: text.twoPlates(numbers, second.layout.title),
			offers: [
				{ text: joined(others), why: text.onePlate(layout.title) },
				{ text: joined(left), why: text.onePlate(second.layout.title) }
			]
		});
	} else
		for (const { number } of left)
			about('unplaced_line', text.unplacedLine(number, layout.title), number);
	for (const form of missing) about('missing_line', text.missingLine(form.label, layout.title));
	for (const { line, missing: lacking } of lines)
		for (const { label } of lacking)
			about('missing_field', text.missingField(label, line.number), line.number);
	return problems;
}

/** A serial of another maker stands beside the stamp. */
export const otherMaker = (
	stamp: Maker,
	{ maker }: { readonly maker?: Maker },
	given: Maker | undefined
): Problem[] => {
	if (maker === undefined || maker === stamp) return [];
	const [own, other] = [MAKER_NAMES[stamp], MAKER_NAMES[maker]];
	return [
		given === maker
			? { code: 'other_maker_given', message: text.otherGiven(own, other), offers: [] }
			: { code: 'serial_of_other_maker', message: text.otherMaker(own, other), offers: [] }
	];
};
