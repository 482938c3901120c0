import { areasSchema, ROLES } from '$lib/types';
import { z } from 'zod';

const DAY_MS = 86_400_000;
const MOST_DAYS = 366;
const REASON_LENGTH = { least: 10, most: 300 } as const;

const seen = { version: z.coerce.number().int().positive().catch(0) };

export const roleSchema = z.object({
	...seen,
	role: z.enum(ROLES, 'missing'),
	areas: areasSchema
});

/** The end of a day, in UTC. */
const endOfDay = (day: string): Date => new Date(`${day}T23:59:59.999Z`);

/** @param now from which on a pause can be */
export const pauseSchema = (now: Date) =>
	z.object({
		...seen,
		until: z
			.string('missing')
			.min(1, 'missing')
			.regex(/^\d{4}-\d\d-\d\d$/, 'not_one')
			.transform(endOfDay)
			.refine((until) => !Number.isNaN(until.getTime()), { error: 'not_one', abort: true })
			.refine((until) => until > now, 'past')
			.refine((until) => until.getTime() < now.getTime() + MOST_DAYS * DAY_MS, 'too_far'),
		reason: z
			.string('missing')
			.trim()
			.min(1, 'missing')
			.min(REASON_LENGTH.least, 'too_short')
			.max(REASON_LENGTH.most, 'too_long')
	});

export const resumeSchema = z.object(seen);
export const sessionSchema = z.object({ session: z.string().max(64).default('all') });
