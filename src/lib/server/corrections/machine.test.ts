import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
	CORRECTION_STATES,
	ENDS,
	VERDICTS,
	type CorrectionAction,
	type CorrectionActor,
	type CorrectionProgress,
	type Verdict
} from '../../types';
import { CorrectionRefusedError } from './errors';
import { after, HOURS_TO_ANSWER, openTo, verdictsOf } from './machine';

const author: CorrectionActor = { id: 'author', role: 'member' };
const stranger: CorrectionActor = { id: 'stranger', role: 'member' };
const one: CorrectionActor = { id: 'one', role: 'moderator' };
const two: CorrectionActor = { id: 'two', role: 'moderator' };
const three: CorrectionActor = { id: 'three', role: 'moderator' };
const head: CorrectionActor = { id: 'head', role: 'administrator' };

const draft = (parts: Partial<CorrectionProgress> = {}): CorrectionProgress => ({
	state: 'draft',
	author: author.id,
	parts: 1,
	cited: true,
	readers: 1,
	reader: null,
	decisions: [],
	asked_at: null,
	...parts
});
const run = (from: CorrectionProgress, ...actions: readonly CorrectionAction[]) =>
	actions.reduce(after, from);
const decide = (by: CorrectionActor, ...verdicts: Verdict[]): CorrectionAction => ({
	do: 'decide',
	by,
	verdicts,
	reason: 'The source says another year.',
	would_change: 'A page of the manual.'
});
const send = { do: 'send', by: author } as const;
const take = (by: CorrectionActor) => ({ do: 'take', by }) as const;
function codeOf(act: () => unknown): string {
	try {
		act();
		return 'done';
	} catch (error) {
		if (error instanceof CorrectionRefusedError) return error.code;
		throw error;
	}
}
const refusal = (from: CorrectionProgress, action: CorrectionAction) =>
	codeOf(() => after(from, action));

describe('a correction', () => {
	it('is written, sent, read and accepted', () => {
		const states = [send, take(one), decide(one, 'accepted')].reduce(
			(list, action) => [...list, after(list.at(-1) as CorrectionProgress, action)],
			[draft()]
		);
		expect(states.map(({ state }) => state)).toEqual([
			'draft',
			'submitted',
			'in_review',
			'accepted'
		]);
	});

	it.each([
		['with no part', draft({ parts: 0 }), send, 'empty'],
		['with nothing to rest on', draft({ cited: false }), send, 'not_cited'],
		['by another', draft(), { do: 'send', by: one }, 'not_yours']
	] as const)('cannot be sent %s', (_, from, action, code) => {
		expect(refusal(from, action)).toBe(code);
	});

	it.each([
		['its author', { ...one, id: author.id }, 'own_correction'],
		['its author, an administrator', { ...head, id: author.id }, 'own_correction'],
		['a member', stranger, 'not_a_moderator']
	] as const)('is not taken by %s', (_, actor, code) => {
		expect(refusal(run(draft(), send), take(actor))).toBe(code);
	});

	it('is decided by who took it, and by nobody else', () => {
		const taken = run(draft(), send, take(one));
		expect(refusal(taken, decide(two, 'accepted'))).toBe('read_by_another');
		expect(refusal(taken, { do: 'hand_back', by: two })).toBe('read_by_another');
		expect(refusal(taken, take(two))).toBe('not_now');
		const back = run(taken, { do: 'hand_back', by: one }, take(two), decide(two, 'accepted'));
		expect(back.state).toBe('accepted');
	});

	it('is accepted with one part of several, and declined with none', () => {
		const taken = run(draft({ parts: 2 }), send, take(one));
		expect(after(taken, decide(one, 'declined', 'accepted')).state).toBe('accepted');
		expect(after(taken, decide(one, 'declined', 'declined')).state).toBe('declined');
		expect(refusal(taken, decide(one, 'accepted'))).toBe('parts_undecided');
	});

	it.each(['reason', 'would_change'] as const)('is not declined without %s', (missing) => {
		const taken = run(draft(), send, take(one));
		expect(refusal(taken, { ...decide(one, 'declined'), [missing]: ' ' } as CorrectionAction)).toBe(
			'reason_missing'
		);
	});

	it('can be taken back by its author until it is decided', () => {
		for (const from of [draft(), run(draft(), send), run(draft(), send, take(one))])
			expect(after(from, { do: 'withdraw', by: author }).state).toBe('withdrawn');
		expect(refusal(draft(), { do: 'withdraw', by: one })).toBe('not_yours');
		const done = run(draft(), send, take(one), decide(one, 'accepted'));
		expect(refusal(done, { do: 'withdraw', by: author })).toBe('ended');
	});

	it('is overtaken from wherever it stands', () => {
		expect(run(draft(), send, take(one), { do: 'overtake' })).toMatchObject({
			state: 'superseded',
			reader: null
		});
	});
});

describe('a question', () => {
	const asked = run(draft(), send, take(one), {
		do: 'ask',
		by: one,
		at: '2026-12-01T12:00:00.000Z'
	});
	const at = (hours: number) =>
		new Date(Date.parse('2026-12-01T12:00:00.000Z') + hours * 3_600_000).toISOString();

	it('goes to the author, and back to who asked', () => {
		expect(asked.state).toBe('question');
		expect(refusal(asked, { do: 'answer', by: one })).toBe('not_yours');
		const answered = after(asked, { do: 'answer', by: author });
		expect(answered).toMatchObject({ state: 'in_review', reader: one.id, asked_at: null });
		expect(after(answered, decide(one, 'accepted')).state).toBe('accepted');
	});

	it('lapses after its hours, and not before', () => {
		expect(refusal(asked, { do: 'lapse', at: at(HOURS_TO_ANSWER - 0.001) })).toBe('not_due');
		expect(after(asked, { do: 'lapse', at: at(HOURS_TO_ANSWER) }).state).toBe('declined');
		expect(refusal({ ...asked, asked_at: null }, { do: 'lapse', at: at(99) })).toBe('not_due');
	});
});

