import { describe, expect, it } from 'vitest';
import { accountOf } from './networks';

describe('who is counted as one', () => {
	it.each([
		['192.0.2.1', '192.0.2.1'],
		['::ffff:192.0.2.1', '192.0.2.1'],
		['2001:db8:1:2:3:4:5:6', '2001:db8:1:2'],
		['2001:db8:1:2::6', '2001:db8:1:2'],
		['2001:db8::6', '2001:db8:0:0'],
		['::1', '0:0:0:0']
	])('%s is counted as %s', (address, account) => {
		expect(accountOf(address)).toBe(account);
	});
});
