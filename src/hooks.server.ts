import { randomBytes } from 'node:crypto';
import { building } from '$app/environment';
import { ensureDemoPeople } from '$lib/server/accounts';
import type { Actor } from '$lib/server/actor';
import { config } from '$lib/server/config';
import { isForeign } from '$lib/server/foreign';
import { clearGround, layGround } from '$lib/server/ground';
import { handOver } from '$lib/server/handover';
import { problemResponse, refusalOf, refuse } from '$lib/server/http';
import { presentPages } from '$lib/server/kept-pages';
import { log, maskAddress } from '$lib/server/log';
import { start, stop, type WatchEvent } from '$lib/server/reference';
import {
	actorOfRequest,
	auth,
	checkSignIn,
	hasSession,
	waitBeforeEntry
} from '$lib/server/sign-in';
import { errorText } from '$lib/text/en';
import { interfaceText } from '$lib/text/en/interface';
import type { Handle, HandleServerError, ServerInit } from '@sveltejs/kit';

let stopped: Promise<void> | undefined;
/** Closes what this process holds open; whoever asks again waits for the same. */
const stopOnce = () => (stopped ??= Promise.all([stop(), clearGround()]).then(() => undefined));

export const init: ServerInit = async () => {
	if (building) return;
	// The adapter's own server ends with this event, ours with the function handed over.
	process.on('sveltekit:shutdown', () => void stopOnce());
	checkSignIn();
	handOver({ config: config(), log: log(), maskAddress, present: presentPages, stop: stopOnce });
	const ground = layGround(config().databaseUrl);
	await start(config().databaseUrl, { onEvent: tell });
	if (config().demo)
		await ensureDemoPeople(ground).catch((error: unknown) =>
			log().error({ err: error }, 'the people of the demonstration are missing')
		);
};

function tell(event: WatchEvent): void {
	if ('error' in event) log().error({ err: event.error }, event.event);
	else log().info(event);
}

const LINK_CALLBACK = '/auth/callback/link';

export const handle: Handle = async ({ event, resolve }) => {
	const { request, locals, url } = event;
	locals.requestId = request.headers.get('x-request-id') ?? randomBytes(8).toString('hex');

	if (isForeign(request, url)) return problemResponse(403, errorText.foreign);

	const wait = request.method === 'POST' ? waitBeforeEntry(event) : 0;
	if (wait > 0)
		return problemResponse(429, interfaceText.tooMany(wait), [], { 'retry-after': String(wait) });

	let asked: Promise<Actor> | undefined;
	locals.actor = () => (asked ??= actorOfRequest(event));

	// Of the library's own addresses one is needed, the one that links in mails lead on to.
	const response =
		request.method === 'GET' && url.pathname === LINK_CALLBACK
			? await auth.handle({ event, resolve })
			: await resolve(event);
	const opened = response.headers.has('set-cookie');
	if (asked !== undefined || opened) keepPrivate(response, opened || hasSession(event));
	return locals.failure && response.status === 500
		? answerFailure(response, locals.failure, url.pathname.startsWith('/api/'))
		: response;
};

/** What was made for somebody is kept by nobody, and what was made for nobody is not shown to somebody. */
function keepPrivate({ headers }: Response, forSomebody: boolean): void {
	// A file of theirs may stay in their own browser for as long as its address holds.
	const ownToThem = headers.get('cache-control')?.startsWith('private') ?? false;
	if (forSomebody && !ownToThem) headers.set('cache-control', 'private, no-store');
	headers.append('vary', 'cookie');
}

/** The framework knows one status for what is thrown; a failure that was foreseen has its own. */
function answerFailure(
	response: Response,
	{ id, refusal }: NonNullable<App.Locals['failure']>,
	isApi: boolean
): Response {
	if (isApi)
		return refusal
			? refuse(refusal)
			: problemResponse(500, `${errorText.broken.title}. ${errorText.id} ${id}.`);
	if (!refusal) return response;
	const answer = new Response(response.body, {
		status: refusal.status,
		headers: response.headers
	});
	for (const [name, value] of Object.entries(refusal.headers)) answer.headers.set(name, value);
	return answer;
}

export const handleError: HandleServerError = ({ error, event, status, message }) => {
	// What stands at no address is no failure of ours.
	if (status < 500) return { message };
	const id = randomBytes(5).toString('hex');
	const refusal = refusalOf(error);
	event.locals.failure = { id, refusal };
	const told = refusal && {
		message: refusal.message,
		status: refusal.status,
		code: refusal.errors[0]?.code
	};
	// Somebody asked for what is not there.
	if (told && told.status < 500) return told;
	const { requestId } = event.locals;
	const fields = { err: error, error_id: id, request_id: requestId, route: event.route.id };
	if (told) log().warn(fields, 'foreseen');
	else log().error(fields, 'unforeseen');
	return { message: errorText.broken.title, ...told, id };
};
