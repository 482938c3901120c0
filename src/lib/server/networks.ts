/** Who is counted as one: an IPv4 address, or the first half of an IPv6 address. */
export function accountOf(address: string): string {
	if (!address.includes(':')) return address;
	if (address.startsWith('::ffff:') && address.includes('.')) return address.slice(7);
	const [head = '', tail] = address.split('::');
	const left = head === '' ? [] : head.split(':');
	const right = tail === undefined || tail === '' ? [] : tail.split(':');
	const gap = tail === undefined ? [] : Array<string>(8 - left.length - right.length).fill('0');
	return [...left, ...gap, ...right].slice(0, 4).join(':');
}
