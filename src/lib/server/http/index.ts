/** What every route of the interface shares: reading requests, refusing them, answering them. */
export { chooseType } from './accept';
export { answerCsv, answerJson, answerPosted, answerWritten } from './answer';
export { etagOf, IMMUTABLE, REVALIDATE } from './caching';
export { filtersOf, MOST, pageOf, readLimit, startOf, writeCursor } from './cursor';
export { refusalOf } from './domain-errors';
export { admit, counted, endpoint, jsonEndpoint, otherMethods, type Asked } from './endpoint';
export { readJsonObject } from './json-body';
export { readParameters, type Parameters } from './parameters';
export { problemResponse, refuse } from './problem';
export { fault, invalid, malformed, notFound, Refusal } from './refusal';
export { TokenBuckets } from './token-bucket';
