import { describe, expect, it } from 'vitest';
import { makeLog, type Log } from './log';

const SERIAL = '242378B123456';
const written = (write: (log: Log) => void) => {
	const lines: string[] = [];
	write(makeLog('info', { write: (line) => void lines.push(line) }));
	return lines;
};

describe('makeLog', () => {
	it('writes JSON with level, time, fields and message', () => {
		const [line] = written((log) => log.warn({ port: 3000 }, 'listening'));
		expect(JSON.parse(line!)).toEqual({
			level: 'warn',
			time: expect.stringMatching(/^\d{4}-\d\d-\d\dT/),
			port: 3000,
			msg: 'listening'
		});
	});

	it.each<[string, (log: Log) => void]>([
		['a message', (log) => log.info(`no layout fits ${SERIAL}`)],
		['a field', (log) => log.info({ text: SERIAL }, 'read')],
		['a field inside a field', (log) => log.info({ input: { texts: [SERIAL] } }, 'read')],
		['an error', (log) => log.error(new Error(`bad ${SERIAL}`))],
		['an error in a field', (log) => log.error({ err: new Error(`bad ${SERIAL}`) }, 'read')],
		['a cause', (log) => log.error(new Error('bad', { cause: new Error(SERIAL) }))]
	])('masks a stamp in %s', (_where, write) => {
		const [line] = written(write);
		expect(line).toContain('242378B******');
		expect(line).not.toContain('123456');
	});

	it('keeps type, code and stack of an error', () => {
		const error = Object.assign(new TypeError('away'), { code: 'database_away' });
		const [line] = written((log) => log.error(error, 'reading rows'));
		expect(JSON.parse(line!)).toMatchObject({
			msg: 'reading rows',
			err: { type: 'TypeError', message: 'away', code: 'database_away', stack: expect.any(String) }
		});
	});

	it('leaves ids and digests as they are', () => {
		const fields = { request_id: '0a1b2c3d4e5f6a7b', digest: '0123456789abcdef0123' };
		const [line] = written((log) => log.info(fields, 'read'));
		expect(JSON.parse(line!)).toMatchObject(fields);
	});

	it('stays silent below its level', () => {
		expect(written((log) => log.debug('x'))).toEqual([]);
	});
});
