import { readFileSync } from 'node:fs';
import { parse } from 'csv-parse/sync';
import { readContent } from '../../scripts/data/read';
import { inProject } from '../../scripts/lib/project.mjs';
import { MAX_LINES } from '../../src/lib/types';
import { inventedEdition, inventedSerials } from './invented-edition';
import { bundledDecoder } from './lib/decoder';
import { median, rateOf, ratioOf } from './lib/rounds';

const { checkDigitOf, compile, LINED_LAYOUTS, read } = await bundledDecoder();
const released = compile(readContent(inProject('data')));

/** Serials as published, of which only the running number may be masked. */
const published: string[] = ['gm', 'chrysler', 'ford']
	.flatMap((maker) =>
		(
			parse(readFileSync(inProject('tests', 'published', 'serials', `${maker}.csv`), 'utf8'), {
				columns: true
			}) as { text: string; known_miss: string }[]
		).filter((sample) => sample.known_miss === '')
	)
	.map(({ text }) => text.replaceAll('-', ''))
	.filter((text) => /^[0-9A-Z]{5}(?:[0-9A-Z]{2})?[0-9A-Zx]{6}$/.test(text));
/** How many fields of the first reading are told. */
const told = (text: string): number =>
	read(released, { text, kind: 'serial' }).readings[0]?.fields.filter(
		({ outcome }) => outcome === 'found'
	).length ?? 0;
/** As a serial of that car could go on: printed figures stay, but for the last three; what is masked begins where the run of its division does. */
const stems = published.map((text) => {
	const leads = ['1', '4', '5', '8'].map(
		(lead) =>
			text.slice(0, -6) + (/[0-9]/.test(text.at(-6) ?? '') ? text.slice(-6, -3) : `${lead}00`)
	);
	return leads.sort((a, b) => told(`${b}123`) - told(`${a}123`))[0] ?? '';
});
const withCheckDigit = (text: string): string => text.replace('?', checkDigitOf([...text]) ?? '?');
/** Mixed layouts, each with another running number; the federal sample stands for the 17-character form. */
const serials = Array.from({ length: 24_000 }, (_, n) =>
	n % 6 === 5
		? withCheckDigit(`1G4AH59H?${'5678'.charAt(n % 4)}G${118_341 + n}`)
		: `${stems[n % stems.length]}${String((n * 37) % 1000).padStart(3, '0')}`.replaceAll('x', '1')
);

const reading = (tables: typeof released, texts: readonly string[]) => (times: number) => {
	for (let n = 0; n < times; n += 1)
		read(tables, { text: texts[n % texts.length] as string, kind: 'serial' });
};

/** Seconds a reading against an invented edition of some size. */
const cost = (size: number) => {
	const work = reading(compile(inventedEdition(size)), inventedSerials(20_000));
	return () => {
		const started = performance.now();
		work(40_000);
		return performance.now() - started;
	};
};
const base = cost(2_000);

/** A tag as long as one can be: a published form, then lines that no form has, so that every form is tried on all. */
const longTag = [
	...(LINED_LAYOUTS.find(({ kind }) => kind === 'body_tag')?.examples.good.split(' / ') ?? []),
	...Array.from({ length: MAX_LINES }, (_, n) => `W${n + 10} Y3${n % 10} B51 C16 M${n + 20}`)
]
	.slice(0, MAX_LINES)
	.join(' / ');

const marked = ['RM23N0G10????', '24237?P?1?41?7'.slice(0, 13), '9F?1H5?1?3?', '1G4AH59H?5?11?34?'];

export const figures = [
	{
		name: 'Serials a second, one core, released tables',
		bound: 150_000,
		unit: '/s',
		direction: 'at least',
		run: () => rateOf(reading(released, serials), { times: 24_000, rounds: 9 })
	},
	{
		name: 'Four unread characters, the slowest of four forms',
		bound: 20,
		unit: 'ms',
		direction: 'at most',
		run: () =>
			Math.max(
				...marked.map((text) =>
					median(
						Array.from({ length: 41 }, () => {
							const started = performance.now();
							read(released, { text, kind: 'serial' });
							return performance.now() - started;
						})
					)
				)
			)
	},
	{
		name: 'A body tag of 14 lines, every form tried, with the serial beside it',
		bound: 2,
		unit: 'ms',
		direction: 'at most',
		run: () =>
			median(
				Array.from({ length: 201 }, () => {
					const started = performance.now();
					read(released, {
						text: longTag,
						kind: 'body_tag',
						context: { serial: '124379N512345' }
					});
					return performance.now() - started;
				})
			)
	},
	{
		name: 'Time a reading, ten times the rows',
		bound: 1.1,
		unit: '×',
		direction: 'at most',
		run: () => ratioOf(cost(20_000), base, 9)
	},
	{
		name: 'Time a reading, a hundred times the rows',
		bound: 1.3,
		unit: '×',
		direction: 'at most',
		run: () => ratioOf(cost(200_000), base, 9)
	}
] as const;
