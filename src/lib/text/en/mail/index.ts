/** Every mail that the product sends, by name of its template. */
import { accessLetters } from './access';
import type { Letter } from './letter';
import { noticeLetters } from './notices';

export { letterFrame, type Letter, type LetterPart } from './letter';

export const MAIL_TEMPLATES = { ...accessLetters, ...noticeLetters } as const;

export type MailTemplate = keyof typeof MAIL_TEMPLATES;
/** What a template has to be told. */
export type MailData<Template extends MailTemplate> = Parameters<
	(typeof MAIL_TEMPLATES)[Template]
>[0];

/** The letter of a template. */
export const letterOf = <Template extends MailTemplate>(
	template: Template,
	data: MailData<Template>
): Letter => (MAIL_TEMPLATES[template] as (data: MailData<Template>) => Letter)(data);
