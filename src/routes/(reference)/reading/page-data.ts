import type { Problem } from '$lib/types';
import type { CheckDigitWork } from './check-digit-work';
import type { ReadingView } from './view';

/** What was asked, as it goes back into the form. */
export interface AskedView {
	readonly kind: string;
	readonly text: string;
	readonly maker: string;
	readonly year: string;
}
/** What is wrong with one part of the form. */
export interface FieldFault {
	readonly field: string;
	readonly message: string;
}
/** Another reading of the same stamp. */
export interface OtherView {
	/** From 0, in the order of readings. */
	readonly index: number;
	readonly title: string;
	readonly layoutTitle: string;
	readonly why: string;
	/** As likely as the one shown. */
	readonly equal: boolean;
	readonly address: string;
}
export interface EditionView {
	readonly number: number;
	/** "12 June 2026" */
	readonly day: string;
}
export interface ProblemView extends Omit<Problem, 'offers'> {
	readonly offers: readonly {
		readonly text: string;
		readonly why: string;
		readonly address: string;
	}[];
}
/** One answer, ready to show. */
export interface AnswerView {
	/** "Second of three readings." */
	readonly position: string;
	readonly reading: ReadingView | null;
	readonly others: readonly OtherView[];
	readonly more: number;
	readonly problems: readonly ProblemView[];
	/** Why nothing fits, to stand beside the field; empty when something does. */
	readonly misfits: readonly string[];
	/** Cells of what was typed, for the page that says why nothing fits. */
	readonly cells: readonly string[];
	readonly wasRead: string;
	readonly edition: EditionView;
	/** The present edition, when it is another. */
	readonly present: number | null;
	readonly digest: string;
	readonly reader: string;
	readonly permanent: string;
	/** The page on which a body tag is typed line by line; null for other stamps. */
	readonly lineByLine: string | null;
	/** The page of the places where stamps of such a car sit; null where its maker is open. */
	readonly where: string | null;
	/** The same question to the present edition. */
	readonly again: string;
	readonly work: CheckDigitWork | null;
}
/** The form, and what stands in it. */
export interface EntryView {
	readonly asked: AskedView;
	readonly faults: readonly FieldFault[];
	/** Name of the chosen maker; empty for none. */
	readonly makerName: string;
	/** Options of the form, as `readyOptions` writes them. */
	readonly makers: string;
	readonly years: string;
}
export interface EmptyView {
	/** The corporation that the chosen maker is or belongs to, for the drawing of places; empty for none. */
	readonly corporation: string;
	/** The worked example; null when the tables do not read it. */
	readonly example: { readonly reading: ReadingView; readonly address: string } | null;
}
export interface ReadingPage {
	readonly entry: EntryView;
	/** Null before anything is read. */
	readonly answer: AnswerView | null;
	/** What stands on the page then. */
	readonly empty: EmptyView | null;
	/** The present edition: readings can be repeated on it and on every one before. */
	readonly present: number;
}
