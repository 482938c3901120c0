/** The typed client of the interface. */
export {
	ApiProblem,
	ApiUnreachable,
	apiClient,
	everyItem,
	queryString,
	type ApiClient
} from './client';
