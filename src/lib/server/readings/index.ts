/** Readings: what one stamp says against one edition. */
export { divisionNamed, MAKER_LIST, makerNamed } from './aliases';
export { parametersOfBody } from './body';
export { readAgainst } from './read';
export { isThisReader, READER, READER_DIGEST } from './reader';
export {
	READING_PARAMETERS,
	readEdition,
	readRequest,
	type ReadingParameter,
	type ReadRequest
} from './request';
export { writeAnswer } from './write';
