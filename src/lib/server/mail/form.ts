import { letterFrame, type Letter, type LetterPart } from '../../text/en/mail';

/** What stands under a letter: why it came, and where no more of its kind can be asked for. */
export interface Foot {
	readonly why: string;
	readonly unsubscribe: string | null;
}

/** A letter in both of its forms. */
export interface MailForms {
	readonly subject: string;
	readonly text: string;
	readonly html: string;
}

const ESCAPES: Readonly<Record<string, string>> = {
	'&': '&amp;',
	'<': '&lt;',
	'>': '&gt;',
	'"': '&quot;',
	"'": '&#39;'
};
const escaped = (text: string): string => text.replace(/[&<>"']/g, (sign) => ESCAPES[sign]!);

/** One line of a header or a sentence: names of files and people can hold line breaks and worse. */
const oneLine = (text: string): string => text.replace(/[\p{Cc}\p{Zl}\p{Zp}]+/gu, ' ').trim();

function textOf(part: LetterPart): string {
	if (typeof part === 'string') return oneLine(part);
	if ('head' in part) return oneLine(part.head).toUpperCase();
	if ('lines' in part) return part.lines.map((line) => `  ${oneLine(line)}`).join('\n');
	return `${oneLine(part.label)}:\n${part.link}`;
}

const PARAGRAPH = 'margin:0 0 16px';
const LINK =
	'display:inline-block;padding:10px 16px;border-radius:2px;background:#1e4a94;color:#ffffff;font-weight:600';
const NOTE = 'margin:0 0 4px;color:#47504c;font-size:13px;line-height:20px';

function htmlOf(part: LetterPart): string {
	if (typeof part === 'string') return `<p style="${PARAGRAPH}">${escaped(oneLine(part))}</p>`;
	if ('head' in part)
		return `<h2 style="margin:24px 0 8px;font-size:18px;line-height:24px">${escaped(oneLine(part.head))}</h2>`;
	if ('lines' in part) {
		const items = part.lines.map((line) => `<li>${escaped(oneLine(line))}</li>`);
		return `<ul style="${PARAGRAPH};padding-left:20px">${items.join('')}</ul>`;
	}
	const link = escaped(part.link);
	return (
		`<p style="${PARAGRAPH}"><a href="${link}" style="${LINK}">${escaped(oneLine(part.label))}</a></p>` +
		`<p style="${NOTE};margin-bottom:16px;word-break:break-all">${link}</p>`
	);
}

const SUBJECT_LENGTH = 300;

/** Sets a letter as plain text and as HTML. Whatever stands in it is text: nothing in it is taken for markup. */
export function formsOf(letter: Letter, { why, unsubscribe }: Foot): MailForms {
	const subject = oneLine(letter.subject).slice(0, SUBJECT_LENGTH);
	const text = [
		...letter.parts.map(textOf),
		letterFrame.close,
		`--\n${why}${unsubscribe === null ? '' : `\n${letterFrame.unsubscribe}: ${unsubscribe}`}`
	].join('\n\n');
	const link =
		unsubscribe === null
			? ''
			: `<p style="${NOTE}"><a href="${escaped(unsubscribe)}" style="color:#1e4a94">${escaped(letterFrame.unsubscribe)}</a></p>`;
	const html = [
		`<!doctype html><html lang="en"><head><meta charset="utf-8"><title>${escaped(subject)}</title></head>`,
		'<body style="margin:0;padding:24px 16px;background:#f2f3ef;color:#1a201e;font:16px/24px Archivo,Helvetica,Arial,sans-serif">',
		'<div style="max-width:560px;margin:0 auto">',
		...letter.parts.map(htmlOf),
		`<p style="${PARAGRAPH}">${escaped(letterFrame.close)}</p>`,
		'<hr style="margin:24px 0 12px;border:0;border-top:1px solid #c6cbc3">',
		`<p style="${NOTE}">${escaped(why)}</p>${link}`,
		'</div></body></html>\n'
	].join('\n');
	return { subject, text: `${text}\n`, html };
}
