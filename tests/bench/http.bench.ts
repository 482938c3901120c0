import { gzipSync } from 'node:zlib';
import { buildBare, startBare } from './lib/bare';
import { load } from './lib/load';
import { ratioOf } from './lib/rounds';
import { withBuiltServer } from './lib/served';

const TEXT = 'RM23N0G100123';
const READING = `/api/v1/readings?kind=serial&text=${TEXT}`;
const PAGE = `/?kind=serial&text=${TEXT}`;
const SECONDS = 3;

const text = async (url: string): Promise<string> => {
	const response = await fetch(url);
	if (!response.ok) throw new Error(`${url}: ${response.status}`);
	return response.text();
};

/** Lines that make the bare page as long as the reading page, found by asking twice. */
async function linesFor(answer: string, length: number): Promise<number> {
	const sizeOf = async (items: number): Promise<number> => {
		const bare = await startBare(answer, items);
		try {
			return (await text(`${bare.origin}/page`)).length;
		} finally {
			await bare.end();
		}
	};
	const [few, many] = [await sizeOf(10), await sizeOf(110)];
	return Math.round(10 + ((length - few) * 100) / (many - few));
}

/** Script that a browser fetches for `/`, every module that it imports at the start, compressed. */
async function scriptOf(origin: string): Promise<number> {
	const html = await text(`${origin}/`);
	const found = new Set<string>();
	const walk = async (url: URL): Promise<number> => {
		if (found.has(url.pathname)) return 0;
		found.add(url.pathname);
		const source = await text(url.href);
		let size = gzipSync(source, { level: 9 }).length;
		const imports = /(?:import|from)\s*["']([^"']+\.js)["']/g;
		for (const [, path = ''] of source.matchAll(imports)) size += await walk(new URL(path, url));
		return size;
	};
	let size = 0;
	for (const [, path = ''] of html.matchAll(/["'](?:\.?\/)(_app\/immutable\/[^"']+\.js)["']/g))
		size += await walk(new URL(`/${path}`, origin));
	if (found.size === 0) throw new Error('The page names no script');
	return size / 1000;
}

type Run = (addresses: { product: string; bare: string; fixed: string }) => Promise<number>;

/** Runs with the product and the bare application side by side. */
const sideBySide = (run: Run) => async (): Promise<number> =>
	withBuiltServer(async ({ origin }) => {
		const answer = await text(origin + READING);
		const { edition, reader } = JSON.parse(answer) as { edition: number; reader: string };
		const page = await text(origin + PAGE);
		await buildBare();
		const bare = await startBare(answer, await linesFor(answer, page.length));
		try {
			return await run({
				product: origin,
				bare: bare.origin,
				fixed: `${origin}${READING}&edition=${edition}&reader=${reader}`
			});
		} finally {
			await bare.end();
		}
	});

const rate =
	(url: string, headers: Readonly<Record<string, string>> = {}) =>
	async (): Promise<number> =>
		(await load(url, { seconds: SECONDS, headers })).rate;
/** Pages for who sends a cookie are kept by nobody: each is read and drawn. */
const COOKIE = { cookie: 'theme=dark' };
/** Each request another serial: nothing of one answer helps the next. The bare route is asked the same way. */
const computed = (origin: string, path: string) => async (): Promise<number> =>
	(
		await load(origin, {
			seconds: SECONDS,
			paths: Array.from(
				{ length: 500 },
				(_, n) => `${path}?kind=serial&text=RM23N0G${100_001 + n * 7}`
			)
		})
	).rate;

export const figures = [
	{
		name: 'Computed reading over HTTP, against a bare route that answers the same object',
		bound: 0.85,
		unit: '×',
		direction: 'at least',
		run: sideBySide(({ product, bare }) =>
			ratioOf(computed(product, '/api/v1/readings'), computed(bare, '/json'))
		)
	},
	{
		name: 'Fixed reading from the cache, against that route',
		bound: 4,
		unit: '×',
		direction: 'at least',
		run: sideBySide(({ fixed, bare }) => ratioOf(rate(fixed), rate(`${bare}/json`)))
	},
	{
		name: 'Reading page, against a bare rendered page of its size',
		bound: 0.8,
		unit: '×',
		direction: 'at least',
		run: sideBySide(({ product, bare }) => ratioOf(rate(product + PAGE), rate(`${bare}/page`)))
	},
	{
		name: 'Reading page that is drawn anew each time, against that page',
		bound: 0.5,
		unit: '×',
		direction: 'at least',
		run: sideBySide(({ product, bare }) =>
			ratioOf(rate(product + PAGE, COOKIE), rate(`${bare}/page`, COOKIE))
		)
	},
	{
		name: 'Script of /, compressed',
		bound: 50,
		unit: 'kB',
		direction: 'at most',
		run: () => withBuiltServer(({ origin }) => scriptOf(origin))
	}
] as const;
