import { NOTICE_KINDS, type FaultTexts, type NoticeKind, type NoticeMail } from '../../types';

/** The inbox: its pages, and the page behind the link in a mail. */
export const inboxText = {
	title: 'Inbox',
	archiveTitle: 'Archive',
	unknown: 'There is no such notice in your inbox.',
	/** The entry in the menu of who is signed in. */
	menu: (unread: number) => (unread === 0 ? 'Inbox' : `Inbox, ${unread} unread`),
	/** Behind the number in the head of each page. */
	unreadWord: 'unread',
	nothing: 'Nothing in your inbox',
	nothingBody:
		'What concerns your account and your work comes here. What you have seen and put away is in the archive.',
	nothingArchived: 'Nothing in your archive',
	nothingArchivedBody: 'What you put away from the inbox stays here for a year.',
	new: 'new',
	open: 'Open',
	openNamed: (title: string) => `Open: ${title}`,
	moveNamed: (what: string, title: string) => `${what}: ${title}`,
	archive: 'Put away',
	back: 'Back to the inbox',
	readAll: 'Mark all as read',
	views: {
		label: 'Views of the inbox',
		inbox: { name: 'Inbox', address: '/inbox' },
		archive: { name: 'Archive', address: '/inbox/archive' },
		preferences: { name: 'By mail', address: '/inbox/preferences' }
	},
	kinds: {
		account: 'Your account',
		work: 'Your work'
	} satisfies Record<NoticeKind, string>,
	kindsInFull: {
		account: 'Your account: role, pause, and what else an administrator has changed about it',
		work: 'Your work: files and lists that could not be done'
	} satisfies Record<NoticeKind, string>,
	preferences: {
		title: 'Notices by mail',
		intro:
			'Every notice stands in your inbox. Choose which of them come by mail too. Mails that let you in, or say that the way in has changed, always come.',
		mails: {
			each: 'Each at once',
			digest: 'All of a day in one mail',
			off: 'Not by mail'
		} satisfies Record<NoticeMail, string>,
		digestNote: 'The daily mail leaves at seven in the morning, UTC, if there is something new.',
		save: 'Save',
		saved: 'Saved.'
	},
	unsubscribe: {
		title: 'No more mails of this kind',
		question: {
			account: 'You will get no more mails about what an administrator changes about your account.',
			work: 'You will get no more mails about your work.',
			digest: 'You will get no more daily mails.'
		} satisfies Record<NoticeKind | 'digest', string>,
		stays: 'The notices still stand in your inbox. You can choose anew there at any time.',
		confirm: 'Send me no more of them',
		done: 'You will get no more mails of this kind.',
		preferences: { name: 'All notices by mail', address: '/inbox/preferences' },
		broken:
			'This link is not whole. Copy it from the mail once more, or sign in and choose in your inbox.'
	}
} as const;

/** Sentences beside each kind of notice, by the code of what went wrong. */
export const preferenceFaults: FaultTexts = Object.fromEntries(
	NOTICE_KINDS.map((kind) => [kind, { unknown: 'Choose one of the three.' }])
);
