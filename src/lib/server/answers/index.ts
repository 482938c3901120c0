/** The interface's answers: reference data and readings as its schemas promise them. */
export { makerFilter, readFormat, sourceKindFilter, tableAsked } from './filters';
export { answerEdition, answerEditions, editionNumber } from './editions';
export { answerHistory } from './history';
export { LAYOUT_LIST } from './layouts';
export { answerEditionList, answerFixedList, answerFromEdition } from './lists';
export { answerPostedReading, answerReading, answerStamps } from './readings';
export { citationsOf, itemEntry, rowAnswer, tableEntry } from './rows';
export { answerTable, TABLE_PARAMETERS } from './table';
