import { describe, expect, it } from 'vitest';
import { CHECKS } from './checks';
import { INVENTED, invented } from './checks/invented';
import { parseData } from './read';

/** A large folder of one table, in canonical order. */
function largeFolder(rows: number) {
	const keys = Array.from({ length: rows }, (_, index) => String(index + 10_000));
	return parseData(
		new Map([
			...Object.entries(INVENTED),
			[
				'gm/option.csv',
				[
					'row_key,division,line,body,engine,plant,market,years_from,years_to,code,meaning,values,note',
					...keys.map(
						(key) => `gm.option.${key}.1,Pontiac,,,,,,1966,1967,${key},Option ${key},{},`
					),
					''
				].join('\n')
			],
			[
				'gm/option.citations.csv',
				[
					'row_key,source,stance,read,locator,quotation,seen_on',
					...keys.map((key) => `gm.option.${key}.1,memory,for,,,,`),
					''
				].join('\n')
			]
		])
	);
}

describe('the checks', () => {
	it('have names of their own', () => {
		expect(new Set(CHECKS.map(({ name }) => name)).size).toBe(CHECKS.length);
	});

	it.each(CHECKS.map((own) => [own.name, own] as const))(
		'%s accepts the invented folder',
		(_, own) => {
			expect(own.check(invented())).toEqual([]);
		}
	);

	it('take less than five seconds for ten thousand rows', () => {
		// Of the processor: other tests run at the same time.
		const before = process.cpuUsage();
		const data = largeFolder(10_000);
		const findings = CHECKS.flatMap(({ check }) => check(data));
		expect(findings).toEqual([]);
		expect(process.cpuUsage(before).user / 1000).toBeLessThan(5_000);
	});
});
