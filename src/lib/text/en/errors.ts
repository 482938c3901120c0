/** What a page says when it cannot be shown. */
export const errorText = {
	missing: {
		title: 'No such page',
		body: 'The address may be mistyped, or what it named is not in this installation. A row or an edition that is gone from the tables keeps its address, so a slip in copying is more likely.',
		offers: [
			{ name: 'Read a stamp', address: '/' },
			{ name: 'Look through the tables', address: '/tables' },
			{ name: 'Help', address: '/help' }
		]
	},
	refused: {
		title: 'This address cannot be read',
		offer: 'Begin again'
	},
	busy: {
		title: 'Busy for a moment',
		body: 'What you asked for is being prepared, or too much is asked at once. Try again in a few seconds.'
	},
	away: {
		title: 'Part of the workshop is closed',
		body: 'This page needs the database, and the database does not answer. Reading goes on without it.',
		offer: 'Read a stamp'
	},
	broken: {
		title: 'Something broke here',
		body: 'It is our fault and not yours, and it is on record. What you typed is still in the address; going back and trying again may work.',
		offer: 'Read a stamp'
	},
	/** By the code of what was foreseen; the message of the error stands under the title where there is no body. */
	codes: {
		sign_in_needed: {
			title: 'Sign in first',
			body: 'What you asked for belongs to an account.',
			offers: [{ name: 'Sign in', address: '/signin' }]
		},
		not_allowed: {
			title: 'Not for this account',
			body: 'What you asked for needs a role that your account does not have.',
			offers: [{ name: 'Your account', address: '/account' }]
		},
		second_factor_needed: {
			title: 'A second factor is needed',
			body: 'Your role counts once signing in asks for a code beside the password.',
			offers: [{ name: 'Add a second factor', address: '/account/second-factor' }]
		},
		paused: {
			title: 'This account is paused',
			body: 'You can read, and take away what is yours. Until when, and why, stands on the page of your account.',
			offers: [{ name: 'Your account', address: '/account' }]
		},
		too_often: {
			title: 'Too often for now',
			body: 'That was tried too often from here. Wait some minutes before you try again.',
			offers: []
		}
	} as Readonly<
		Record<
			string,
			{
				readonly title: string;
				readonly body: string;
				readonly offers: readonly { readonly name: string; readonly address: string }[];
			}
		>
	>,
	foreign: 'What changes something here has to come from our own pages.',
	id: 'Error',
	idNote: 'Name this number when you report it.',
	again: 'Try again'
} as const;
