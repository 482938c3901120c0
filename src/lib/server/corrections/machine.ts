/**
 * The states of a correction and what leads from one to the next. Pure, and the only place where a state is given: nobody
 * decides on their own, silence never accepts, and a correction is accepted when every part is decided by as many
 * moderators as it needs and one part or more is accepted.
 */
import {
	ENDS,
	type CorrectionAction,
	type CorrectionActor,
	type CorrectionProgress,
	type CorrectionState,
	type Decision,
	type Verdict
} from '../../types';
import { CorrectionRefusedError, type RefusalCode } from './errors';

/** A question waits so long for an answer before the correction is declined. */
export const HOURS_TO_ANSWER = 72;

/** From which states an action may be done. */
const FROM: Readonly<Record<CorrectionAction['do'], readonly CorrectionState[]>> = {
	send: ['draft'],
	withdraw: ['draft', 'submitted', 'in_review', 'question'],
	take: ['submitted'],
	hand_back: ['in_review'],
	ask: ['in_review'],
	answer: ['question'],
	decide: ['in_review'],
	lapse: ['question'],
	overtake: ['draft', 'submitted', 'in_review', 'question']
};

function refuse(code: RefusalCode): never {
	throw new CorrectionRefusedError(code);
}

const isAuthor = ({ author }: CorrectionProgress, { id }: CorrectionActor): boolean =>
	author === id;

function asAuthor(progress: CorrectionProgress, actor: CorrectionActor): void {
	if (!isAuthor(progress, actor)) refuse('not_yours');
}

/** Moderators and administrators, of corrections that are not their own and on which they have not decided. */
function asReader(progress: CorrectionProgress, actor: CorrectionActor): void {
	if (actor.role === 'member') refuse('not_a_moderator');
	if (isAuthor(progress, actor)) refuse('own_correction');
	if (progress.decisions.some(({ by }) => by === actor.id)) refuse('decided_already');
	// Two who differ are settled by an administrator.
	if (progress.decisions.length >= 2 && actor.role !== 'administrator')
		refuse('needs_administrator');
}

function asTheReader(progress: CorrectionProgress, actor: CorrectionActor): void {
	if (progress.reader !== actor.id) refuse('read_by_another');
	asReader(progress, actor);
}

/** What the decisions come to for one part; null while moderators are missing or differ. */
function verdictOf(decisions: readonly Decision[], part: number, readers: 1 | 2): Verdict | null {
	const said = decisions.map(({ verdicts }) => verdicts[part] as Verdict);
	const accepted = said.filter((verdict) => verdict === 'accepted').length;
	if (accepted >= readers) return 'accepted';
	return said.length - accepted >= readers ? 'declined' : null;
}

/** Every part with its verdict; null where it is open. */
export const verdictsOf = ({
	decisions,
	parts,
	readers
}: Pick<CorrectionProgress, 'decisions' | 'parts' | 'readers'>): (Verdict | null)[] =>
	Array.from({ length: parts }, (_, part) => verdictOf(decisions, part, readers));

function decided(progress: CorrectionProgress, decision: Decision): CorrectionProgress {
	if (decision.verdicts.length !== progress.parts) refuse('parts_undecided');
	const declines = decision.verdicts.includes('declined');
	if (declines && (decision.reason.trim() === '' || decision.would_change.trim() === ''))
		refuse('reason_missing');
	const next = { ...progress, reader: null, decisions: [...progress.decisions, decision] };
	const verdicts = verdictsOf(next);
	if (verdicts.includes(null)) return { ...next, state: 'submitted' };
	return { ...next, state: verdicts.includes('accepted') ? 'accepted' : 'declined' };
}

const HOUR_MS = 3_600_000;
const isOverdue = (asked: string | null, at: string): boolean =>
	asked !== null && Date.parse(at) - Date.parse(asked) >= HOURS_TO_ANSWER * HOUR_MS;

/**
 * What a correction is after an action.
 * @throws {CorrectionRefusedError} the action is not open to that person, or not from this state; nothing has changed
 */
export function after(progress: CorrectionProgress, action: CorrectionAction): CorrectionProgress {
	if (ENDS.includes(progress.state)) refuse('ended');
	if (!FROM[action.do].includes(progress.state)) refuse('not_now');
	switch (action.do) {
		case 'send':
			asAuthor(progress, action.by);
			if (progress.parts === 0) refuse('empty');
			if (!progress.cited) refuse('not_cited');
			return { ...progress, state: 'submitted' };
		case 'withdraw':
			asAuthor(progress, action.by);
			return { ...progress, state: 'withdrawn', reader: null, asked_at: null };
		case 'take':
			asReader(progress, action.by);
			return { ...progress, state: 'in_review', reader: action.by.id };
		case 'hand_back':
			asTheReader(progress, action.by);
			return { ...progress, state: 'submitted', reader: null };
		case 'ask':
			asTheReader(progress, action.by);
			return { ...progress, state: 'question', asked_at: action.at };
		case 'answer':
			asAuthor(progress, action.by);
			return { ...progress, state: 'in_review', asked_at: null };
		case 'decide': {
			const { by, verdicts, reason, would_change } = action;
			asTheReader(progress, by);
			return decided(progress, { by: by.id, verdicts, reason, would_change });
		}
		case 'lapse':
			if (!isOverdue(progress.asked_at, action.at)) refuse('not_due');
			return { ...progress, state: 'declined', reader: null, asked_at: null };
		case 'overtake':
			return { ...progress, state: 'superseded', reader: null, asked_at: null };
	}
}

/** What somebody can do now; what is done by nobody is left out. */
export function openTo(progress: CorrectionProgress, actor: CorrectionActor) {
	const trials = [
		{ do: 'send', by: actor },
		{ do: 'withdraw', by: actor },
		{ do: 'take', by: actor },
		{ do: 'hand_back', by: actor },
		{ do: 'answer', by: actor },
		{ do: 'ask', by: actor, at: '' },
		{
			do: 'decide',
			by: actor,
			verdicts: Array.from({ length: progress.parts }, (): Verdict => 'accepted'),
			reason: '',
			would_change: ''
		}
	] as const satisfies readonly CorrectionAction[];
	return trials.filter((action) => isOpen(progress, action)).map((action) => action.do);
}

function isOpen(progress: CorrectionProgress, action: CorrectionAction): boolean {
	try {
		after(progress, action);
		return true;
	} catch (error) {
		if (error instanceof CorrectionRefusedError) return false;
		throw error;
	}
}
