import { z } from 'zod';
import { weightSchema } from './tally';

/** What a look over the tables asks; each is a question to whoever knows, never a fault by itself. */
export const CONTRADICTIONS = [
	'two_meanings',
	'crossing_scopes',
	'gap',
	'plant_outside_its_years',
	'paint_outside_its_years',
	'engine_in_no_line',
	'sequence_beyond_production',
	'rule_without_rows',
	'source_without_rows'
] as const;
export const contradictionNameSchema = z.enum(CONTRADICTIONS);
export type ContradictionName = z.infer<typeof contradictionNameSchema>;

/**
 * One hit: the rows and sources that it rests on, and the question in a sentence.
 * Check, rows and sources of a hit are those of no other.
 */
export const contradictionSchema = z.object({
	check: contradictionNameSchema,
	/** How much a reading may be off while the question is open. */
	weight: weightSchema,
	/** Row keys, in canonical order. */
	rows: z.array(z.string()).readonly(),
	/** Keys of the sources that the rows cite, for or against, or of the source that is asked about. */
	sources: z.array(z.string()).readonly(),
	message: z.string(),
	/** Of the check and of all that the rows and sources say: a checked exception holds for one digest. */
	digest: z.string().regex(/^[0-9a-f]{16}$/)
});
export type Contradiction = z.infer<typeof contradictionSchema>;
