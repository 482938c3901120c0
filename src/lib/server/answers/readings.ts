import { answerJson, etagOf, IMMUTABLE, REVALIDATE } from '../http';
import { isThisReader, READER, readAgainst, type ReadRequest } from '../readings';
import { current, editionAt, type CompiledEdition } from '../reference';

/**
 * Answers a reading. Synchronous, from memory, unless an older edition is asked for.
 * An address that carries edition and this reader never changes its answer, and says so.
 * @param question the address’s query: with edition and reader, what the validator stands for
 */
export function answerReading(
	request: Request,
	asked: ReadRequest,
	question: string
): Response | Promise<Response> {
	const lasts =
		asked.edition !== undefined && asked.reader !== undefined && isThisReader(asked.reader);
	const cacheControl = lasts ? IMMUTABLE : REVALIDATE;
	const answer = (edition: CompiledEdition) =>
		answerJson(request, { etag: etagOf(edition.head.digest, READER, question), cacheControl }, () =>
			readAgainst(edition, asked)
		);
	const present = current();
	if (asked.edition === undefined || asked.edition === present.head.number) return answer(present);
	return editionAt(asked.edition).then(answer);
}
