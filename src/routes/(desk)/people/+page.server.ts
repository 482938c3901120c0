import { signedIn } from '$lib/server/sign-in';
import type { PageServerLoad } from './$types';
import { peoplePage } from './people-page.server';

export const load: PageServerLoad = async (event) => peoplePage(await signedIn(event), event.url);
