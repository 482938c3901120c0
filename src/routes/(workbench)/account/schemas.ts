import {
	factorCodeSchema,
	mailAddressSchema,
	newPasswordSchema,
	personNameSchema,
	typedPasswordSchema
} from '$lib/types';
import { z } from 'zod';

/** Forms of one's own account. */
export const nameSchema = z.object({ name: personNameSchema });
export const newAddressSchema = z.object({
	address: mailAddressSchema,
	password: typedPasswordSchema
});
export const passwordSchema = z.object({
	password: typedPasswordSchema,
	new_password: newPasswordSchema
});
export const sessionSchema = z.object({ id: z.string().max(64).default('') });
export const factorSchema = z.object({ code: factorCodeSchema });
export const removeFactorSchema = z.object({
	password: typedPasswordSchema,
	code: factorCodeSchema
});
export const deletionSchema = z.object({
	password: typedPasswordSchema,
	sure: z.literal('on', 'missing')
});
