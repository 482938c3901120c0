/** The middle one, or the mean of the two in the middle. */
export function median(values: readonly number[]): number {
	if (values.length === 0) throw new Error('no values');
	const sorted = [...values].sort((a, b) => a - b);
	const middle = sorted.length >> 1;
	return sorted.length % 2 === 1 ? sorted[middle]! : (sorted[middle - 1]! + sorted[middle]!) / 2;
}

type Measure = () => number | Promise<number>;

/**
 * How many times the second figure the first is: the median of the ratios of rounds in which both are
 * measured, in turns first, so that what slows the machine for a while slows both.
 * @param rounds measured ones; one more goes before to warm up
 */
export async function ratioOf(first: Measure, second: Measure, rounds = 5): Promise<number> {
	const ratios: number[] = [];
	for (let round = 0; round <= rounds; round++) {
		let a: number;
		let b: number;
		if (round % 2 === 0) {
			a = await first();
			b = await second();
		} else {
			b = await second();
			a = await first();
		}
		if (round > 0) ratios.push(a / b);
	}
	return median(ratios);
}

/**
 * The median rate of a function, in calls a second.
 * @param work calls it so many times
 */
export function rateOf(work: (times: number) => void, { times = 20_000, rounds = 7 } = {}): number {
	work(times);
	const rates: number[] = [];
	for (let round = 0; round < rounds; round++) {
		const started = performance.now();
		work(times);
		rates.push((times * 1000) / (performance.now() - started));
	}
	return median(rates);
}
