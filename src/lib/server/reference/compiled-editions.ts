import { compileInSteps, type TableSet } from '../../decoder';
import type { EditionHead } from '../../types';
import { asking, type Database } from '../db';
import { entriesAt } from './content';
import { headOf } from './editions';
import { contentOfEntries } from './entries';
import { ServiceBusyError } from './errors';
import { inSlices } from './slices';

/** An edition with its compiled tables. */
export interface CompiledEdition {
	readonly head: EditionHead;
	readonly tables: TableSet;
}

const MOST_IN_MEMORY = 4;
const MOST_WAITING = 4;

/**
 * Compiled editions in memory: four at most, of which the one least recently used goes first.
 * Compiles one at a time; those who ask for the same edition share the work.
 */
export class CompiledEditions {
	/** Least recently used first. */
	readonly #compiled = new Map<number, CompiledEdition>();
	readonly #underWay = new Map<number, Promise<CompiledEdition>>();
	#line: Promise<unknown> = Promise.resolve();
	#kept: number | null = null;

	constructor(private readonly database: Database) {}

	/** Numbers of the editions in memory, least recently used first. */
	get numbers(): number[] {
		return [...this.#compiled.keys()];
	}

	/** Keeps one edition from going: the one that everybody reads by. The one kept before may go again. */
	keep(number: number): void {
		this.#kept = number;
	}

	/**
	 * An edition from memory, or read and compiled.
	 * @param urgent goes on although many wait
	 * @throws {UnknownEditionError} @throws {DatabaseAwayError} @throws {ServiceBusyError}
	 */
	async get(number: number, { urgent = false } = {}): Promise<CompiledEdition> {
		const ready = this.#compiled.get(number);
		if (ready) {
			this.#compiled.delete(number);
			this.#compiled.set(number, ready);
			return ready;
		}
		const shared = this.#underWay.get(number);
		if (shared) return shared;
		// Before it stands in line: a number that does not exist takes nobody's place.
		const head = await headOf(this.database, number);
		const meanwhile = this.#compiled.get(number) ?? this.#underWay.get(number);
		if (meanwhile) return meanwhile;
		if (!urgent && this.#underWay.size > MOST_WAITING) throw new ServiceBusyError();
		const work = this.#line
			.then(() => this.#compile(head))
			.finally(() => this.#underWay.delete(number));
		this.#underWay.set(number, work);
		// Who stands in line behind a failure is not concerned by it; who asked for the work is told.
		this.#line = work.catch(() => undefined);
		return work;
	}

	async #compile(head: EditionHead): Promise<CompiledEdition> {
		const entries = await asking(() => entriesAt(this.database, head.number));
		const tables = await inSlices(
			compileInSteps(contentOfEntries(entries), this.#nearest(head.number)?.tables)
		);
		const compiled = Object.freeze({ head, tables });
		this.#compiled.set(head.number, compiled);
		for (const number of this.numbers) {
			if (this.#compiled.size <= MOST_IN_MEMORY) break;
			if (number !== this.#kept && number !== head.number) this.#compiled.delete(number);
		}
		return compiled;
	}

	/** The edition that most likely has tables in common. */
	#nearest(number: number): CompiledEdition | undefined {
		return [...this.#compiled.values()].sort(
			(a, b) => Math.abs(a.head.number - number) - Math.abs(b.head.number - number)
		)[0];
	}
}
