/** What the page of a loose part shows for an address. */
import { examineText } from '$lib/decoder';
import { readingAddress } from '$lib/format/addresses';
import { fault } from '$lib/server/http';
import { readAgainst, readContext } from '$lib/server/readings';
import { current } from '$lib/server/reference';
import { interfaceText } from '$lib/text/en/interface';
import {
	MAX_TEXT,
	type AnsweredReading,
	type FieldError,
	type ReadContext,
	type StampKind
} from '$lib/types';
import { makerChoice, makerOptions } from '../reading/choices';
import { spansOf, whatOf, whenOf } from './part-answer';

/** The text of a field, when there is one and it can be read; what is wrong with it joins `faults`. */
function readable(name: string, typed: string, kind: StampKind, faults: FieldError[]): string {
	if (typed.trim() === '') return '';
	const wrong = examineText(typed, kind);
	if (wrong === null) return typed;
	faults.push(fault(name, wrong, interfaceText.text[wrong](MAX_TEXT[kind])));
	return '';
}

const readingsOf = (
	text: string,
	kind: StampKind,
	context: ReadContext
): readonly AnsweredReading[] =>
	text === '' ? [] : readAgainst(current(), { text, kind, context, explain: false }).readings;

/** The page: the form, what the number tells, and what the date tells beside it. */
export function partPage(parameters: URLSearchParams) {
	const asked = {
		number: parameters.get('number') ?? '',
		date: parameters.get('date') ?? '',
		maker: parameters.get('maker')?.trim() ?? ''
	};
	const faults: FieldError[] = [];
	const context = readContext({ maker: asked.maker || undefined }, faults);
	const number = readable('number', asked.number, 'casting', faults);
	const date = readable('date', asked.date, 'date', faults);
	const { tables, head } = current();
	const named = [...readingsOf(number, 'casting', context), ...readingsOf(number, 'code', context)];
	const what = whatOf(named, (key) => tables.rows.get(key));
	const rows = what.flatMap(({ facts }) => facts.flatMap(({ key }) => tables.rows.get(key) ?? []));
	// A number typed with its date in one field tells both.
	const dated = [...readingsOf(date, 'date', context), ...(date === '' ? named : [])];
	return {
		edition: head.number,
		form: {
			asked: { ...asked, maker: makerChoice(asked.maker) },
			makers: makerOptions(makerChoice(asked.maker)),
			faults
		},
		withNumber: number !== '',
		withDate: date !== '',
		what,
		when: whenOf(dated, spansOf(rows)),
		reading:
			number === ''
				? null
				: readingAddress({ kind: 'casting', text: number, maker: makerChoice(asked.maker) })
	};
}
