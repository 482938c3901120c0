import { AuthError, CredentialsSignin } from '@auth/sveltekit';
import type { Cookies, RequestEvent } from '@sveltejs/kit';
import {
	endByCookie,
	inSteadyTime,
	takeLinkRequest,
	WrongCodeError,
	WrongSignInError
} from '../accounts';
import { ground } from '../ground';
import { auth } from './auth';
import { cookieName } from './cookie';

/** What a request has to bring along for the library: nothing of what it says about itself. */
const CARRIED = ['cookie', 'user-agent'] as const;

/** Cookies of which the library sets none but the session's: where to go is no business of its. */
const sessionOnly = (cookies: Cookies): Cookies => ({
	...cookies,
	set: (name, value, options) => {
		if (name === cookieName()) cookies.set(name, value, options);
	}
});

/** The request of an action in the form that the library reads. */
function asked(event: RequestEvent, fields: Readonly<Record<string, string>>): RequestEvent {
	const headers = new Headers();
	for (const name of CARRIED) {
		const value = event.request.headers.get(name);
		if (value !== null) headers.set(name, value);
	}
	// Where to go afterwards is decided by the page: the library would go by its own name for this host.
	const body = new URLSearchParams({ ...fields, redirectTo: '/', redirect: '' });
	return {
		...event,
		cookies: sessionOnly(event.cookies),
		request: new Request(event.url, { method: 'POST', headers, body })
	};
}

/** What the library met, out of its wrappings. */
function causeOf(error: unknown): unknown {
	let cause = error;
	while (cause instanceof AuthError && cause.cause?.err instanceof Error) cause = cause.cause.err;
	return cause;
}

async function enter(
	event: RequestEvent,
	fields: Readonly<Record<string, string>>,
	refused: () => Error
): Promise<void> {
	try {
		await auth.signIn(asked(event, fields));
	} catch (error) {
		throw error instanceof CredentialsSignin ? refused() : causeOf(error);
	}
}

/**
 * Signs in with address and password: the answer carries the cookie of a new session.
 * @throws {WrongSignInError} @throws {TooOftenError} @throws {DatabaseAwayError}
 */
export const enterByPassword = (
	event: RequestEvent,
	{ address, password }: { address: string; password: string }
): Promise<void> =>
	enter(event, { providerId: 'password', address, password }, () => new WrongSignInError());

/** The second step, where a second factor is in force. @throws {WrongCodeError} @throws {TooOftenError} */
export const enterByCode = (event: RequestEvent, code: string): Promise<void> =>
	enter(event, { providerId: 'code', code }, () => new WrongCodeError());

/**
 * Has a sign-in link sent, where the address has an account. Nobody is told whether, neither by the answer nor
 * by its time.
 * @param address as `mailAddressSchema` gives it
 * @throws {TooOftenError} @throws {DatabaseAwayError}
 */
export const askForLink = (event: RequestEvent, address: string): Promise<void> =>
	inSteadyTime(async () => {
		await takeLinkRequest(ground(), event.getClientAddress());
		await enter(event, { providerId: 'link', email: address }, () => new WrongSignInError());
	});

/** Signs out: the session ends at once, whoever has its cookie. */
export async function leave(event: RequestEvent): Promise<void> {
	const cookie = event.cookies.get(cookieName());
	if (cookie !== undefined) await endByCookie(ground(), cookie);
	await auth.signOut(asked(event, {}));
}
