import { z } from 'zod';
import type { FieldName, Outcome, Strength } from './fields';
import type { Maker } from './makers';
import { makerSchema } from './name-schemas';
import { yearSchema, type SourceKind } from './rows';
import type { TableName } from './tables';
import type { TallyLine } from './tally';
import type { RowValues } from './values';

export const STAMP_KINDS = ['serial', 'body_tag', 'engine', 'casting', 'date', 'code'] as const;
export const stampKindSchema = z.enum(STAMP_KINDS);
export type StampKind = z.infer<typeof stampKindSchema>;

/** Longest text of each kind, in characters as typed. */
export const MAX_TEXT: Readonly<Record<StampKind, number>> = {
	serial: 64,
	date: 64,
	code: 64,
	engine: 120,
	casting: 120,
	body_tag: 600
};

/** Most lines of a body tag. */
export const MAX_LINES = 14;
/** Most stamps of one car in a request. */
export const MAX_STAMPS = 24;

/** What is known beside the stamp. All of it ranks readings; none of it removes one. */
export interface ReadContext {
	readonly maker?: Maker;
	readonly division?: string;
	readonly year?: number;
	readonly plant?: string;
	/** For one bare code: the field it stands in. */
	readonly field?: FieldName;
	/** The car's serial as typed: what it tells scopes the other stamps. */
	readonly serial?: string;
}
export const readContextSchema = z.object({
	maker: makerSchema.optional(),
	division: z.string().optional(),
	year: yearSchema.optional(),
	plant: z.string().max(3).optional(),
	serial: z.string().max(64).optional()
});

export interface FieldSource {
	readonly key: string;
	readonly title: string;
	readonly locator: string;
	readonly kind: SourceKind;
}
export interface Alternative {
	readonly meaning: string;
	readonly values: RowValues;
	readonly strength: Strength;
	readonly rows: readonly string[];
	readonly sources: readonly FieldSource[];
}
export interface Possible {
	readonly code?: string;
	readonly meaning: string;
	readonly values: RowValues;
	/** Where this meaning holds, in words: "Chevrolet, Camaro, 1967–69". */
	readonly scope?: string;
}
/** A question that the reader put to the tables; `row_key` is null for a miss. */
export interface Lookup {
	readonly table: TableName;
	readonly code: string;
	readonly row_key: string | null;
}
export interface ReadingField {
	readonly name: FieldName;
	readonly label: string;
	/** The line of a stamp of several lines, 1-based from the top as typed; blank lines do not count. */
	readonly line?: number;
	/** 1-based and inclusive, in the normalised text. A derived field has its parent's. */
	readonly from: number;
	readonly to: number;
	readonly derived_from?: readonly FieldName[];
	/** The characters, `?` where unread. */
	readonly code: string;
	readonly outcome: Outcome;
	readonly meaning: string | null;
	/** Why the outcome is what it is, or a detail of it; may be empty. */
	readonly detail: string;
	readonly values: RowValues;
	readonly strength: Strength | null;
	readonly strength_why: string;
	readonly rows: readonly string[];
	readonly sources: readonly FieldSource[];
	readonly alternatives: readonly Alternative[];
	readonly possible: readonly Possible[];
	readonly lookups?: readonly Lookup[];
}
export interface Reading {
	/** Layout id, null where the text was read as a bare sequence or code. */
	readonly layout: string | null;
	readonly layout_title: string;
	readonly maker: Maker | null;
	readonly division: string | null;
	/** Null where the standard leaves the year open. */
	readonly model_year: number | null;
	readonly state: 'complete' | 'partial';
	/** 1 is first; equal readings share a rank. */
	readonly rank: number;
	readonly why: string;
	readonly fields: readonly ReadingField[];
}
export interface Offer {
	readonly text: string;
	readonly why: string;
}
export interface Problem {
	readonly layout?: string;
	readonly position?: number;
	/** The line of a body tag that it is about, 1-based, blank lines not counted. */
	readonly line?: number;
	readonly code: string;
	readonly message: string;
	readonly offers: readonly Offer[];
}
export interface ReadResult {
	readonly input: {
		readonly kind: StampKind | null;
		readonly text: string;
		readonly normalised: string;
	};
	/** At most 24. */
	readonly readings: readonly Reading[];
	/** How many further readings there are. */
	readonly more: number;
	readonly problems: readonly Problem[];
}
/** One stamp of a car: its text, or for a body tag what stands in each named field. */
export interface StampRequest {
	/** Left out: every kind that fits. */
	readonly kind?: StampKind;
	readonly text?: string;
	readonly fields?: Readonly<Partial<Record<FieldName, string>>>;
	/** Where it sits, in the words of whoever asks. */
	readonly place?: string;
}
/** Several stamps of one car: a result each, in the order asked, and what they say against each other. */
export interface StampsResult {
	readonly stamps: readonly ReadResult[];
	readonly lines: readonly TallyLine[];
}
/** A reading as answered: the corporation by its full name, and by its key as in addresses. */
export interface AnsweredReading extends Omit<Reading, 'maker'> {
	readonly maker: string | null;
	readonly maker_key: Maker | null;
}
/** What the interface answers: the result and what it is a function of. */
export interface ReadAnswer extends Omit<ReadResult, 'readings'> {
	readonly readings: readonly AnsweredReading[];
	readonly edition: number;
	readonly digest: string;
	readonly reader: string;
}
/** What the interface answers for several stamps of one car. */
export interface StampsAnswer {
	readonly edition: number;
	readonly digest: string;
	readonly reader: string;
	readonly stamps: readonly (Omit<ReadResult, 'readings'> & {
		readonly readings: readonly AnsweredReading[];
	})[];
	readonly lines: readonly TallyLine[];
}
