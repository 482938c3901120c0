import { config } from '../config';
import { ground, type Ground } from '../ground';
import { s3Store } from './s3-store';
import { NO_STORE, type Store } from './store';

/** What files stand on beside database and clock. */
export interface FileGround extends Ground {
	readonly store: Store;
	/** Signs the addresses of files. */
	readonly secret: string;
}

/** The store that the environment names. */
export const configuredStore = (): Store => {
	const { storage } = config();
	return storage === null ? NO_STORE : s3Store(storage);
};

let store: Store | undefined;

/** What this process stands on. @throws before the ground is laid, and without AUTH_SECRET */
export function fileGround(): FileGround {
	const { authSecret } = config();
	if (authSecret === undefined) throw new Error('AUTH_SECRET is not set: nothing can be signed.');
	store ??= configuredStore();
	return { ...ground(), store, secret: authSecret };
}
