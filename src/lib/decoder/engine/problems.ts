/** What stands in the way of a reading, and what could be tried instead. Offers are never applied in silence. */
import type { Offer, Problem, Reading } from '../../types';
import { decoderText } from '../../text/en/decoder';
import { ANY, textOf, UNREAD, type Cell, type Characters } from './characters';
import { isNorthAmerican, mendingCheckDigit } from './check-digit';
import { expectedOf, fits, missOf, nearest, type Break } from './fit';
import { alike, exchanged } from './look-alikes';
import type { Layout, PrimaryField } from './layout';
import type { PreparedLayout } from './plan';

const text = decoderText.problems;
const MOST_OFFERS = 3;

function expectation(found: Break): string {
	const kind = expectedOf(found.allowed);
	if (kind === 'figure') return text.figure;
	return kind === 'letter' ? text.letter : text.oneOf(found.allowed);
}

/** Look-alikes that mend every broken place of a text. */
function mended(breaks: readonly Break[], cells: readonly Cell[]): Cell[] | null {
	const next = [...cells];
	for (const { position, found, allowed } of breaks) {
		const other = [...alike(found)].find((character) => allowed.includes(character));
		if (other === undefined) return null;
		next[position - 1] = other;
	}
	return next;
}

/** Every place allows its character, and yet no model year comes of it: the year's own place is the break. */
function yearBreak(layout: Layout, cells: readonly Cell[]): Break {
	const { from } = layout.fields.find(({ reads }) => reads.by === 'year') as PrimaryField;
	const found = cells[from - 1] as Cell;
	const standsForYear = (character: string): boolean =>
		layout.yearsOf(cells.map((cell, index) => (index === from - 1 ? character : cell))).length > 0;
	return { position: from, found, allowed: [...ANY].filter(standsForYear).join('') };
}

/** Why nothing fits: the nearest layout, the character that broke it, and an offer where there is one. */
export function misfit(prepared: readonly PreparedLayout[], cells: readonly Cell[]): Problem {
	const miss = nearest(prepared.map((own) => missOf(own, cells)));
	if (miss === undefined) throw new RangeError('No layouts to compare with');
	const { layout } = miss.prepared;
	const [first] = miss.breaks;
	if (miss.difference !== 0) {
		const padded = [...cells, ...Array<Cell>(Math.max(0, -miss.difference)).fill(UNREAD)];
		const offers: Offer[] =
			miss.difference < 0 && first === undefined ? [{ text: textOf(padded), why: text.pad }] : [];
		return {
			layout: layout.id,
			code: miss.difference < 0 ? 'too_short' : 'too_many',
			message: text.length(cells.length, layout.length, layout.title),
			offers
		};
	}
	const broken = first ?? yearBreak(layout, cells);
	const fixed = mended(first === undefined ? [broken] : miss.breaks, cells);
	const found = /[0-9]/.test(broken.found)
		? text.figureFound(broken.found)
		: text.letterFound(broken.found);
	return {
		layout: layout.id,
		position: broken.position,
		code: 'character',
		message: text.character(
			layout.title,
			broken.position,
			found,
			first === undefined ? text.yearCode : expectation(broken)
		),
		offers:
			fixed === null
				? []
				: [
						{
							text: textOf(fixed),
							why: text.tryInPlace(fixed[broken.position - 1] as string, broken.position)
						}
					]
	};
}

/** Six figures alone: a sequence number without its beginning. */
export function bareSequence(
	prepared: readonly PreparedLayout[],
	cells: readonly Cell[]
): Problem | null {
	if (cells.length !== 6 || !cells.every((cell) => /^[0-9]$/.test(cell))) return null;
	const offers = prepared
		.filter(({ layout }) => layout.length < 17)
		.map(({ layout }) => ({
			text: textOf([...Array<Cell>(layout.length - 6).fill(UNREAD), ...cells]),
			why: text.sequenceOf(layout.title)
		}));
	const once = new Map(offers.map((offer) => [offer.text, offer]));
	return { code: 'bare_sequence', message: text.bare, offers: [...once.values()] };
}

/** Letters of no die set, which were taken as unread. */
export function foreignLetters(typed: string, characters: Characters): Problem[] {
	return characters.cells.flatMap((cell, index): Problem[] => {
		if (cell !== UNREAD) return [];
		const at = characters.origins[index] as number;
		const point = String.fromCodePoint(typed.codePointAt(at) as number);
		if (!/[\p{L}\p{N}]/u.test(point) || /[A-Za-z0-9]/.test(point)) return [];
		return [
			{
				position: index + 1,
				code: 'foreign_letter',
				message: text.foreignLetter(index + 1),
				offers: []
			}
		];
	});
}

/**
 * Look-alikes for the fields of a reading that found no row.
 * `ask` has the tables: whether a changed text has any row for a field, and what the field would then mean.
 */
export function lookAlikes(
	reading: Reading,
	prepared: PreparedLayout,
	cells: readonly Cell[],
	ask: {
		readonly hasRow: (field: number, cells: readonly Cell[]) => boolean;
		readonly meaning: (field: number, cells: readonly Cell[]) => string | null;
	}
): Problem[] {
	const problems: Problem[] = [];
	const lost = reading.fields.filter(
		({ outcome, derived_from }) =>
			derived_from === undefined && (outcome === 'not_listed' || outcome === 'not_used')
	);
	for (const field of lost) {
		const index = prepared.layout.fields.findIndex(({ from }) => from === field.from);
		const offers: Offer[] = [];
		for (const other of exchanged(cells, field.from, field.to)) {
			// A look-up is cheap, a reading is not.
			if (!ask.hasRow(index, other) || !fits(prepared, other)) continue;
			const meaning = ask.meaning(index, other);
			if (meaning !== null) offers.push({ text: textOf(other), why: text.wouldRead(meaning) });
		}
		if (offers.length > 0)
			problems.push({
				layout: prepared.layout.id,
				position: field.from,
				code: 'look_alike',
				message: text.lookAlike(field.label, field.code),
				offers: offers.slice(0, MOST_OFFERS)
			});
	}
	return problems;
}

/** Look-alikes that would make a failed check digit fit. */
export function checkDigitOffers(prepared: PreparedLayout, cells: readonly Cell[]): Problem | null {
	// Elsewhere a check that does not fit means nothing, and there is nothing to mend.
	if (!isNorthAmerican(cells[0] as Cell)) return null;
	const offers: Offer[] = mendingCheckDigit(cells)
		.map(({ place, character }) => ({
			place,
			character,
			other: withCharacter(cells, place, character)
		}))
		.filter(({ other }) => fits(prepared, other))
		.slice(0, MOST_OFFERS)
		.map(({ place, character, other }) => ({
			text: textOf(other),
			why: text.tryInPlace(character, place)
		}));
	if (offers.length === 0) return null;
	return {
		layout: prepared.layout.id,
		position: 9,
		code: 'look_alike',
		message: text.lookAlikeCheck,
		offers
	};
}

const withCharacter = (cells: readonly Cell[], place: number, character: string): Cell[] =>
	cells.map((cell, index) => (index === place - 1 ? character : cell));
