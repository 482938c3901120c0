import { describe, expect, it } from 'vitest';
import { isForeign } from './foreign';

const HOME = 'https://tallyplate.example';
const FORM = 'application/x-www-form-urlencoded';
const asked = (path: string, method: string, headers: Record<string, string>) =>
	isForeign(new Request(HOME + path, { method, headers }), new URL(path, HOME));

describe('isForeign', () => {
	it.each([
		[
			'a form of a page elsewhere',
			'/account',
			{ origin: 'https://evil.example', 'content-type': FORM }
		],
		['JSON of a page elsewhere', '/api/v1/readings', { origin: 'https://evil.example' }],
		['a page without an origin of its own', '/account', { origin: 'null', 'content-type': FORM }],
		['the same name by http', '/account', { origin: 'http://tallyplate.example' }],
		['a form that does not say whose it is', '/account', { 'content-type': FORM }],
		['one with files', '/account', { 'content-type': 'Multipart/Form-Data; boundary=x' }],
		['one-click from a page elsewhere', '/unsubscribe', { origin: 'https://evil.example' }]
	])('refuses %s', (_what, path, headers) => {
		expect(asked(path, 'POST', headers)).toBe(true);
	});

	it.each([
		['a form of our own', '/account', 'POST', { origin: HOME, 'content-type': FORM }],
		[
			'a program that sends JSON',
			'/api/v1/readings',
			'POST',
			{ 'content-type': 'application/json' }
		],
		['a mail program that unsubscribes', '/unsubscribe', 'POST', { 'content-type': FORM }],
		['whoever reads', '/account', 'GET', { origin: 'https://evil.example' }]
	])('takes %s', (_what, path, method, headers) => {
		expect(asked(path, method, headers)).toBe(false);
	});
});
