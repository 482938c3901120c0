/** What is wrong with a form: a code for each field, of which the page makes a sentence. */
export type FormFaults = Readonly<Record<string, string>>;

/** A form that was sent back: what was typed stays, but for what is secret. */
export interface FormRefusal {
	/** Which of the forms of its page. */
	readonly form: string;
	readonly typed: Readonly<Record<string, string>>;
	readonly faults: FormFaults;
	/** Minutes until it may be tried again, where it was tried too often. */
	readonly wait?: number;
}

/** Sentences by field and code; the field `form` stands for the form as a whole. */
export type FaultTexts = Readonly<Record<string, Readonly<Record<string, string>>>>;
