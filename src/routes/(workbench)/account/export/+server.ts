import { exportOwnData } from '$lib/server/accounts';
import { ground } from '$lib/server/ground';
import { signedIn } from '$lib/server/sign-in';
import type { RequestHandler } from './$types';

export const GET: RequestHandler = async (event) => {
	const data = await exportOwnData(ground(), await signedIn(event));
	return new Response(`${JSON.stringify(data, null, '\t')}\n`, {
		headers: {
			'content-type': 'application/json',
			'content-disposition': 'attachment; filename="tallyplate-your-data.json"'
		}
	});
};
