import { asking, isAway, type Database } from '../db';
import { editions } from '../db/repositories';
import { CompiledEditions, type CompiledEdition } from './compiled-editions';
import { DatabaseAwayError, NoTablesYetError } from './errors';

/** How the reference data stand, for health checks. */
export interface ReferenceStatus {
	/** The edition that is read by; null before there is one. */
	readonly tables: number | null;
	readonly database: 'up' | 'down';
}

export interface WatchOptions {
	/** Milliseconds between two looks for a newer edition. */
	readonly every?: number;
	/** Told of what happens in the background: the database gone and back, a newer edition, a failure. */
	readonly onEvent?: (event: WatchEvent) => void;
}
export type WatchEvent =
	| { readonly event: 'database_down' | 'look_failed'; readonly error: unknown }
	| { readonly event: 'database_up' }
	| { readonly event: 'edition'; readonly edition: number; readonly ms: number };

/** A look that takes longer says that the database is not there for us. */
const LOOK_TIMEOUT_MS = 4_000;

/**
 * The edition that everybody reads by. Kept in memory, swapped whole when a newer one is seen, and
 * served on when the database is away.
 */
export class CurrentEdition {
	readonly compiled: CompiledEditions;
	#current: CompiledEdition | null = null;
	/** Null before the first look. */
	#up: boolean | null = null;
	#lastFailure = '';
	#timer: NodeJS.Timeout | undefined;
	#looking: Promise<void> | null = null;
	#stopped = false;

	constructor(
		private readonly database: Database,
		private readonly options: WatchOptions = {}
	) {
		this.compiled = new CompiledEditions(database);
	}

	/**
	 * Loads the newest edition and begins to look for newer ones. Without a database, or without an edition
	 * in it, it goes on looking.
	 */
	async start(): Promise<void> {
		await this.look();
		this.#schedule();
	}

	/** Stops looking, and waits for a look under way. The tables stay. */
	async stop(): Promise<void> {
		this.#stopped = true;
		clearTimeout(this.#timer);
		await this.#looking;
	}

	/** @throws {NoTablesYetError} */
	get(): CompiledEdition {
		if (this.#current === null) throw new NoTablesYetError();
		return this.#current;
	}

	status(): ReferenceStatus {
		return {
			tables: this.#current?.head.number ?? null,
			database: this.#up ? 'up' : 'down'
		};
	}

	/** Looks for a newer edition now; looks asked for at once are one. */
	look(): Promise<void> {
		this.#looking ??= this.#look().finally(() => (this.#looking = null));
		return this.#looking;
	}

	#schedule(): void {
		if (this.#stopped) return;
		this.#timer = setTimeout(
			() => void this.look().then(() => this.#schedule()),
			this.options.every ?? 1_000
		);
		this.#timer.unref();
	}

	async #look(): Promise<void> {
		const tell = this.options.onEvent ?? (() => {});
		try {
			const newest = await this.#newest();
			if (this.#up === false) tell({ event: 'database_up' });
			this.#up = true;
			// Never backwards: a node of a cluster may lag behind the one asked before.
			if (newest !== null && newest > (this.#current?.head.number ?? 0)) {
				const began = performance.now();
				this.#current = await this.compiled.get(newest, { urgent: true });
				this.compiled.keep(newest);
				tell({ event: 'edition', edition: newest, ms: Math.round(performance.now() - began) });
			}
			this.#lastFailure = '';
		} catch (error) {
			if (isAway(error)) {
				if (this.#up !== false) tell({ event: 'database_down', error });
				this.#up = false;
				return;
			}
			// Looked for every second, told once.
			if (this.#lastFailure !== String(error)) tell({ event: 'look_failed', error });
			this.#lastFailure = String(error);
		}
	}

	async #newest(): Promise<number | null> {
		const asked = asking(() => editions.newestEdition(this.database));
		let timer: NodeJS.Timeout | undefined;
		const late = new Promise<never>((_, reject) => {
			timer = setTimeout(
				() => reject(new DatabaseAwayError(new Error(`No answer in ${LOOK_TIMEOUT_MS} ms`))),
				LOOK_TIMEOUT_MS
			);
		});
		return Promise.race([asked, late]).finally(() => clearTimeout(timer));
	}
}
