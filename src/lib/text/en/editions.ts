/** Editions: the numbered states of all tables. */
import type { EditionCause } from '../../types';
import { counted, grouped } from './counts';

export const editionsText = {
	title: 'Editions',
	intro:
		'Every change of the tables makes a new edition. Each has a number and a digest over all it holds. A reading names its edition, and can be repeated on it.',
	edition: (n: number): string => `Edition ${n}`,
	present: 'present',
	isPresent: 'The present edition: readings use it unless another is asked for.',
	counts: ({
		added,
		changed,
		retired
	}: {
		added: number;
		changed: number;
		retired: number;
	}): string => `${grouped(added)} added, ${grouped(changed)} changed, ${grouped(retired)} retired`,
	heads: {
		number: 'Edition',
		made: 'Made on',
		cause: 'By',
		rowsChanged: 'Rows that it changed',
		digest: 'Digest'
	},
	cause: {
		release: 'a release of the tables',
		correction: 'an accepted correction',
		undo: 'the undoing of a correction'
	} satisfies Record<EditionCause, string>,
	causeOf: (cause: EditionCause, id: string | null): string => {
		if (id === null) return editionsText.cause[cause];
		return {
			release: `release ${id} of the tables`,
			correction: `correction ${id}, accepted`,
			undo: `correction ${id}, undone`
		}[cause];
	},
	first: 'the first one: all of it is new',
	older: 'Older editions',
	newer: 'Newest editions',

	digest: 'Digest',
	digestNote:
		'SHA-256 over all rows, sources and claims in their canonical form. Two installations with the same digest say the same.',
	holds: 'It holds',
	holdsWords: (rows: number, sources: number, claims: number): string =>
		`${counted(rows, 'row', 'rows')}, ${counted(sources, 'source', 'sources')}, ${counted(claims, 'claim', 'claims')} of completeness`,
	cite: 'How to cite it',
	citation: (n: number, day: string, digest: string): string =>
		`Tallyplate, reference tables, edition ${n} of ${day}, SHA-256 ${digest}.`,
	citeNote: 'A reading or a report cites edition, digest and reader: all three stand at its foot.',

	compare: 'Compare with edition',
	compareSubmit: 'Compare',
	compareFault: (newest: number): string => `An edition is a whole number from 1 to ${newest}.`,
	compareSame: 'That is this edition. Choose another.',
	differing: 'How it differs from others',
	differences: (from: number, to: number): string =>
		`How edition ${to} differs from edition ${from}`,
	firstNote: 'There is no edition before this one. Choose another to compare it with.',
	onlyOne: 'This is the only edition yet.',
	same: 'Nothing differs.',
	what: 'What',
	kinds: { rows: 'Rows', sources: 'Sources', claims: 'Claims of completeness' },
	changes: { added: 'Added', changed: 'Changed', retired: 'Retired' },
	listed: (kind: 'rows' | 'sources' | 'claims', change: 'added' | 'changed' | 'retired'): string =>
		`${editionsText.kinds[kind]} ${change}`,
	countMore: (
		kind: 'rows' | 'sources' | 'claims',
		change: 'added' | 'changed' | 'retired'
	): string => ` ${editionsText.kinds[kind].toLowerCase()} ${change}`,
	nothingThere: 'nothing',
	from: 'was',
	to: 'is',
	claimFields: {
		maker: 'Corporation',
		table: 'Table',
		source: 'By',
		note: 'Note'
	},
	retiredNote: 'Their addresses stay, and show how they last stood.'
};
