import { status } from '$lib/server/reference';
import { json } from '@sveltejs/kit';

/** Whether readings can be answered. They can without the database, once tables are in memory. */
export const GET = () => {
	const { tables, database } = status();
	const parts = { tables: tables === null ? 'none' : `edition ${tables}`, database };
	const health = tables === null ? 'down' : database === 'up' ? 'ok' : 'degraded';
	return json(
		{ status: health, parts },
		{ status: tables === null ? 503 : 200, headers: { 'cache-control': 'no-store' } }
	);
};
