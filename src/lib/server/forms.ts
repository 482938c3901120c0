import { fail, type ActionFailure } from '@sveltejs/kit';
import type { z } from 'zod';
import type { FormRefusal } from '../types';

/** A form as it came: in order, or to be sent back. */
export type ReadForm<Data> =
	| { readonly ok: true; readonly data: Data; readonly typed: FormRefusal['typed'] }
	| { readonly ok: false; readonly refusal: ActionFailure<FormRefusal> };

/** Fields whose text is not sent back. */
const SECRET = /password|code|token/i;

function fieldsOf(form: FormData, lists: readonly string[]): Record<string, unknown> {
	const fields: Record<string, unknown> = {};
	for (const [name, value] of form) if (typeof value === 'string') fields[name] = value;
	for (const name of lists) fields[name] = form.getAll(name);
	return fields;
}

const typedIn = (form: FormData): Record<string, string> =>
	Object.fromEntries(
		[...form].filter(
			(pair): pair is [string, string] => typeof pair[1] === 'string' && !SECRET.test(pair[0])
		)
	);

/**
 * Reads a form by its schema, whose messages are codes: the page has the words.
 * @param name which of the forms of its page
 * @param lists fields that may come several times
 */
export async function readForm<Schema extends z.ZodType>(
	request: Request,
	name: string,
	schema: Schema,
	lists: readonly string[] = []
): Promise<ReadForm<z.output<Schema>>> {
	const form = await request.formData();
	const typed = typedIn(form);
	const parsed = schema.safeParse(fieldsOf(form, lists));
	if (parsed.success) return { ok: true, data: parsed.data, typed };
	const faults: Record<string, string> = {};
	for (const { path, message } of parsed.error.issues) faults[String(path[0])] ??= message;
	return { ok: false, refusal: fail(400, { form: name, typed, faults }) };
}

/**
 * Sends a form back for a domain error that is about one of its fields; anything else is thrown on.
 * @param fields by code of the error, the field that it is about
 */
export function refused(
	name: string,
	typed: FormRefusal['typed'],
	error: unknown,
	fields: Readonly<Record<string, string>>
): ActionFailure<FormRefusal> {
	const code = error instanceof Error && 'code' in error ? String(error.code) : '';
	if (code === 'too_often') {
		const { retryAfterSeconds } = error as unknown as { retryAfterSeconds: number };
		const wait = Math.ceil(retryAfterSeconds / 60);
		return fail(429, { form: name, typed, faults: { form: code }, wait });
	}
	const field = Object.hasOwn(fields, code) ? fields[code] : undefined;
	if (field === undefined) throw error;
	return fail(400, { form: name, typed, faults: { [field]: code } });
}
