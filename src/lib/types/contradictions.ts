import { z } from 'zod';

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

/** One hit: the rows and sources that it rests on, and the question in a sentence. */
export const contradictionSchema = z.object({
	check: contradictionNameSchema,
	/** Row keys, in canonical order. A closed hit opens again when one of these rows or sources changes. */
	rows: z.array(z.string()).readonly(),
	sources: z.array(z.string()).readonly(),
	message: z.string()
});
export type Contradiction = z.infer<typeof contradictionSchema>;
