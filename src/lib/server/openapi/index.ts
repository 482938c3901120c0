/** The description of the interface, made from the schemas that its answers are held against. */
export { openApiDocument, openApiJson } from './document';
export { OPERATIONS, type Operation } from './operations';
