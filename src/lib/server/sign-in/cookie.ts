import { config } from '../config';

/** Whether visitors come by https. */
export const isSecure = (): boolean => config().origin.startsWith('https:');

/**
 * The name of the cookie that carries a session. With https it is bound to this very host, so that no other host of
 * the same domain can plant one.
 */
export const cookieName = (): string =>
	isSecure() ? '__Host-tallyplate-session' : 'tallyplate-session';

export const cookieOptions = () => ({
	httpOnly: true,
	sameSite: 'lax' as const,
	path: '/',
	secure: isSecure()
});
