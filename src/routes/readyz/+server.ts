import { status } from '$lib/server/reference';
import { json } from '@sveltejs/kit';

/** Whether a balancer may send visitors here. While draining, the server answers in our place. */
export const GET = () => {
	const { tables, database } = status();
	const waits = tables === null ? 'tables' : database === 'down' ? 'database' : null;
	return json(
		{ status: waits === null ? 'ready' : `waiting for ${waits}` },
		{ status: waits === null ? 200 : 503, headers: { 'cache-control': 'no-store' } }
	);
};
