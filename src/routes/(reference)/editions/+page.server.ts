import { admit } from '$lib/server/http';
import { current, editions } from '$lib/server/reference';
import type { PageServerLoad } from './$types';
import { editionEntries, PAGE } from './entries.server';

export const load: PageServerLoad = async ({ url, getClientAddress }) => {
	admit(getClientAddress());
	const asked = Number(url.searchParams.get('below'));
	const below = Number.isSafeInteger(asked) && asked > 0 ? asked : undefined;
	const heads = await editions({ below, limit: PAGE + 1 });
	const shown = heads.slice(0, PAGE);
	return {
		present: current().head.number,
		editions: await editionEntries(shown),
		older: heads.length > PAGE ? (shown.at(-1)?.number ?? null) : null,
		isFirstPage: below === undefined
	};
};
