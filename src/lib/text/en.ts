/** Every word the product says. One file a subject; what the reading code says stands in `en/decoder`. */
export { entryText } from './en/entry';
export { errorText } from './en/errors';
export { readingText } from './en/reading';
export { shellText } from './en/shell';
export { stampPlaceText } from './en/stamp-places';
export { strengthText } from './en/strength';
