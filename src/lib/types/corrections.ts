import { z } from 'zod';

/** Where a correction stands. The last four are ends. */
export const CORRECTION_STATES = [
	'draft',
	'submitted',
	'in_review',
	'question',
	'accepted',
	'declined',
	'withdrawn',
	'superseded'
] as const;
export const correctionStateSchema = z.enum(CORRECTION_STATES);
export type CorrectionState = z.infer<typeof correctionStateSchema>;

export const ENDS: readonly CorrectionState[] = ['accepted', 'declined', 'withdrawn', 'superseded'];

/** What a moderator says of one part. */
export const VERDICTS = ['accepted', 'declined'] as const;
export const verdictSchema = z.enum(VERDICTS);
export type Verdict = z.infer<typeof verdictSchema>;

/** One moderator's word on every part, in the order of the parts. */
export interface Decision {
	readonly by: string;
	readonly verdicts: readonly Verdict[];
	/** Why, where a part is declined, and what would change the decider's mind; empty where none is. */
	readonly reason: string;
	readonly would_change: string;
}

/** What the states of a correction depend on; its content stands beside it. */
export interface CorrectionProgress {
	readonly state: CorrectionState;
	readonly author: string;
	/** How many parts it has. */
	readonly parts: number;
	/** Whether every part cites what it rests on, or says that it is from memory. */
	readonly cited: boolean;
	/** Moderators who have to agree. */
	readonly readers: 1 | 2;
	/** Who is reading it; null for nobody. */
	readonly reader: string | null;
	readonly decisions: readonly Decision[];
	/** When the question that is open was asked, ISO 8601; null for none. */
	readonly asked_at: string | null;
}

/** Somebody who acts on a correction. */
export interface CorrectionActor {
	readonly id: string;
	readonly role: 'member' | 'moderator' | 'administrator';
}

/** What can be done with a correction. `lapse` and `overtake` are done by nobody. */
export type CorrectionAction =
	| {
			readonly do: 'send' | 'withdraw' | 'take' | 'hand_back' | 'answer';
			readonly by: CorrectionActor;
	  }
	| { readonly do: 'ask'; readonly by: CorrectionActor; readonly at: string }
	| ({ readonly do: 'decide'; readonly by: CorrectionActor } & Omit<Decision, 'by'>)
	| { readonly do: 'lapse'; readonly at: string }
	| { readonly do: 'overtake' };
