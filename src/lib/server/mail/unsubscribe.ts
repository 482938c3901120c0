import type { NoticeKind } from '../../types';
import { isSignature, signatureOf } from '../signature';

/** Whose mails of which kind. `digest` is all kinds that come in the daily mail. */
export interface Unsubscription {
	readonly user_id: string;
	readonly kind: NoticeKind | 'digest';
}

const PURPOSE = 'unsubscribe';

/** The word that lets whoever holds the mail, and nobody else, ask for no more of its kind. It does not expire. */
export function unsubscribeToken(secret: string, { user_id, kind }: Unsubscription): string {
	const what = `${kind}.${user_id}`;
	return `${what}.${signatureOf(secret, PURPOSE, what)}`;
}

/** What a word asks for; null when it is none of ours. */
export function readUnsubscribeToken(secret: string, token: string): Unsubscription | null {
	const [kind, user_id, signature, ...more] = token.split('.');
	if (!kind || !user_id || !signature || more.length > 0) return null;
	if (!isSignature(secret, PURPOSE, `${kind}.${user_id}`, signature)) return null;
	return { user_id, kind: kind as Unsubscription['kind'] };
}
