import { MAKERS, type Maker } from '$lib/types/makers';

/** A corporation's key. */
export const match = (param: string): param is Maker =>
	(MAKERS as readonly string[]).includes(param);
