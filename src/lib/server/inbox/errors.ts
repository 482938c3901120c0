import { inboxText } from '../../text/en/inbox';

/** There is no such notice, or it is somebody else's. */
export class UnknownNoticeError extends Error {
	readonly code = 'unknown_notice';
	override readonly name = 'UnknownNoticeError';
	constructor() {
		super(inboxText.unknown);
	}
}
