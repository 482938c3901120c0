import { type Letter, letterFrame } from './letter';

/** What a link of an access mail needs: whose it is, where it leads, how long it holds ("15 minutes"). */
export interface LinkData {
	readonly name: string | null;
	readonly link: string;
	readonly holds: string;
}
interface Named {
	readonly name: string | null;
}

const onceOnly = (holds: string) => `The link works once, and for ${holds}.`;
const NOT_YOU =
	'If this was not you, do nothing: without the link nobody gets in, and nothing changes.';

/** Mails that somebody asked for to get in, or that say that the way in has changed. */
export const accessLetters = {
	/** To a new address, after somebody has signed up with it. */
	confirm_address: ({ name, link, holds }: LinkData): Letter => ({
		subject: 'Confirm your address at Tallyplate',
		parts: [
			letterFrame.greeting(name),
			'Somebody has opened an account at Tallyplate with this address. If it was you, confirm it:',
			{ link, label: 'Confirm this address' },
			onceOnly(holds),
			'If it was not you, do nothing: an account that is not confirmed is thrown away.'
		]
	}),
	/** To an address that has an account already, after somebody has signed up with it again. */
	already_member: ({ name, link }: Named & { readonly link: string }): Letter => ({
		subject: 'You already have an account at Tallyplate',
		parts: [
			letterFrame.greeting(name),
			'Somebody has tried to open an account with this address, which has one already. If it was you, sign in instead; a sign-in link helps when the password is lost.',
			{ link, label: 'Sign in' },
			'If it was not you, do nothing.'
		]
	}),
	sign_in_link: ({ name, link, holds }: LinkData): Letter => ({
		subject: 'Your sign-in link for Tallyplate',
		parts: [
			letterFrame.greeting(name),
			'This link signs you in:',
			{ link, label: 'Sign in' },
			onceOnly(holds),
			NOT_YOU
		]
	}),
	reset_password: ({ name, link, holds }: LinkData): Letter => ({
		subject: 'Choose a new password for Tallyplate',
		parts: [
			letterFrame.greeting(name),
			'Somebody has asked for a new password for your account. If it was you, choose one here:',
			{ link, label: 'Choose a new password' },
			onceOnly(holds),
			NOT_YOU
		]
	}),
	/** To the new address. */
	confirm_new_address: ({ name, link, holds }: LinkData): Letter => ({
		subject: 'Confirm your new address at Tallyplate',
		parts: [
			letterFrame.greeting(name),
			'You have asked that your account at Tallyplate use this address from now on. Confirm it:',
			{ link, label: 'Use this address' },
			onceOnly(holds),
			'If it was not you, do nothing: the account keeps the address that it has.'
		]
	}),
	/** To the address that was left. */
	address_changed: ({ name, link }: Named & { readonly link: string }): Letter => ({
		subject: 'Your address at Tallyplate was changed',
		parts: [
			letterFrame.greeting(name),
			'Your account at Tallyplate uses another address from now on. This mail is the last one to the old address.',
			'If it was not you, somebody else is in your account. Answer this mail at once, or write to whoever runs this installation:',
			{ link, label: 'How to reach us' }
		]
	}),
	password_changed: ({ name, link }: Named & { readonly link: string }): Letter => ({
		subject: 'Your password at Tallyplate was changed',
		parts: [
			letterFrame.greeting(name),
			'The password of your account was changed, and everything else that was signed in has been signed out.',
			'If it was not you, choose a new password at once:',
			{ link, label: 'Choose a new password' }
		]
	}),
	second_factor_changed: ({
		name,
		on,
		link
	}: Named & { readonly on: boolean; readonly link: string }): Letter => ({
		subject: on
			? 'A second factor is asked for at Tallyplate from now on'
			: 'No second factor is asked for at Tallyplate any more',
		parts: [
			letterFrame.greeting(name),
			on
				? 'Signing in to your account asks for a code of your second factor from now on. Keep the recovery codes where you find them without your phone.'
				: 'Signing in to your account no longer asks for a code of a second factor.',
			'If it was not you, choose a new password at once:',
			{ link, label: 'Choose a new password' }
		]
	}),
	/** The last mail to somebody who has deleted the account. */
	account_deleted: ({ name }: Named): Letter => ({
		subject: 'Your account at Tallyplate is gone',
		parts: [
			letterFrame.greeting(name),
			'Your account was deleted as you asked: your name, your address, your cars and your private photographs are gone. Corrections that were accepted stay in the tables under “a former member”.'
		]
	})
} as const;
