/** The inbox: what people are told, in the app and by mail as each of them wants it. */
export { digestKind, EVERY_MORNING } from './digest';
export { UnknownNoticeError } from './errors';
export { giveNotice, type Notice } from './give';
export { archiveNotice, noticesFor, openNotice, readAllNotices, type OwnNotice } from './mine';
export {
	lookAtUnsubscription,
	ownPreferences,
	setOwnPreferences,
	unsubscribe,
	type NoticePreferences
} from './preferences';
