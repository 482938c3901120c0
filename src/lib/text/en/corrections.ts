/** Corrections of the tables: how they stand, and why something cannot be done with one. */
import type { CorrectionState, PartKind } from '../../types';

export const correctionsText = {
	states: {
		draft: 'being written',
		submitted: 'sent in',
		in_review: 'under review',
		question: 'question asked',
		accepted: 'accepted',
		declined: 'declined',
		withdrawn: 'taken back',
		superseded: 'overtaken'
	} satisfies Record<CorrectionState, string>,
	parts: {
		add_row: 'a row is added',
		change_row: 'a row is changed',
		retire_row: 'a row is retired',
		add_source: 'a source is added',
		correct_source: 'a source is corrected',
		repeat_source: 'a source is marked as repeating another',
		withdraw_source: 'a source is withdrawn',
		add_claim: 'a claim of completeness is added',
		change_claim: 'a claim of completeness is changed',
		retire_claim: 'a claim of completeness is retired'
	} satisfies Record<PartKind, string>,
	/** What is wrong with one part. */
	faults: {
		address: 'An address begins with https:// or http://.',
		quotation_long: 'Quote at most 400 characters; a photograph of the page can hold more.',
		years_order: 'The last year is before the first.',
		values: 'A fact does not have the form that this table asks for.',
		citation_elsewhere: 'A citation here belongs to another row.',
		same_as_today: 'That is what the tables say today.',
		already_there: 'The tables have an entry under this key. Change that one instead.',
		said_elsewhere: 'Another row says the same of the same cars. Add your source to that one.',
		not_there: 'The tables have no such entry any more.',
		other_table: 'A row stays in its table. Retire this one, and add another.',
		twice: 'Two parts of this correction speak of the same entry.',
		unknown_source: 'It cites a source that the tables do not have. Add the source as well.',
		repeats_itself: 'A source cannot repeat itself, by way of others neither.',
		still_repeated: 'Another source repeats this one. Withdraw that one as well, or correct it.',
		claim_from_memory: 'A claim of completeness rests on a work that lists every code.'
	},
	/** Why two moderators decide. */
	secondReader: {
		flips: 'It changes how a car tallies.',
		many: 'It changes more than 25 saved readings.',
		retires: 'It retires a row.',
		contested: 'Sources differ about the row.',
		own_car: 'It changes the reading of a car that its author has saved.'
	},
	refusals: {
		ended:
			'This correction is decided, and nothing more can be done with it. A new one can be made.',
		not_now: 'That cannot be done with this correction as it stands now. Look at it again.',
		not_yours: 'Only who wrote a correction can do that.',
		not_a_moderator: 'Only moderators decide on corrections.',
		own_correction: 'Nobody decides on their own correction.',
		decided_already: 'You have decided on this one. A second reader decides without knowing how.',
		needs_administrator: 'Two moderators differ. An administrator settles it.',
		read_by_another: 'Somebody else is reading this one. Take it once it is handed back.',
		empty: 'There is nothing in it to correct yet.',
		not_cited:
			'Each part needs what it rests on: a source with a place in it or an address, and a short quotation or a photograph. From memory can be said too.',
		parts_undecided: 'Say accepted or declined for every part.',
		reason_missing: 'A decline needs its reason, and what would change your mind.',
		not_due: 'The question can still be answered.'
	}
} as const;
