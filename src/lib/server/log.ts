import pino, { type DestinationStream, type Logger } from 'pino';
import { config, type LogLevel } from './config';
import { maskStamps } from './stamps-in-logs';

export { maskAddress, maskStamp, maskStamps } from './stamps-in-logs';
/** No `child`: what is bound to one would pass by the mask. */
export type Log = Pick<
	Logger,
	'debug' | 'info' | 'warn' | 'error' | 'fatal' | 'flush' | 'isLevelEnabled'
>;

/** Fields that hold no text of a visitor and would be spoiled by the mask. */
const LEFT_ALONE: ReadonlySet<string> = new Set([
	'address',
	'digest',
	'error_id',
	'reader',
	'request_id',
	'time',
	// Masked by maskAddress, which knows its parts.
	'url'
]);
const DEEPEST = 6;

function masked(value: unknown, depth = 0): unknown {
	if (typeof value === 'string') return maskStamps(value);
	if (value instanceof Error) return maskedError(value, depth);
	if (typeof value !== 'object' || value === null) return value;
	if (depth >= DEEPEST) return '[deeper]';
	if (Array.isArray(value)) return value.map((entry) => masked(entry, depth + 1));
	return Object.fromEntries(
		Object.entries(value).map(([key, entry]) => [
			key,
			LEFT_ALONE.has(key) ? entry : masked(entry, depth + 1)
		])
	);
}

function maskedError(error: Error, depth: number): Record<string, unknown> {
	const { code } = error as { code?: unknown };
	return {
		type: error.name,
		message: maskStamps(error.message),
		...(code !== undefined && { code }),
		stack: error.stack && maskStamps(error.stack),
		...(error.cause !== undefined && depth < DEEPEST && { cause: masked(error.cause, depth + 1) })
	};
}

/**
 * A log of JSON lines in which no stamp keeps its last six characters: not in messages, not in
 * fields, not in errors.
 * @param destination where the lines go; standard output, in the background, when left out
 */
export function makeLog(level: LogLevel, destination?: DestinationStream): Log {
	return pino(
		{
			level,
			base: null,
			timestamp: pino.stdTimeFunctions.isoTime,
			formatters: {
				level: (label) => ({ level: label }),
				log: (fields) => masked(fields) as Record<string, unknown>
			},
			// An error is turned into plain fields by the formatter above.
			serializers: { err: (value: unknown) => value },
			hooks: {
				logMethod(args, method) {
					const [first, ...rest] = args as [unknown, ...unknown[]];
					const [fields, words] =
						first instanceof Error
							? [{ err: first }, rest.length > 0 ? rest : [first.message]]
							: typeof first === 'object'
								? [first, rest]
								: [{}, [first, ...rest]];
					const message = words.map((word) => masked(String(word))).join(' ');
					(method as (fields: unknown, message?: string) => void).call(
						this,
						fields,
						...(words.length > 0 ? [message] : [])
					);
				}
			}
		},
		destination ?? pino.destination({ dest: 1, sync: false })
	);
}

let current: Log | undefined;

/** The log of this process, at the configured level. @throws {ConfigurationError} */
export function log(): Log {
	current ??= makeLog(config().logLevel);
	return current;
}
