import { readFileSync } from 'node:fs';
import { basename } from 'node:path';
import type { DOMPurify as Purifier } from 'dompurify';
import type { Plugin } from 'vite';
import type { HelpPage, HelpPart } from '../../src/lib/help/pages.ts';

/** What help may be made of. No styles, no classes, no scripts; headings of one size below the title. */
const TAGS = [
	'p',
	'h2',
	'ul',
	'ol',
	'li',
	'a',
	'strong',
	'em',
	'code',
	'table',
	'thead',
	'tbody',
	'tr',
	'th',
	'td',
	'br'
];
const ATTRIBUTES = ['href', 'id', 'scope'];

/** A line by itself such as `{{strengths}}` names a drawing. */
const DRAWING = /^\{\{([a-z-]+)\}\}$/m;

const idOf = (heading: string): string =>
	heading
		.toLowerCase()
		.replace(/[^a-z0-9]+/g, '-')
		.replace(/^-|-$/g, '');

async function makePurifier(): Promise<Purifier> {
	const [{ JSDOM }, { default: createPurifier }] = await Promise.all([
		import('jsdom'),
		import('dompurify')
	]);
	const purifier = createPurifier(new JSDOM('').window);
	// Without a real DOM it would hand its input back unchanged.
	if (!purifier.isSupported) throw new Error('The sanitizer of help pages does not work here.');
	return purifier;
}

let purifier: Promise<Purifier> | undefined;

/** @throws when something had to be taken out: our own text is put right, not silently cut */
async function htmlOf(markdown: string, file: string): Promise<string> {
	const { Marked } = await import('marked');
	const marked = new Marked({
		renderer: {
			heading({ tokens, text }) {
				return `<h2 id="${idOf(text)}">${this.parser.parseInline(tokens)}</h2>\n`;
			}
		}
	});
	const clean = await (purifier ??= makePurifier());
	const html = clean.sanitize(await marked.parse(markdown), {
		ALLOWED_TAGS: TAGS,
		ALLOWED_ATTR: ATTRIBUTES,
		// Help names works and offices; it leads nowhere but to our own pages.
		ALLOWED_URI_REGEXP: /^[/#]/
	});
	const removed = clean.removed
		.map((one) =>
			'element' in one ? `<${one.element.nodeName.toLowerCase()}>` : (one.attribute?.name ?? '')
		)
		// The document that the text is put in is no part of it.
		.filter((name) => name !== '<body>');
	if (removed.length > 0)
		throw new Error(`${file} holds what no help page may hold: ${removed.join(', ')}.`);
	return html;
}

/**
 * A help page from its Markdown. It begins with `# Title` and a paragraph that says what it is about.
 * @throws for a text that does not, or that holds what no help page may hold
 */
export async function helpPage(file: string, markdown: string): Promise<HelpPage> {
	const [, title, rest] = /^# (.+)\n+([\s\S]+)$/.exec(markdown.replaceAll('\r\n', '\n')) ?? [];
	const summary = rest?.split('\n\n', 1)[0]?.trim();
	if (title === undefined || rest === undefined || !summary || summary.startsWith('#'))
		throw new Error(`${file} must begin with a title and a paragraph.`);
	if (/^#{1}(?!#)|^#{3,} /m.test(rest))
		throw new Error(`${file} may have heads of the second size only.`);
	// Texts at even places, names of drawings at odd ones.
	const pieces = rest.split(new RegExp(DRAWING, 'm'));
	const parts: HelpPart[] = [];
	for (const [index, piece] of pieces.entries()) {
		if (index % 2 === 1) parts.push({ drawing: piece });
		else if (piece.trim() !== '') parts.push({ html: await htmlOf(piece, file) });
	}
	return { slug: basename(file, '.md'), title, summary, parts };
}

/**
 * Makes help pages of Markdown when the product is built, so that what serves them loads no parser and no
 * sanitizer. An import of src/lib/help/*.md gives a `HelpPage`.
 */
export function helpPlugin(): Plugin {
	return {
		name: 'tallyplate-help',
		enforce: 'pre',
		async load(id) {
			const [file = ''] = id.split('?');
			if (!/\/src\/lib\/help\/[a-z-]+\.md$/.test(file)) return null;
			this.addWatchFile(file);
			const page = await helpPage(file, readFileSync(file, 'utf8'));
			return { code: `export default ${JSON.stringify(page)};`, map: null };
		}
	};
}
