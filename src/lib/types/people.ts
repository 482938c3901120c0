import { z } from 'zod';
import { ALL_DIVISIONS, type Division } from './makers';

/** What somebody with an account may do. A visitor has none. */
export const ROLES = ['member', 'moderator', 'administrator'] as const;
export type Role = (typeof ROLES)[number];

/** The divisions whose corrections a moderator decides, in the order of the list, each once. */
export const areasSchema = z
	.array(z.string())
	.transform((names) => ALL_DIVISIONS.filter((division) => names.includes(division)))
	.pipe(z.array(z.custom<Division>()));

/** Shortest and longest name that stands beside somebody's work, in characters. */
export const NAME_LENGTH = { least: 2, most: 60 } as const;
/** Shortest and longest password. No other rule: length is what counts. */
export const PASSWORD_LENGTH = { least: 10, most: 200 } as const;
/** Longest address that mail knows. */
const ADDRESS_LENGTH = 254;

/**
 * A name as it is kept: one line, spaces single, no signs that cannot be seen. Whatever else stands in
 * it is text.
 */
export const personNameSchema = z
	.string('missing')
	.transform((name) =>
		name
			.normalize('NFC')
			.replace(/[\p{Cc}\p{Cf}\p{Zl}\p{Zp}]/gu, ' ')
			.replace(/\s+/gu, ' ')
			.trim()
	)
	.pipe(z.string().min(NAME_LENGTH.least, 'too_short').max(NAME_LENGTH.most, 'too_long'));

/**
 * An address as it is kept and compared: letters that look like an at sign are taken for one, all in lower case.
 * Refuses what could be read as two addresses.
 */
export const mailAddressSchema = z
	.string('missing')
	.transform((address) => address.normalize('NFKC').trim().toLowerCase())
	.pipe(
		z
			.string()
			.min(1, 'missing')
			.max(ADDRESS_LENGTH, 'too_long')
			.regex(
				/^[^\s"(),:;<>@[\\\]]{1,64}@(?:[a-z0-9](?:[a-z0-9-]*[a-z0-9])?\.)+[a-z]{2,}$/,
				'not_one'
			)
	);

/** A password that is chosen. */
export const newPasswordSchema = z
	.string('missing')
	.min(PASSWORD_LENGTH.least, 'too_short')
	.max(PASSWORD_LENGTH.most, 'too_long');

/** A password that is typed to get in: whatever it is, it is right or wrong. */
export const typedPasswordSchema = z.string('missing').min(1, 'missing').max(1000, 'too_long');

/** Six figures of a second factor, or a recovery code; spaces and dashes do not matter. */
export const factorCodeSchema = z
	.string('missing')
	.transform((code) => code.replace(/[\s-]/g, '').toUpperCase())
	.pipe(z.string().regex(/^(?:\d{6}|[A-Z2-7]{10})$/, 'not_one'));
