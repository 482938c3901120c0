/** A part of a page: text, or the name of a drawing that stands between two texts. */
export type HelpPart =
	| { readonly html: string; readonly drawing?: undefined }
	| { readonly drawing: string; readonly html?: undefined };
/** A help page as the build makes it of its Markdown. */
export interface HelpPage {
	readonly slug: string;
	readonly title: string;
	/** The first paragraph, for the list of pages. */
	readonly summary: string;
	readonly parts: readonly HelpPart[];
}
