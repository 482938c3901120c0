import type { Actor } from '$lib/server/actor';
import type { Refusal } from '$lib/server/http';

declare global {
	namespace App {
		interface Error {
			message: string;
			/** Names this failure in the log; absent where nothing failed on our side. */
			id?: string;
			/** Which foreseen failure it was, as `database_away`; absent for what was not foreseen. */
			code?: string;
			/** The status that was answered, where the framework takes it for 500. */
			status?: number;
		}
		interface Locals {
			/** Stands in the log and on the answer as X-Request-Id. */
			requestId: string;
			/** Who asks: looked up when first asked for, and once. Rejects where the database is away. */
			actor: () => Promise<Actor>;
			/** What went wrong on our side, and how it is answered in place of 500 where it was foreseen. */
			failure?: {
				readonly id: string;
				readonly refusal: Refusal | null;
			};
		}
	}
}

export {};
