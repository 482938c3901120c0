/** What every route of the interface shares: reading requests, refusing them, answering them. */
export { chooseType } from './accept';
export { answerCsv, answerJson } from './answer';
export { etagOf, IMMUTABLE, REVALIDATE } from './caching';
export { MOST, pageOf, readCursor, readLimit, writeCursor, type Page } from './cursor';
export { admit, answering, otherMethods, type Asked } from './endpoint';
export { readJsonObject } from './json-body';
export { readParameters, type Parameters } from './parameters';
export { PROBLEM_TYPE, problemDetails, problemResponse, refuse } from './problem';
export { fault, invalid, malformed, notFound, Refusal } from './refusal';
