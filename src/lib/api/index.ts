/** The typed client of the interface. */
export { ApiProblem, ApiUnreachable, apiClient, everyItem, type ApiClient } from './client';
