/** The interface's answers: reference data and readings as its schemas promise them. */
export { editionAsked } from './edition';
export {
	makerFilter,
	readFormat,
	readRowFilter,
	sourceKindFilter,
	tableAsked,
	type RowFilter
} from './filters';
export { answerEdition, answerEditions, editionNumber } from './editions';
export { answerHistory } from './history';
export { LAYOUT_LIST } from './layouts';
export { answerEditionList, answerFixedList, answerFromEdition } from './lists';
export { answerReading } from './readings';
export { citationsOf, itemEntry, rowAnswer, tableEntry, tableHead } from './rows';
export { answerTable, TABLE_PARAMETERS } from './table';
