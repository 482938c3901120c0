/** An answer as the page shows it: one reading whole, the others by name. */
import { readingAddress, tagAddress, whereAddress, type ReadingQuery } from '$lib/format/addresses';
import { day } from '$lib/format/editions';
import { stampCells } from '$lib/format/stamp';
import { entryText } from '$lib/text/en/entry';
import { readingText as text } from '$lib/text/en/reading';
import type { EditionHead, ReadAnswer, StampKind } from '$lib/types';
import { checkDigitWork } from './check-digit-work';
import type { AnswerView } from './page-data';
import { layoutTitleOf, titleOf, viewOf } from './view';

interface Shown {
	readonly answer: ReadAnswer;
	/** Head of the edition that answered, and the number of the present one. */
	readonly head: EditionHead;
	readonly present: number;
	/** What was asked, as addresses have it; the edition only when it was named. */
	readonly query: ReadingQuery;
	/** Which reading is shown, from 0. */
	readonly index: number;
}

const wasRead = (kind: StampKind | null, n: number): string => {
	if (kind === null) return '';
	return kind === 'serial' ? entryText.wasRead.serial(n) : entryText.wasRead[kind];
};

/** Readings of one text: which is shown, what else it could be, what stands in the way. */
export function answerView({ answer, head, present, query, index }: Shown): AnswerView {
	const { input, readings, more, problems } = answer;
	const cells = stampCells(input.normalised);
	const at = readings[index] === undefined ? 0 : index;
	const shown = readings[at];
	const equals = readings.filter(({ rank }) => rank === shown?.rank).length;
	const seventeen = shown?.fields.some(({ name }) => name === 'check_digit') === true;
	return {
		position: text.position(at, readings.length + more, equals),
		reading: shown === undefined ? null : viewOf(shown, input.normalised),
		others: readings.flatMap((reading, other) =>
			other === at
				? []
				: [
						{
							index: other,
							title: titleOf(reading),
							layoutTitle: layoutTitleOf(reading),
							why: reading.why,
							equal: equals > 1 && reading.rank === shown?.rank,
							address: readingAddress({ ...query, reading: other + 1 })
						}
					]
		),
		more,
		problems: problems.map(({ offers, ...problem }) => ({
			...problem,
			offers: offers.map((offer) => ({
				...offer,
				address: readingAddress({ ...query, text: offer.text })
			}))
		})),
		misfits: shown === undefined ? problems.map(({ message }) => message) : [],
		cells,
		wasRead: wasRead(input.kind, cells.length),
		edition: { number: head.number, day: day(head.made_at) },
		present: head.number === present ? null : present,
		digest: answer.digest,
		reader: answer.reader,
		permanent: readingAddress({
			...query,
			kind: input.kind,
			edition: head.number,
			reading: at + 1
		}),
		again: readingAddress({ ...query, edition: null }),
		lineByLine:
			input.kind === 'body_tag'
				? tagAddress({
						maker: query.maker ?? '',
						year: String(query.year ?? ''),
						serial: '',
						lines: [query.text]
					})
				: null,
		where:
			shown === undefined || shown.maker_key === null || shown.maker_key === 'other'
				? null
				: whereAddress(shown.division ?? shown.maker_key, shown.model_year),
		work: seventeen ? checkDigitWork(cells) : null
	};
}
