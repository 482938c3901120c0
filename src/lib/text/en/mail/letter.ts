/** One piece of a mail, in the order in which it is read. */
export type LetterPart =
	| string
	/** Something to open; the address stands in full in plain text. */
	| { readonly link: string; readonly label: string }
	/** Lines that belong together. */
	| { readonly lines: readonly string[] }
	| { readonly head: string };

/** What a mail says, without its form: made into plain text and HTML alike. */
export interface Letter {
	/** One line. */
	readonly subject: string;
	readonly parts: readonly LetterPart[];
}

/** What stands around every letter. */
export const letterFrame = {
	greeting: (name: string | null) => (name ? `Hello ${name},` : 'Hello,'),
	close: 'Tallyplate',
	whyAsked: 'You get this mail because somebody gave this address at Tallyplate.',
	whyNotice: 'You get this mail because you have an account at Tallyplate.',
	unsubscribe: 'Send me no more mails of this kind'
} as const;
