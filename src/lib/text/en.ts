/** Every word the product says. One file a subject; what the reading code says stands in `en/decoder`. */
export { coverageText } from './en/coverage';
export { editionsText } from './en/editions';
export { entryText } from './en/entry';
export { errorText } from './en/errors';
export { helpText } from './en/help';
export { readingText } from './en/reading';
export { shellText } from './en/shell';
export { stampPlaceText } from './en/stamp-places';
export { strengthText } from './en/strength';
export { tablesText } from './en/tables';
