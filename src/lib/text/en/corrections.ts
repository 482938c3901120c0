/** Corrections of the tables: how they stand, and why something cannot be done with one. */
import type { CorrectionState } from '../../types';

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
