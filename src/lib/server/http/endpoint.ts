import { config } from '../config';
import { interfaceText } from '../../text/en/interface';
import { chooseType } from './accept';
import { refusalOf } from './domain-errors';
import { refuse } from './problem';
import { fault, Refusal } from './refusal';
import { TokenBuckets } from './token-bucket';

/** What an endpoint needs to know of a request. */
export interface Asked {
	readonly url: URL;
	readonly request: Request;
	getClientAddress(): string;
}
type Answer = Response | Promise<Response>;

let buckets: TokenBuckets | undefined;
/** What an ordinary reading takes is a tenth of it; one token more for each that a reading takes. */
const MS_PER_TOKEN = 2;

/**
 * Counts a request against its address, in this process alone; no database.
 * @param cost tokens: 1 for a reading or a list, more for a search
 * @throws {Refusal} 429 with Retry-After
 */
export function admit(address: string, cost = 1): void {
	buckets ??= new TokenBuckets(config().readingsPerMinute);
	const seconds = buckets.take(address, cost);
	if (seconds === 0) return;
	throw new Refusal(429, [fault('address', 'too_many', interfaceText.tooMany(seconds))], {
		'retry-after': String(seconds)
	});
}

/**
 * Does work for an address, and counts it by the time it took: a text with hardly a character read has
 * thousands of readings to weigh.
 */
export function counted<T>(address: string, work: () => T): T {
	const began = performance.now();
	const done = work();
	const cost = Math.floor((performance.now() - began) / MS_PER_TOKEN);
	if (cost > 0) buckets?.charge(address, cost);
	return done;
}

/**
 * An endpoint of the interface: counts the request, and turns a refusal into problem details.
 * Anything else that goes wrong is thrown on to the hooks. Stays synchronous where the answer is.
 */
export function endpoint<Event extends Asked>(answer: (event: Event) => Answer) {
	return (event: Event): Answer => {
		try {
			admit(event.getClientAddress());
			const response = answer(event);
			return response instanceof Response ? response : response.catch(asRefusal);
		} catch (error) {
			return asRefusal(error);
		}
	};
}

/** An endpoint that answers in JSON and nothing else. */
export const jsonEndpoint = <Event extends Asked>(answer: (event: Event) => Answer) =>
	endpoint((event: Event) => {
		chooseType(event.request.headers.get('accept'), ['application/json']);
		return answer(event);
	});

function asRefusal(error: unknown): Response {
	const refusal = refusalOf(error);
	if (refusal === null) throw error;
	return refuse(refusal);
}

/** Methods beside those of an endpoint: OPTIONS is answered, for other origins too; the rest is refused. */
export function otherMethods(...methods: readonly ('GET' | 'POST')[]) {
	const allowed = methods.flatMap((method) => (method === 'GET' ? ['GET', 'HEAD'] : [method]));
	allowed.push('OPTIONS');
	const allow = allowed.join(', ');
	return ({ request }: { request: Request }): Response => {
		if (request.method === 'OPTIONS') return preflight(allow, methods.includes('GET'));
		const message = interfaceText.method(request.method, allowed);
		return refuse(
			new Refusal(405, [fault('method', 'method_not_allowed', message, allowed)], { allow })
		);
	};
}

/** Any origin may GET, without credentials; what writes is for our own pages and tokens. */
const preflight = (allow: string, readable: boolean): Response =>
	new Response(null, {
		status: 204,
		headers: {
			allow,
			...(readable && {
				'access-control-allow-origin': '*',
				'access-control-allow-methods': 'GET, HEAD, OPTIONS',
				'access-control-allow-headers': 'Accept, If-None-Match',
				'access-control-max-age': '86400'
			})
		}
	});
