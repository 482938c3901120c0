import Credentials from '@auth/core/providers/credentials';
import type { EmailConfig } from '@auth/core/providers/email';
import type { RequestEvent } from '@sveltejs/kit';
import { factorCodeSchema, mailAddressSchema, typedPasswordSchema } from '../../types';
import {
	installationSecret,
	LINKS,
	newSecret,
	sendSignInLink,
	signInByCode,
	signInByPassword,
	WrongCodeError,
	WrongSignInError
} from '../accounts';
import { ground } from '../ground';
import { log } from '../log';
import { cookieName } from './cookie';

/** Who got in, and how, as a provider hands it on. */
export interface Entered {
	readonly id: string;
	readonly way: string;
	readonly codeGiven: boolean;
}

/** Address and password. Null is the library's word for "not right". */
export const passwordProvider = (event: RequestEvent) =>
	Credentials({
		id: 'password',
		async authorize(given): Promise<Entered | null> {
			const address = mailAddressSchema.safeParse(given.address);
			const password = typedPasswordSchema.safeParse(given.password);
			if (!address.success || !password.success) return null;
			try {
				const { user_id } = await signInByPassword(ground(), {
					address: address.data,
					password: password.data,
					from: event.getClientAddress()
				});
				return { id: user_id, way: 'password', codeGiven: false };
			} catch (error) {
				if (error instanceof WrongSignInError) return null;
				throw error;
			}
		}
	});

/** The code of a second factor, after a first step that left its cookie. */
export const codeProvider = (event: RequestEvent) =>
	Credentials({
		id: 'code',
		async authorize(given): Promise<Entered | null> {
			const code = factorCodeSchema.safeParse(given.code);
			if (!code.success) return null;
			try {
				const cookie = event.cookies.get(cookieName());
				const { user_id, way } = await signInByCode(ground(), cookie, code.data);
				return { id: user_id, way, codeGiven: true };
			} catch (error) {
				if (error instanceof WrongCodeError) return null;
				throw error;
			}
		}
	});

/** A link by mail. */
export const linkProvider = (): EmailConfig => ({
	id: 'link',
	type: 'email',
	name: 'link',
	maxAge: LINKS.sign_in.minutes * 60,
	secret: installationSecret(),
	options: {},
	generateVerificationToken: newSecret,
	normalizeIdentifier: (address) => mailAddressSchema.parse(address),
	async sendVerificationRequest({ identifier, token }) {
		try {
			await sendSignInLink(ground(), identifier, token);
		} catch (error) {
			// The library does not wait for this before others may fail: a rejection would end the process.
			log().error({ err: error }, 'a sign-in link was not queued');
		}
	}
});
