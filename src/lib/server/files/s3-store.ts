import type { Readable } from 'node:stream';
import type { S3Client, S3ClientConfig } from '@aws-sdk/client-s3';
import type { StorageConfig } from '../config';
import { MissingObjectError, StorageAwayError, type Store } from './store';

const CONNECTION_TIMEOUT_MS = 3_000;
const REQUEST_TIMEOUT_MS = 30_000;
/** Most that one request can remove. */
const MOST_KEYS = 1_000;

const clientConfig = (config: StorageConfig): S3ClientConfig => ({
	region: config.region,
	credentials: {
		accessKeyId: config.accessKeyId,
		secretAccessKey: config.secretAccessKey
	},
	// A store of one's own seldom has a host name for each bucket.
	...(config.endpoint !== undefined && { endpoint: config.endpoint, forcePathStyle: true }),
	// Not every store knows the newer checksums; SHA-256 of what was sent is on record anyway.
	requestChecksumCalculation: 'WHEN_REQUIRED',
	responseChecksumValidation: 'WHEN_REQUIRED',
	maxAttempts: 2,
	requestHandler: {
		connectionTimeout: CONNECTION_TIMEOUT_MS,
		requestTimeout: REQUEST_TIMEOUT_MS,
		throwOnRequestTimeout: true
	}
});

/** Files in an S3-compatible store. The client is loaded with the first request: few processes need it. */
export function s3Store(config: StorageConfig): Store {
	const { bucket: Bucket } = config;
	let opened: Promise<{ client: S3Client; s3: typeof import('@aws-sdk/client-s3') }> | undefined;
	const open = () =>
		(opened ??= import('@aws-sdk/client-s3').then((s3) => ({
			s3,
			client: new s3.S3Client(clientConfig(config))
		})));

	async function ask<T>(request: (parts: Awaited<ReturnType<typeof open>>) => Promise<T>) {
		try {
			return await request(await open());
		} catch (error) {
			if (error instanceof MissingObjectError) throw error;
			throw new StorageAwayError(error);
		}
	}

	return {
		put: (Key, Body, ContentType) =>
			ask(async ({ client, s3 }) => {
				await client.send(new s3.PutObjectCommand({ Bucket, Key, Body, ContentType }));
			}),

		get: (Key) =>
			ask(async ({ client, s3 }) => {
				try {
					const found = await client.send(new s3.GetObjectCommand({ Bucket, Key }));
					return { bytes: found.ContentLength ?? 0, body: found.Body as Readable };
				} catch (error) {
					throw error instanceof s3.NoSuchKey ? new MissingObjectError(Key) : error;
				}
			}),

		removeUnder: (Prefix) =>
			ask(async ({ client, s3 }) => {
				for (;;) {
					const listed = await client.send(
						new s3.ListObjectsV2Command({ Bucket, Prefix, MaxKeys: MOST_KEYS })
					);
					const Objects = (listed.Contents ?? []).map(({ Key }) => ({ Key }));
					if (Objects.length === 0) return;
					await client.send(new s3.DeleteObjectsCommand({ Bucket, Delete: { Objects } }));
					if (!listed.IsTruncated) return;
				}
			})
	};
}
