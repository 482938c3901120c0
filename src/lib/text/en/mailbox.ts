/** The page that shows what a demonstration would have sent. */
export const mailboxText = {
	title: 'Mailbox',
	intro:
		'This installation is a demonstration: its mail goes nowhere. Here is what would have been sent, to everybody, newest first.',
	nothing: 'No mail yet',
	nothingBody:
		'Sign up, or ask for a sign-in link: what would be sent to you is here a second later.',
	nothingOffer: { name: 'Sign in', address: '/signin' },
	heads: { subject: 'Subject', to: 'To', at: 'Sent' },
	noSubject: 'no subject',
	all: 'All mail',
	from: 'From',
	to: 'To',
	at: 'Sent',
	unsubscribe: 'Unsubscribe from',
	text: 'As plain text',
	html: 'As formatted mail',
	htmlNote: 'Set apart: nothing in it runs or loads. Follow links from the plain text.'
} as const;
