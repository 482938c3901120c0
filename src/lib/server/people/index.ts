/** People, as administrators see and change them: roles, areas, pauses, sessions. */
export { appointAdministrator } from './appoint';
export { endSessionsOf, pausePerson, resumePerson, setRole, type Seen } from './change';
export { ChangedMeanwhileError, OwnAccountError, UnknownPersonError } from './errors';
export {
	listPeople,
	PEOPLE_A_PAGE,
	showPerson,
	type PeopleQuery,
	type PersonListed,
	type PersonShown
} from './list';
