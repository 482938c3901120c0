import { moment } from '$lib/format/moments';
import type { TrailEntry } from '$lib/server/audit';
import { accountsText } from '$lib/text/en/accounts';
import { peopleText as text } from '$lib/text/en/people';

/** An entry of the trail as a line of the page. */
export interface EntryLine {
	readonly number: number;
	readonly at: string;
	readonly who: string;
	readonly what: string;
	readonly whom: { readonly id: string; readonly name: string; readonly gone: boolean };
}

const nameOf = (name: string | null): string => name ?? accountsText.formerMember;

/** Words for an entry; one of a kind that nobody writes any more keeps its own. */
export const entryLine = ({
	number,
	at,
	actor,
	subject,
	action,
	detail
}: TrailEntry): EntryLine => ({
	number,
	at: moment(at.toISOString()),
	who: actor === null ? text.audit.product : nameOf(actor.name),
	what: text.deeds[action]?.(detail) ?? action,
	whom: { id: subject.id, name: nameOf(subject.name), gone: subject.name === null }
});
