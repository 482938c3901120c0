/** What the page of somebody's files shows. */
import { day } from '$lib/format/editions';
import { cameraTime } from '$lib/format/moments';
import { fileAddress, filesFor, type FileGround, type OwnFile } from '$lib/server/files';
import type { Actor } from '$lib/server/actor';
import { filesText as text, sizeOf } from '$lib/text/en/files';

/** Kind, size, measures and times, as far as they are known. */
function factsOf({ type, bytes, width, height, takenAt, createdAt }: OwnFile): string {
	return [
		type && text.kinds[type],
		bytes !== null && bytes > 0 && sizeOf(bytes),
		width !== null && height !== null && text.measures(width, height),
		takenAt !== null && text.taken(cameraTime(takenAt)),
		text.sent(day(createdAt.toISOString()))
	]
		.filter(Boolean)
		.join(', ');
}

/** What an action before has come to, as its redirect says in the address. */
function saidOf({ searchParams }: URL, files: readonly OwnFile[]): string | null {
	if (searchParams.has('deleted')) return text.deleted;
	const sent = files.find(({ id }) => id === searchParams.get('sent'));
	if (sent === undefined) return null;
	if (sent.state === 'ready') return text.kept(sent.name);
	return sent.state === 'refused' ? text.notKept(sent.name) : text.checking(sent.name);
}

export async function filesPage(ground: FileGround, actor: Actor, url: URL) {
	const files = await filesFor(ground, actor);
	const shown = files.map((file) => {
		const { id, name, state, refusal, sha256 } = file;
		const address = (rendition: 'whole' | 'view' | 'thumb') =>
			fileAddress(ground, actor, id, rendition);
		const isKept = state === 'ready';
		const isPicture = isKept && file.type !== 'application/pdf';
		return {
			id,
			name,
			state,
			standing: text.states[state],
			message: refusal && text.refusals[refusal],
			facts: factsOf(file),
			sha256,
			thumb: isPicture ? address('thumb') : null,
			view: isPicture ? address('view') : null,
			whole: isKept ? address('whole') : null
		};
	});
	return { files: shown, said: saidOf(url, files) };
}

export type FileShown = Awaited<ReturnType<typeof filesPage>>['files'][number];

/** What was wrong with a file that was sent, as a code of which the page has the words. @throws what is about no file */
export function codeOf(error: unknown): string {
	if (!(error instanceof Error) || !('code' in error)) throw error;
	if (error.code === 'file_refused') return (error as unknown as { refusal: string }).refusal;
	if (error.code === 'broken_form') return (error as unknown as { why: string }).why;
	if (error.code === 'storage_away') return error.code;
	throw error;
}
