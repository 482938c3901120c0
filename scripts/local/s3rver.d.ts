declare module 's3rver' {
	import type { AddressInfo } from 'node:net';

	export interface S3rverOptions {
		readonly address: string;
		readonly port: number;
		readonly directory: string;
		readonly silent: boolean;
		readonly configureBuckets: readonly { readonly name: string; readonly configs: string[] }[];
	}
	export default class S3rver {
		constructor(options: S3rverOptions);
		run(): Promise<AddressInfo>;
		close(): Promise<void>;
	}
}
