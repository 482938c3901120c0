import {
	answerPosted,
	answerWritten,
	counted,
	etagOf,
	IMMUTABLE,
	REVALIDATE,
	type Asked
} from '../http';
import {
	isThisReader,
	READER,
	readAgainst,
	readStampsAgainst,
	writeAnswer,
	type ReadRequest,
	type StampsRequest
} from '../readings';
import { current, editionAt, type CompiledEdition } from '../reference';
import { editionAsked } from './edition';

/** Only such an address never changes its answer: it carries the edition, and the reader that we are. */
const isPermanent = ({ edition, reader }: ReadRequest): boolean =>
	edition !== undefined && reader !== undefined && isThisReader(reader);

/** Answers a reading. Synchronous, from memory, unless an older edition is asked for. */
export function answerReading(
	{ url, request, getClientAddress }: Asked,
	asked: ReadRequest
): Response | Promise<Response> {
	const cacheControl = isPermanent(asked) ? IMMUTABLE : REVALIDATE;
	const answer = (edition: CompiledEdition): Response => {
		const etag = etagOf(edition.head.digest, READER, url.search);
		return answerWritten(request, { etag, cacheControl }, () =>
			counted(getClientAddress(), () => writeAnswer(readAgainst(edition, asked)))
		);
	};
	const present = current();
	if (asked.edition === undefined || asked.edition === present.head.number) return answer(present);
	return editionAt(asked.edition).then(answer);
}

/** Answers a reading that was posted. */
export async function answerPostedReading(
	{ getClientAddress }: Asked,
	asked: ReadRequest
): Promise<Response> {
	const edition = await editionAsked(asked.edition);
	return answerPosted(counted(getClientAddress(), () => readAgainst(edition, asked)));
}

/** Answers several stamps of one car. */
export async function answerStamps(
	{ getClientAddress }: Asked,
	asked: StampsRequest
): Promise<Response> {
	const edition = await editionAsked(asked.edition);
	return answerPosted(counted(getClientAddress(), () => readStampsAgainst(edition, asked)));
}
