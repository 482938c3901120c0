import { SvelteKitAuth, type SvelteKitAuthConfig } from '@auth/sveltekit';
import type { JWT } from '@auth/core/jwt';
import type { RequestEvent } from '@sveltejs/kit';
import {
	deviceOf,
	installationSecret,
	openSession,
	readSessionToken,
	SESSION_DAYS,
	signInUser,
	writeSessionToken
} from '../accounts';
import { ground } from '../ground';
import { log } from '../log';
import { linkAdapter } from './adapter';
import { cookieName, cookieOptions, isSecure } from './cookie';
import { codeProvider, linkProvider, passwordProvider, type Entered } from './providers';

const SECONDS_A_DAY = 86_400;

/** Where a visitor hears of a link: that it was sent, and that it has lapsed. */
export const LINK_PAGE = '/signin/link';
export const LINK_SENT = `${LINK_PAGE}?sent=yes`;
export const LINK_LAPSED = `${LINK_PAGE}?lapsed=yes`;

const jwt: SvelteKitAuthConfig['jwt'] = {
	/** The token carries the secret of a session's row, and nothing about the person. */
	encode: ({ token }) => {
		const expires = Math.floor(ground().clock().getTime() / 1000) + SESSION_DAYS * SECONDS_A_DAY;
		return writeSessionToken(installationSecret(), String(token?.sid), expires);
	},
	decode: ({ token = '' }): JWT | null => {
		const sid = readSessionToken(installationSecret(), token, ground().clock());
		return sid === null ? null : { sid };
	}
};

/** A fresh session for who has just got in; the one that the browser came with ends. */
async function sessionFor(event: RequestEvent, entered: Partial<Entered>): Promise<JWT> {
	if (entered.id === undefined) throw new Error('Nobody was named who got in.');
	const sid = await openSession(ground(), {
		user_id: entered.id,
		way: entered.way ?? 'link',
		device: deviceOf(event.request.headers.get('user-agent')),
		codeGiven: entered.codeGiven ?? false,
		before: event.cookies.get(cookieName())
	});
	return { sid };
}

function configFor(event: RequestEvent): SvelteKitAuthConfig {
	return {
		secret: installationSecret(),
		trustHost: true,
		useSecureCookies: isSecure(),
		providers: [passwordProvider(event), codeProvider(event), linkProvider()],
		adapter: linkAdapter,
		session: { strategy: 'jwt', maxAge: SESSION_DAYS * SECONDS_A_DAY },
		jwt,
		cookies: { sessionToken: { name: cookieName(), options: cookieOptions() } },
		pages: { signIn: '/signin', error: LINK_PAGE, verifyRequest: LINK_PAGE },
		callbacks: {
			/** By link, only who has an account; an unknown address goes where a known one goes. */
			async signIn({ account, user, email }) {
				if (account?.provider !== 'link') return true;
				if ((await signInUser(ground(), user.email ?? '')) !== null) return true;
				return email?.verificationRequest ? LINK_SENT : LINK_LAPSED;
			},
			jwt: ({ token, user }) => (user ? sessionFor(event, user) : token)
		},
		logger: {
			error: (error) => log().debug({ err: error }, 'sign-in'),
			warn: (code) => log().debug({ code }, 'sign-in'),
			debug: () => undefined
		}
	};
}

/** The library, told about each request anew: sessions know the browser that they are opened for. */
export const auth = SvelteKitAuth(async (event) => configFor(event));
