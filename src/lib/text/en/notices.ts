import type { FileRefusal, NoticeKind, Role } from '../../types';
import { filesText } from './files';

/** One notice, as it stands in the inbox and in mails. */
export interface NoticeWords {
	readonly title: string;
	readonly body: string;
	/** Where it leads; a path of ours. */
	readonly link: string;
}

/** Every notice that the product gives, by name of its template: what it says of its particulars. */
export const NOTICE_TEMPLATES = {
	role_changed: ({ role, areas }: { role: Role; areas: readonly string[] }): NoticeWords => ({
		title: `You are ${role === 'administrator' ? 'an' : 'a'} ${role} now`,
		body:
			areas.length === 0
				? 'An administrator has changed your role.'
				: `An administrator has changed your role. You decide for ${areas.join(', ')}.`,
		link: '/account'
	}),
	paused: ({ until, reason }: { until: string; reason: string }): NoticeWords => ({
		title: `Your account is paused until ${until}`,
		body: `You can read, and take away what is yours, but send nothing until then. The reason: ${reason}`,
		link: '/account'
	}),
	resumed: (_nothing: Readonly<Record<string, never>>): NoticeWords => ({
		title: 'Your account is no longer paused',
		body: 'An administrator has ended the pause of your account.',
		link: '/account'
	}),
	file_refused: ({ name, refusal }: { name: string; refusal: FileRefusal }): NoticeWords => ({
		title: `“${name}” was not kept`,
		body: filesText.refusals[refusal],
		link: '/account/files'
	})
} as const;

export type NoticeTemplate = keyof typeof NOTICE_TEMPLATES;
export type NoticeData<Template extends NoticeTemplate> = Parameters<
	(typeof NOTICE_TEMPLATES)[Template]
>[0];

/** Of which kind a notice is, and so how it comes by mail. */
export const KIND_OF: Readonly<Record<NoticeTemplate, NoticeKind>> = {
	role_changed: 'account',
	paused: 'account',
	resumed: 'account',
	file_refused: 'work'
};

/** The words of a notice. @param data as the template asked for it when the notice was given */
export const noticeWords = (template: NoticeTemplate, data: unknown): NoticeWords =>
	(NOTICE_TEMPLATES[template] as (data: unknown) => NoticeWords)(data);
