// Serves the bare application with the product's own server, so that only the application differs.
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { readClientFiles } from '../../../scripts/server/client-files.mjs';
import { createServer } from '../../../scripts/server/create-server.mjs';

const build = process.argv[2] ?? '';
const { handler } = await import(pathToFileURL(join(build, 'handler.js')).href);
const { server } = createServer({
	handler,
	settings: { origin: 'http://127.0.0.1', trustProxy: 0, bodyLimit: 1024 },
	files: readClientFiles(build)
});
server.listen(0, '127.0.0.1', () => {
	const address = server.address();
	if (address && typeof address === 'object') console.log(`port ${address.port}`);
});
process.once('SIGTERM', () => process.exit(0));
