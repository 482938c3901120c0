declare module 'autocannon' {
	interface Options {
		url: string;
		connections?: number;
		duration?: number;
		headers?: Readonly<Record<string, string>>;
		requests?: readonly { path: string }[];
	}
	interface Result {
		requests: { average: number; total: number };
		latency: { p50: number; p99: number; max: number };
		errors: number;
		timeouts: number;
		non2xx: number;
	}
	export default function autocannon(options: Options): Promise<Result>;
}
