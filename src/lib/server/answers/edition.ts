import { current, editionAt, type CompiledEdition } from '../reference';

/**
 * The edition that is asked for, or the present one.
 * @throws {UnknownEditionError} and what else `reference.editionAt` throws
 */
export const editionAsked = async (number: number | undefined): Promise<CompiledEdition> =>
	number === undefined ? current() : editionAt(number);
