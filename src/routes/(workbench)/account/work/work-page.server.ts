/** What the page of background work shows. */
import { grouped } from '$lib/text/en/counts';
import { moment } from '$lib/format/moments';
import type { Actor } from '$lib/server/actor';
import { ground } from '$lib/server/ground';
import { workFor, type WorkInHand } from '$lib/server/jobs';
import { workText as text } from '$lib/text/en/work';

function standingOf({ state, stopping, again }: WorkInHand): string {
	if (stopping) return text.stopping;
	return again ? text.again : text.states[state];
}

/** @throws {SignInNeededError} @throws {DatabaseAwayError} */
export async function workPage(actor: Actor) {
	const work = await workFor(ground(), actor);
	return work.map((piece) => {
		const { id, done, of, createdAt, finishedAt } = piece;
		const asked = moment(createdAt.toISOString());
		return {
			id,
			kind: text.kinds[piece.kind] ?? text.otherKind,
			standing: standingOf(piece),
			asked,
			times: finishedAt
				? [text.asked(asked), text.ended(moment(finishedAt.toISOString()))].join(', ')
				: text.asked(asked),
			underWay: finishedAt === null,
			canStop: finishedAt === null && !piece.stopping,
			progress:
				piece.state === 'running' && of !== null && of > 0
					? { done, of, words: text.progress(grouped(done), grouped(of)) }
					: null
		};
	});
}
