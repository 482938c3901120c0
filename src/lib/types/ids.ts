import { z } from 'zod';

/** A form that is about one record: its id, and nothing else. Whether there is one is found out by whoever looks. */
export const idFormSchema = z.object({ id: z.string().max(64).default('') });
