/** Readings: what one stamp says against one edition, and what the stamps of one car say against each other. */
export { divisionNamed, MAKER_LIST, makerNamed } from './aliases';
export { requestOfBody, stampsRequestOfBody } from './body';
export { readAgainst } from './read';
export { isThisReader, READER, READER_DIGEST } from './reader';
export {
	READING_PARAMETERS,
	readContext,
	readEdition,
	readRequest,
	type ReadingParameter,
	type ReadRequest
} from './request';
export { readStampsAgainst, type StampsRequest } from './stamps';
export { writeAnswer } from './write';
