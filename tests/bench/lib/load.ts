import autocannon from 'autocannon';

export interface LoadOptions {
	readonly connections?: number;
	readonly seconds?: number;
	readonly headers?: Readonly<Record<string, string>>;
	/** Paths asked for in turn, in place of the address's own. */
	readonly paths?: readonly string[];
}

export interface LoadResult {
	/** Answers a second. */
	readonly rate: number;
	/** Milliseconds. */
	readonly p50: number;
	readonly p99: number;
	readonly max: number;
}

/**
 * Asks an address as fast as it answers.
 * @throws when an answer was an error or did not come: its rate would say nothing
 */
export async function load(
	url: string,
	{ connections = 20, seconds = 4, headers = {}, paths }: LoadOptions = {}
): Promise<LoadResult> {
	const { requests, latency, errors, timeouts, non2xx } = await autocannon({
		url,
		connections,
		duration: seconds,
		headers,
		...(paths && { requests: paths.map((path) => ({ path })) })
	});
	if (errors + timeouts + non2xx > 0)
		throw new Error(`${url}: ${non2xx} refused, ${errors} broken, ${timeouts} late`);
	return {
		rate: requests.total / seconds,
		p50: latency.p50,
		p99: latency.p99,
		max: latency.max
	};
}
