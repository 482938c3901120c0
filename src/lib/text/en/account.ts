/** Words of the pages of one's own account. */
export const accountText = {
	title: 'Your account',
	saved: {
		name: 'Your name is changed.',
		address: 'We have written to the new address. Nothing changes until its link is opened.',
		password: 'Your password is changed. Every other session has ended.',
		session: 'The session has ended.',
		factor: 'The second factor is removed.'
	},
	standingWithArea: (role: string, since: string, areas: string) =>
		`You are a ${role} for ${areas}. Your account is from ${since}.`,
	standingPlain: (role: string, since: string) =>
		`You are ${role === 'administrator' ? 'an' : 'a'} ${role}. Your account is from ${since}.`,
	standingOf: (role: string, since: string) =>
		`${role.slice(0, 1).toUpperCase()}${role.slice(1)}. Account from ${since}.`,
	consent: (license: string, date: string) =>
		`What you contribute is under ${license}, as you agreed on ${date}.`,
	paused: (until: string, reason: string) =>
		`Your account is paused until ${until}. You can read, and take away what is yours. The reason: ${reason}`,
	needsFactor: (role: string) =>
		`As ${role === 'administrator' ? 'an' : 'a'} ${role} you need a second factor. Until then you have the rights of a member.`,
	name: {
		title: 'Name',
		hint: 'It stands beside what you have contributed, from before too.',
		submit: 'Change the name'
	},
	address: {
		title: 'Mail address',
		present: (address: string) =>
			`Your address is ${address}. Nobody but the administrators sees it.`,
		field: 'New mail address',
		hint: 'We write to both addresses. The new one counts once its link is opened.',
		submit: 'Change the address'
	},
	password: { title: 'Password', submit: 'Change the password' },
	factor: {
		title: 'Second factor',
		off: 'Signing in asks for your password alone. An app on your phone can make codes that it asks for too.',
		on: (since: string, left: number) =>
			`Signing in asks for a code, since ${since}. ${left === 1 ? 'One recovery code is' : `${left} recovery codes are`} left.`,
		add: 'Add a second factor',
		change: 'Change the second factor',
		steps: [
			'Open an app for codes on your phone, and let it photograph the square.',
			'Type the six figures that it shows.'
		],
		qr: 'Square code for your app. The secret stands below it, to be typed.',
		secret: 'Or type this into the app',
		codeHint: 'Six figures. They change every half minute.',
		submit: 'Put it in force',
		codesTitle: 'Your recovery codes',
		codes:
			'Each stands in for a code of your app, once. Print them, or copy them to a safe place: they are shown this once.',
		codesDone: 'I have them',
		renew: 'New recovery codes',
		renewNote: 'The codes that you have now are worth nothing afterwards.',
		remove: 'Remove the second factor',
		removeNote: 'Signing in asks for your password alone from then on.',
		codeOfApp: 'Code of your app, or a recovery code'
	},
	sessions: {
		title: 'Where you are signed in',
		here: 'this browser',
		ways: { password: 'by password', link: 'by link' } as Readonly<Record<string, string>>,
		since: (date: string) => `since ${date}`,
		seen: (date: string) => `last used ${date}`,
		end: 'Sign out',
		endNamed: (device: string, since: string) => `Sign out ${device}, since ${since}`,
		all: 'Sign out everywhere',
		allNote: 'This browser too.'
	},
	data: {
		title: 'Your data',
		intro: 'Everything that is kept about you, as one file of JSON.',
		export: 'Take a copy of your data',
		help: 'What is kept, and what becomes of it',
		remove: 'Delete your account'
	},
	remove: {
		title: 'Delete your account',
		goesTitle: 'What goes, at once and for good',
		goes: [
			'your name and your mail address',
			'your cars, lists and saved readings',
			'your private photographs and files',
			'your sessions, your password and your second factor'
		],
		staysTitle: 'What stays',
		stays: [
			'corrections that you have sent in, with their evidence, under “a former member”',
			'entries of the audit trail, which name a number and not you'
		],
		copy: 'Take a copy first',
		sure: 'I am sure. Nobody can bring it back.',
		submit: 'Delete the account',
		keep: 'Keep it',
		goneTitle: 'Your account is gone',
		gone: 'We have sent one last mail, to say so. Reading goes on without an account.',
		read: 'Read a stamp'
	}
} as const;
