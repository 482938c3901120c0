/** Words of the pages on which somebody gets an account, gets in, and keeps it. */
import { NAME_LENGTH, PASSWORD_LENGTH, type FaultTexts, type Role } from '../../types';

const LINK_HINT = 'It comes within a minute or two. Look among unwanted mail too.';

export const accountFaults: FaultTexts = {
	address: {
		missing: 'An address is missing.',
		not_one: 'This is not one mail address.',
		too_long: 'This is longer than any mail address.'
	},
	name: {
		missing: 'A name is missing.',
		too_short: `A name has ${NAME_LENGTH.least} characters or more.`,
		too_long: `A name has ${NAME_LENGTH.most} characters at most.`
	},
	password: {
		missing: 'The password is missing.',
		too_long: 'This is longer than any password here.',
		wrong_sign_in: 'Address and password do not belong together.',
		wrong_password: 'This is not the password of your account.'
	},
	new_password: {
		missing: 'A password is missing.',
		too_short: `A password has ${PASSWORD_LENGTH.least} characters or more.`,
		too_long: `A password has ${PASSWORD_LENGTH.most} characters at most.`
	},
	consent: { missing: 'Without this, nothing that you contribute could be kept.' },
	code: {
		missing: 'A code is missing.',
		not_one: 'A code has six figures; a recovery code has ten letters.',
		wrong_code: 'This code is not right, or was used before.'
	},
	sure: { missing: 'Say that you are sure.' },
	form: {
		factor_state: 'A second factor is in force already.',
		lapsed_link: 'This link was used before, or has lapsed. Have another one sent.',
		last_administrator:
			'You are the last administrator. Make somebody else one first: nobody would be left to do it.'
	}
};

const minutes = (wait: number): string => (wait === 1 ? 'a minute' : `${wait} minutes`);

export const accountsText = {
	roles: {
		member: 'member',
		moderator: 'moderator',
		administrator: 'administrator'
	} satisfies Record<Role, string>,
	formerMember: 'a former member',
	faults: {
		other: 'This cannot be taken as it stands.',
		tooOften: (wait: number) =>
			`That was tried too often. Try again in ${minutes(wait)}. What you typed stays here.`
	},
	fields: {
		name: 'Name',
		address: 'Mail address',
		password: 'Password',
		newPassword: 'New password',
		ownPassword: 'Your password',
		currentPassword: 'Present password',
		code: 'Code',
		show: 'Show',
		hide: 'Hide'
	},
	help: 'What is kept of you, and what becomes of it',
	passwordHint: `${PASSWORD_LENGTH.least} characters or more. Three or four words make a good one.`,
	lapsed: {
		title: 'This link has lapsed',
		body: 'A link works once and for a while. It was used before, or its time is over.'
	},
	signIn: {
		title: 'Sign in',
		intro:
			'Reading needs no account. One is for keeping cars and lists, and for putting rows right.',
		submit: 'Sign in',
		link: 'Have a sign-in link sent',
		reset: 'Choose a new password',
		signUp: 'Open an account',
		out: 'You are signed out.',
		changed: 'Your password is changed. Sign in with the new one.',
		demo: 'People of the demonstration',
		demoIntro:
			'All of them are invented. Choose one, and the form fills itself; then sign in as them.'
	},
	code: {
		title: 'One step more',
		intro:
			'Your account asks for a second factor. Type the six figures that your app shows, or one of your recovery codes.',
		submit: 'Go on',
		other: 'Sign in as somebody else'
	},
	link: {
		title: 'Sign in by mail',
		intro: 'We send a link to the address of your account. It signs you in without the password.',
		submit: 'Send the link',
		sentTitle: 'Look into your mail',
		sent: `If the address has an account, a link is on its way to it. It works once, for 15 minutes. ${LINK_HINT}`,
		openTitle: 'Sign in',
		open: 'The link is good. It works once, so it waits for your word.',
		openSubmit: 'Sign in now',
		again: 'Send another link',
		password: 'Sign in with a password'
	},
	signUp: {
		title: 'Open an account',
		intro:
			'An account is free. Nobody but the administrators sees your address; your name stands beside what you contribute.',
		nameHint: 'As it shall stand beside your corrections. It need not be your full name.',
		addressHint: 'We write to it, to see that it is yours. Your password is chosen after that.',
		consent: 'What I contribute may be used under CC BY-SA 4.0',
		consentHint:
			'Corrections, and the evidence that you add to them, become part of tables that are free for everybody. Your cars and private photographs do not.',
		submit: 'Send the confirmation',
		sentTitle: 'Look into your mail',
		sent: `We have written to the address. The link in the mail opens your account. It works once, for 24 hours. ${LINK_HINT}`,
		signIn: 'Sign in instead'
	},
	confirm: {
		title: 'Choose a password',
		intro: (name: string, address: string) =>
			`Welcome, ${name}. With a password the account for ${address} is open.`,
		submit: 'Open the account',
		again: 'Sign up again',
		moveTitle: 'Confirm your new address',
		move: (address: string) => `Your account uses ${address} from now on, once you say so.`,
		moveSubmit: 'Use this address',
		movedTitle: 'Your address is changed',
		moved: 'Sign in with the new address from now on. We have written to the old one.',
		toAccount: 'To your account'
	},
	reset: {
		title: 'Choose a new password',
		intro:
			'We send a link to the address of your account. With it you choose a new password; everything that is signed in is signed out.',
		submit: 'Send the link',
		sentTitle: 'Look into your mail',
		sent: `If the address has an account, a link is on its way to it. It works once, for 30 minutes. ${LINK_HINT}`,
		chooseIntro: 'Everything that is signed in is signed out with it.',
		chooseSubmit: 'Change the password',
		again: 'Send another link',
		signIn: 'Sign in'
	},
	signOut: {
		title: 'Sign out',
		intro: 'The session of this browser ends.',
		submit: 'Sign out'
	},
	menu: {
		label: 'Account',
		signIn: 'Sign in',
		account: 'Your account',
		people: 'People',
		audit: 'Audit trail',
		signOut: 'Sign out',
		needsFactor: 'Second factor needed'
	},
	demoLabel: 'Demonstration',
	demo: 'Demonstration: its people are invented, and no mail leaves this machine.',
	demoMailbox: 'Read the mail'
} as const;
