import { counted } from '../counts';
import { type Letter, letterFrame, type LetterPart } from './letter';

interface NoticeInMail {
	readonly title: string;
	readonly body: string;
	readonly link: string;
}

/** Notices by mail: one at once, or those of a day. */
export const noticeLetters = {
	notice: ({ name, ...notice }: NoticeInMail & { readonly name: string | null }): Letter => ({
		subject: notice.title,
		parts: [
			letterFrame.greeting(name),
			notice.body,
			{ link: notice.link, label: 'Look at it at Tallyplate' }
		]
	}),
	digest: ({
		name,
		notices,
		inbox
	}: {
		readonly name: string | null;
		readonly notices: readonly NoticeInMail[];
		readonly inbox: string;
	}): Letter => ({
		subject: `${counted(notices.length, 'notice', 'notices')} at Tallyplate`,
		parts: [
			letterFrame.greeting(name),
			'Since the last of these mails:',
			...notices.flatMap(({ title, body }): LetterPart[] => [{ head: title }, body]),
			{ link: inbox, label: 'Open your inbox' }
		]
	})
} as const;
