/** Mail: queued in the transaction that causes it, sent by the worker. */
export {
	demoMailbox,
	keptMail,
	keptMails,
	UnknownMailError,
	type KeptMail,
	type KeptMailInFull
} from './mailbox';
export { RefusedMailError, smtpPost, type OutgoingMail, type Post } from './post';
export { queueMail, type Causing, type Mail } from './queue';
export { readUnsubscribeToken, type Unsubscription } from './unsubscribe';
export { unsentMails, type UnsentMail } from './unsent';
export { sendNext, type Sending, type Sent } from './send';
