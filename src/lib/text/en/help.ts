/** Words around the help texts, which stand in src/lib/help. */
import type { Outcome, Strength } from '../../types';

export const helpText = {
	title: 'Help',
	intro:
		'For whoever stands before a car with a plate, and for whoever has to trust what was read.',
	all: 'All help pages',
	missing: (slug: string): string => `There is no help page “${slug}”.`,
	more: 'More help',
	unread: 'unread',
	outcomes: {
		found: {
			name: 'Found',
			text: 'A row, or the layout itself, says what the characters mean. The mark says how well that is supported.'
		},
		contested: {
			name: 'Contested',
			text: 'Sources differ. Every value is shown over its own source, and none is preferred.'
		},
		not_listed: {
			name: 'Not listed',
			text: 'We have no row for it. That says nothing against the car.'
		},
		not_used: {
			name: 'Not used',
			text: 'A named source lists every code of this scope, and this one is not among them.'
		},
		illegible: {
			name: 'Cannot be read',
			text: 'A character that decides is unread. What it could be is listed.'
		}
	} satisfies Record<Outcome, { name: string; text: string }>,
	strengths: {
		firm: 'Rests on factory paper, law or standard, or on two independent works of which one is a book or club research.',
		fair: 'Rests on one book, club research or magazine, on two independent works, or on three cars seen.',
		thin: 'Rests on one web page, on practice, on memory, or on fewer cars.',
		contested: 'Two rows say different things of one code, each with a source.',
		not_rated: 'Derived from others, or resting on nothing yet.'
	} satisfies Record<Strength, string>,
	noRow: 'No row: there is nothing to rate.'
} as const;
