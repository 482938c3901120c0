import {
	factorCodeSchema,
	mailAddressSchema,
	newPasswordSchema,
	personNameSchema,
	typedPasswordSchema
} from '$lib/types';
import { z } from 'zod';

/** Forms of the ways in. What is wrong is told by a code; the words stand in lib/text. */
export const signInSchema = z.object({ address: mailAddressSchema, password: typedPasswordSchema });
export const addressSchema = z.object({ address: mailAddressSchema });
export const codeSchema = z.object({ code: factorCodeSchema });
export const signUpSchema = z.object({
	name: personNameSchema,
	address: mailAddressSchema,
	consent: z.literal('on', 'missing')
});
export const chosenSchema = z.object({
	token: z.string().max(200).default(''),
	new_password: newPasswordSchema
});
export const tokenSchema = z.object({ token: z.string().max(200).default('') });
