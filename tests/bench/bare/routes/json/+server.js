import { readFileSync } from 'node:fs';
import { json } from '@sveltejs/kit';
import { env } from '$env/dynamic/private';

/** @type {unknown} The object that the product answered, parsed at the first request. */
let answer;

export const GET = () => json((answer ??= JSON.parse(readFileSync(env.BARE_ANSWER ?? '', 'utf8'))));
