// The store of objects of a demonstration and of tests: files in a folder, asked as S3 is.
import { mkdirSync } from 'node:fs';
import S3rver from 's3rver';

/** The keys that the package takes; whoever may reach loopback has them. */
const KEY = 'S3RVER';
const BUCKET = 'uploads';

/**
 * Starts it on loopback.
 * @param {string} folder where objects are kept
 * @param {number} [port] a free one when left out
 * @returns {Promise<{ environment: Record<string, string>, port: number, close: () => Promise<void> }>}
 *   `environment`: the variables by which the product finds it
 */
export async function startStore(folder, port = 0) {
	mkdirSync(folder, { recursive: true, mode: 0o700 });
	const store = new S3rver({
		address: '127.0.0.1',
		port,
		directory: folder,
		silent: true,
		configureBuckets: [{ name: BUCKET, configs: [] }]
	});
	const address = await store.run();
	return {
		environment: {
			S3_ENDPOINT: `http://127.0.0.1:${address.port}`,
			S3_BUCKET: BUCKET,
			S3_ACCESS_KEY_ID: KEY,
			S3_SECRET_ACCESS_KEY: KEY
		},
		port: address.port,
		close: () => store.close()
	};
}
