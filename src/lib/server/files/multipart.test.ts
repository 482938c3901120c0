import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { firstFileOf } from './multipart';

/** A form as a browser writes it. */
async function written(form: FormData): Promise<{ type: string; bytes: Uint8Array }> {
	const response = new Response(form);
	return {
		type: response.headers.get('content-type')!,
		bytes: new Uint8Array(await response.arrayBuffer())
	};
}

async function* inParts(bytes: Uint8Array, sizes: readonly number[]) {
	let at = 0;
	for (let n = 0; at < bytes.length; n += 1) {
		const size = sizes[n % sizes.length]!;
		yield bytes.subarray(at, at + size);
		at += size;
	}
}

async function readAll(type: string | null, bytes: Uint8Array, sizes: readonly number[] = [64]) {
	const { name, body } = await firstFileOf(type, inParts(bytes, sizes));
	const parts: Uint8Array[] = [];
	for await (const part of body) parts.push(part);
	return { name, bytes: Buffer.concat(parts) };
}

function formWith(content: BlobPart, name = 'plate.jpg'): FormData {
	const form = new FormData();
	form.append('note', 'a field before it');
	form.append('file', new File([content], name));
	form.append('after', 'and one after it');
	return form;
}

describe('a file in a form', () => {
	it('comes as it was sent, however the form is cut on its way', async () => {
		await fc.assert(
			fc.asyncProperty(
				// Signs that its marks are made of come up often.
				fc.array(fc.constantFrom(13, 10, 45, 0, 97), { maxLength: 200 }),
				fc.array(fc.integer({ min: 1, max: 40 }), { minLength: 1, maxLength: 5 }),
				async (content, sizes) => {
					const { type, bytes } = await written(formWith(Uint8Array.from(content)));
					const file = await readAll(type, bytes, sizes);
					expect([...file.bytes]).toEqual(content);
				}
			)
		);
	});

	it.each(['plate.jpg', 'the "tag".jpg', 'étiquette 😀.jpg', '<b>.jpg'])(
		'has the name that it was given: %s',
		async (name) => {
			const { type, bytes } = await written(formWith('x', name));
			expect((await readAll(type, bytes)).name).toBe(name);
		}
	);

	it('is the first, when there are several', async () => {
		const form = formWith('first', 'first.jpg');
		form.append('file', new File(['second'], 'second.jpg'));
		const { type, bytes } = await written(form);
		expect(await readAll(type, bytes)).toMatchObject({ name: 'first.jpg' });
	});

	it('that breaks off is told', async () => {
		const { type, bytes } = await written(formWith('x'.repeat(1000)));
		for (const length of [0, 20, 150, 600, bytes.length - 100].filter((n) => n < 1000))
			await expect(readAll(type, bytes.subarray(0, length))).rejects.toMatchObject({
				code: 'broken_form',
				why: 'breaks_off'
			});
	});

	it('is missed where none was chosen, and where there is no form', async () => {
		const empty = new FormData();
		empty.append('file', new File([], ''));
		const { type, bytes } = await written(empty);
		await expect(readAll(type, bytes)).rejects.toMatchObject({ why: 'no_file' });
		for (const other of [null, 'text/plain', 'multipart/form-data', 'application/json'])
			await expect(readAll(other, bytes)).rejects.toMatchObject({ why: 'no_file' });
	});

	it('never comes after a head without end', async () => {
		const endless = Buffer.from(`--x\r\nContent-Disposition: form-data; ${'a'.repeat(20_000)}`);
		await expect(
			readAll('multipart/form-data; boundary=x', endless, [5_000])
		).rejects.toMatchObject({ why: 'breaks_off' });
	});
});
