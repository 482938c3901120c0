// Where somebody on this machine opens what listens here.

/**
 * The origin to open; an address of the whole machine has loopback among its own.
 * @param {string} host @param {string | number} port
 */
export function localOrigin(host, port) {
	const shown = host === '0.0.0.0' || host === '::' ? '127.0.0.1' : host;
	return `http://${shown.includes(':') ? `[${shown}]` : shown}:${port}`;
}