describe('two readers', () => {
	const sent = run(draft({ readers: 2, parts: 2 }), send);
	const first = run(sent, take(one), decide(one, 'accepted', 'declined'));

	it('both have to decide, and the first does not decide twice', () => {
		expect(first.state).toBe('submitted');
		expect(verdictsOf(first)).toEqual([null, null]);
		expect(refusal(first, take(one))).toBe('decided_already');
	});

	it('who agree settle it', () => {
		const both = run(first, take(two), decide(two, 'accepted', 'declined'));
		expect(both.state).toBe('accepted');
		expect(verdictsOf(both)).toEqual(['accepted', 'declined']);
	});

	it('who differ are settled by an administrator', () => {
		const differ = run(first, take(two), decide(two, 'declined', 'declined'));
		expect(differ.state).toBe('submitted');
		expect(refusal(differ, take(three))).toBe('needs_administrator');
		const settled = run(differ, take(head), decide(head, 'accepted', 'accepted'));
		expect(settled.state).toBe('accepted');
		expect(verdictsOf(settled)).toEqual(['accepted', 'declined']);
	});
});

describe('what is open to somebody', () => {
	it('is what would not be refused', () => {
		expect(openTo(draft(), author)).toEqual(['send', 'withdraw']);
		expect(openTo(draft(), one)).toEqual([]);
		const sent = run(draft(), send);
		expect(openTo(sent, one)).toEqual(['take']);
		expect(openTo(after(sent, take(one)), one)).toEqual(['hand_back', 'ask', 'decide']);
		expect(openTo(sent, stranger)).toEqual([]);
	});
});

describe('no order of actions', () => {
	const actors = [author, stranger, one, two, three, head];
	const actor = fc.constantFrom(...actors);
	const at = fc
		.integer({ min: 0, max: 200 })
		.map((hours) => new Date(Date.UTC(2026, 11, 1) + hours * 3_600_000).toISOString());
	const action: fc.Arbitrary<CorrectionAction> = fc.oneof(
		fc.record({
			do: fc.constantFrom('send' as const, 'withdraw' as const, 'answer' as const),
			by: fc.constantFrom(author, one)
		}),
		fc.record({ do: fc.constantFrom('take' as const, 'hand_back' as const), by: actor }),
		fc.record({ do: fc.constant('ask' as const), by: actor, at }),
		fc.record({
			do: fc.constant('decide' as const),
			by: actor,
			verdicts: fc.array(fc.constantFrom(...VERDICTS), { minLength: 1, maxLength: 2 }),
			reason: fc.constantFrom('', 'Why'),
			would_change: fc.constantFrom('', 'What')
		}),
		fc.record({ do: fc.constant('lapse' as const), at }),
		fc.constant({ do: 'overtake' as const })
	);
	type Open = { readonly pick: number; readonly accepts: readonly boolean[] };
	/** A step that is open to somebody, so that long ways are walked to their ends. */
	const open = fc.record({
		pick: fc.nat(),
		accepts: fc.array(fc.boolean(), { minLength: 2, maxLength: 2 })
	});
	function openStep(
		progress: CorrectionProgress,
		{ pick, accepts }: Open
	): CorrectionAction | null {
		const steps = actors.flatMap((by) =>
			openTo(progress, by)
				.filter((step) => step !== 'withdraw')
				.map((step): CorrectionAction => {
					if (step === 'ask') return { do: step, by, at: '2026-12-01T00:00:00.000Z' };
					if (step !== 'decide') return { do: step, by };
					const verdicts = Array.from({ length: progress.parts }, (_, part): Verdict =>
						accepts[part] === true ? 'accepted' : 'declined'
					);
					return decide(by, ...verdicts);
				})
		);
		return steps[pick % Math.max(1, steps.length)] ?? null;
	}
	const start = fc
		.record({
			parts: fc.integer({ min: 0, max: 2 }),
			cited: fc.boolean(),
			readers: fc.constantFrom(1 as const, 2 as const)
		})
		.map(draft);

	it('reaches an end without its conditions, or leaves one', () => {
		const seen = new Set<string>();
		fc.assert(
			fc.property(start, fc.array(fc.oneof(action, open), { maxLength: 24 }), (from, steps) => {
				let progress = from;
				let sent = false;
				for (const step of steps) {
					const next = 'do' in step ? step : openStep(progress, step);
					if (next === null) continue;
					const before = structuredClone(progress);
					try {
						progress = after(progress, next);
					} catch (error) {
						expect(error).toBeInstanceOf(CorrectionRefusedError);
						expect(progress).toEqual(before);
						continue;
					}
					expect(ENDS).not.toContain(before.state);
					sent ||= next.do === 'send';
					seen.add(progress.state);
				}
				const deciders = progress.decisions.map(({ by }) => by);
				expect(new Set(deciders).size).toBe(deciders.length);
				expect(deciders).not.toContain(author.id);
				expect(deciders).not.toContain(stranger.id);
				if (progress.state !== 'accepted') return;
				expect(sent && progress.cited && progress.parts > 0).toBe(true);
				const verdicts = verdictsOf(progress);
				expect(verdicts).not.toContain(null);
				expect(verdicts).toContain('accepted');
				expect(deciders.length).toBeGreaterThanOrEqual(progress.readers);
			}),
			{ numRuns: 400 }
		);
		expect([...seen].sort()).toEqual(CORRECTION_STATES.filter((state) => state !== 'draft').sort());
	});
});
