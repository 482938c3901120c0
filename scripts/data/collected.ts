/** The collected facts and what became of each: what `mapping.csv`, `candidates.csv` and `REJECTED.csv` hold. */
import { z } from 'zod';
import { rowKeySchema, tableNameSchema } from '../../src/lib/types';

/** `<file stem>-<number of the record>`, e.g. `gm-17`. */
export const candidateIdSchema = z
	.string()
	.max(60)
	.regex(/^[a-z][a-z0-9-]*-[1-9][0-9]*$/);

/** Where the facts of one label of one file went; one label may have several lines. */
export const mappingSchema = z.object({
	family: z.string().min(1),
	area: z.string().min(1),
	field: z.string(),
	table: z.union([tableNameSchema, z.literal('rejected')])
});
export type Mapping = z.infer<typeof mappingSchema>;

export const candidateSchema = z.object({
	candidate: candidateIdSchema,
	area: z.string().min(1),
	field: z.string(),
	/** First twelve figures of the SHA-256 over the record's cells, joined by U+001F. */
	digest: z.string().regex(/^[0-9a-f]{12}$/),
	outcome: z.enum(['row', 'rejected']),
	targets: z.array(rowKeySchema).readonly()
});
export type Candidate = z.infer<typeof candidateSchema>;

export const rejectedSchema = z.object({
	candidate: candidateIdSchema,
	division: z.string(),
	years: z.string(),
	area: z.string().min(1),
	field: z.string(),
	code: z.string(),
	meaning: z.string(),
	reason: z.string().min(1)
});
export type Rejected = z.infer<typeof rejectedSchema>;

export interface Collected {
	readonly mapping: readonly Mapping[];
	readonly candidates: readonly Candidate[];
	readonly rejected: readonly Rejected[];
}

const parts = (id: string): [family: string, number: number] => {
	const dash = id.lastIndexOf('-');
	return [id.slice(0, dash), Number(id.slice(dash + 1))];
};

/** The file that a candidate comes from, without its ending. */
export const familyOf = (id: string): string => parts(id)[0];

/** Orders candidates by file, then by number. */
export function compareCandidates(a: string, b: string): number {
	const [familyA, numberA] = parts(a);
	const [familyB, numberB] = parts(b);
	if (familyA !== familyB) return familyA < familyB ? -1 : 1;
	return numberA - numberB;
}
