import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { helpPage, helpPlugin } from './help';

const page = (body: string) => helpPage('a-page.md', `# A page\n\nWhat it is about.\n\n${body}`);

describe('a help page of its Markdown', () => {
	it('has a title, a summary and its text as HTML, heads with places to link to', async () => {
		const made = await page('## Be safe first\n\n- one\n- two\n\nSee [coverage](/coverage).');
		expect(made).toMatchObject({ slug: 'a-page', title: 'A page', summary: 'What it is about.' });
		const [part] = made.parts;
		expect(part?.html).toContain('<h2 id="be-safe-first">Be safe first</h2>');
		expect(part?.html).toContain('<li>one</li>');
		expect(part?.html).toContain('<a href="/coverage">coverage</a>');
	});

	it('has drawings between its texts', async () => {
		const { parts } = await page('Before.\n\n{{strengths}}\n\nAfter.');
		expect(parts.map(({ drawing }) => drawing)).toEqual([undefined, 'strengths', undefined]);
	});

	it.each([
		['a script', '<script>alert(1)</script>'],
		['an event', '<p onclick="alert(1)">text</p>'],
		['a style', '<p style="color:red">text</p>'],
		['a picture', '![alt](/a.png)'],
		['an address elsewhere', '[elsewhere](https://example.com/)'],
		['an address that runs', '[run](javascript:alert(1))']
	])('is refused with %s in it', async (_, body) => {
		await expect(page(body)).rejects.toThrow(/holds what no help page may hold/);
	});

	it('is refused without a title or a first paragraph, or with a third size of head', async () => {
		await expect(helpPage('a.md', 'No title.')).rejects.toThrow(/must begin/);
		await expect(helpPage('a.md', '# Title\n\n## Head\n\nText.')).rejects.toThrow(/must begin/);
		await expect(page('### Small')).rejects.toThrow(/second size/);
	});
});

describe('our help pages', () => {
	const folder = 'src/lib/help';
	const files = readdirSync(folder).filter((name) => name.endsWith('.md'));

	it('can all be made, and lead to pages that there are', async () => {
		expect(files.length).toBeGreaterThan(5);
		for (const file of files) {
			const made = await helpPage(file, readFileSync(`${folder}/${file}`, 'utf8'));
			const links = made.parts.flatMap(({ html = '' }) =>
				[...html.matchAll(/href="\/help\/([^"#]*)/g)].map(([, slug]) => `${slug}.md`)
			);
			for (const link of links) expect(files).toContain(link);
		}
	});

	it('cite every work in their list of sources, and no other', async () => {
		for (const file of files) {
			const [text = '', list = ''] = readFileSync(`${folder}/${file}`, 'utf8').split('## Sources');
			const cited = [...text.matchAll(/\[(\d+)\]/g)].map(([, n]) => Number(n));
			const listed = [...list.matchAll(/^(\d+)\. /gm)].map(([, n]) => Number(n));
			// "[38]" stands for an unread character.
			const named = [...new Set(cited)].filter((n) => n !== 38).sort((a, b) => a - b);
			expect(named, file).toEqual(listed);
		}
	});

	it('are made by an import, and nothing else is', async () => {
		const load = helpPlugin().load as (
			this: unknown,
			id: string
		) => Promise<{ code: string } | null>;
		const context = { addWatchFile: () => {} };
		const made = await load.call(context, `${process.cwd()}/${folder}/who-decides.md`);
		expect(made?.code).toMatch(/^export default \{"slug":"who-decides"/);
		expect(await load.call(context, `${process.cwd()}/README.md`)).toBeNull();
	});
});
