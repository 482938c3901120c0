import { env } from '$env/dynamic/private';

const items = Array.from(
	{ length: Number(env.BARE_ITEMS) },
	(_, n) => `Line ${n} of a page of text`
);

export const load = () => ({ items });
