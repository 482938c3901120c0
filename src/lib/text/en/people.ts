import type { FaultTexts } from '../../types';
import { counted } from './counts';

/** Words of the pages on which administrators see and change people. */
export const peopleText = {
	title: 'People',
	intro: 'Everybody who has an account.',
	find: {
		text: 'Name or address',
		role: 'Role',
		allRoles: 'All roles',
		paused: 'Paused only',
		show: 'Show'
	},
	count: (total: number) =>
		total === 1 ? 'One person' : `${total.toLocaleString('en-US')} people`,
	nothing: 'Nobody is found.',
	all: 'Show everybody',
	heads: {
		name: 'Name',
		address: 'Mail address',
		role: 'Role',
		areas: 'For',
		since: 'Account from',
		state: 'State'
	},
	pausedUntil: (date: string) => `paused until ${date}`,
	demo: 'demonstration',
	person: {
		back: 'People',
		saved: {
			role: 'The role is changed.',
			pause: 'The pause is set.',
			resumed: 'The pause has ended.',
			sessions: 'Signed out.'
		},
		role: 'Role',
		rolesHint: 'It counts from their next request on.',
		areas: 'Divisions that a moderator decides for',
		submitRole: 'Change the role',
		pause: 'Pause',
		pauseNote:
			'Somebody who is paused reads, and takes away what is theirs, and writes nothing. It ends by itself.',
		until: 'Until the end of',
		reason: 'Reason',
		reasonHint: 'They see it, and it stays on record. Name nobody in it.',
		submitPause: 'Pause until then',
		paused: (date: string, reason: string) => `Paused until ${date}: ${reason}`,
		resume: 'End the pause now',
		sessions: 'Sessions',
		noSessions: 'Signed in nowhere.',
		end: 'Sign out',
		endNamed: (device: string, since: string) => `Sign out ${device}, since ${since}`,
		endAll: 'Sign out everywhere',
		record: 'On record',
		own: 'This is your own account: another administrator decides about it.'
	},
	mail: {
		title: 'Mail in trouble',
		intro:
			'What did not go out, with what the mail server said. It is tried again for about a day, later each time, and then given up.',
		heads: { to: 'To', subject: 'Subject', why: 'Why', state: 'Next' },
		tries: (n: number) => `${counted(n, 'try', 'tries')}, first on`,
		next: (moment: string) => `again on ${moment}`,
		givenUp: 'given up',
		nothing: 'All mail has gone out',
		nothingBody: 'Nothing waits to be tried again, and nothing was given up within thirty days.'
	},
	audit: {
		title: 'Audit trail',
		intro:
			'What was done to accounts, and by whom. Nothing here can be changed: each entry carries the hash of the one before.',
		heads: { number: 'No.', at: 'When', who: 'Who', what: 'What', whom: 'Whom' },
		product: 'the console',
		older: 'Older entries',
		newest: 'Newest entries',
		nothing: 'Nothing is on record yet.'
	},
	deeds: {
		'person.joined': () => 'opened an account',
		'person.left': () => 'deleted the account',
		'person.password_changed': () => 'changed the password',
		'person.address_changed': () => 'changed the mail address',
		'person.second_factor_added': () => 'added a second factor',
		'person.second_factor_removed': () => 'removed the second factor',
		'person.role_changed': ({ from, to, areas_to }) => {
			const areas = Array.isArray(areas_to) ? areas_to.join(', ') : '';
			if (from === to) return `changed the divisions of a ${to} to ${areas || 'none'}`;
			return `changed the role from ${from} to ${to}${areas && ` for ${areas}`}`;
		},
		'person.paused': ({ until, reason }) => `paused until ${String(until).slice(0, 10)}: ${reason}`,
		'person.resumed': () => 'ended the pause',
		'person.sessions_ended': ({ sessions }) =>
			sessions === 1 ? 'signed out of one session' : `signed out of ${sessions} sessions`
	} as Readonly<Record<string, (detail: Readonly<Record<string, unknown>>) => string>>
} as const;

/** What is wrong with a field, by field and code; `form` is the form as a whole. */
export const peopleFaults: FaultTexts = {
	role: { missing: 'Choose a role.' },
	until: {
		missing: 'A date is missing.',
		not_one: 'This is not a date.',
		past: 'This day has passed.',
		too_far: 'A pause lasts a year at most.'
	},
	reason: {
		missing: 'A reason is missing.',
		too_short: 'A reason has ten characters or more.',
		too_long: 'A reason has 300 characters at most.'
	},
	form: {
		changed_meanwhile:
			'Another administrator has changed this person meanwhile. What stands here now is theirs; look again before you change it.',
		last_administrator: 'This is the last administrator. Make somebody else one first.',
		own_account: 'Nobody decides about their own account.'
	}
};
