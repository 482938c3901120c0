import type { Transport } from '@sveltejs/kit';
import { isForServerAlone } from '$lib/format/server-alone';

/** How data goes from the server to the browser: what only the server draws with stays there. */
export const transport: Transport = {
	serverAlone: {
		encode: isForServerAlone,
		decode: () => null
	}
};
