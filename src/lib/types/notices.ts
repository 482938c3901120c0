/**
 * Kinds of notices that somebody can choose how to get by mail.
 * - `account`: role, pause, and what else an administrator has changed about the account
 * - `work`: long work that has ended, or that could not be done
 */
export const NOTICE_KINDS = ['account', 'work'] as const;
export type NoticeKind = (typeof NOTICE_KINDS)[number];

/** How a kind of notice comes by mail: each at once, all of a day in one, or not at all. */
export const NOTICE_MAILS = ['each', 'digest', 'off'] as const;
export type NoticeMail = (typeof NOTICE_MAILS)[number];

/**
 * Kinds of mail. `access` was asked for to get in, or says that the way in has changed: it always
 * comes. The others are notices, and can be refused by kind.
 */
export const MAIL_KINDS = ['access', 'digest', ...NOTICE_KINDS] as const;
export type MailKind = (typeof MAIL_KINDS)[number];
