import type { Upload } from 'tus-js-client';
import { filesText } from '../../text/en/files';
import { FILE_BYTES, type SentFileState } from '../../types';

/** How a file stands that is being sent from this page. */
export type SendingState = 'waits' | 'sending' | 'checking' | 'ready' | 'refused' | 'broken';

const ENDPOINT = '/files/uploads';
/** So much has to be sent again at most when the line breaks. */
const CHUNK_BYTES = 1024 * 1024;
const RETRY_DELAYS_MS = [0, 1_000, 3_000, 10_000, 30_000];
const LOOK_MS = 700;
/** At once; more would share the same line. */
const AT_ONCE = 2;

/** One file that is being sent. */
export class SendingFile {
	readonly name: string;
	state = $state<SendingState>('waits');
	/** Bytes that have arrived, of `bytes`. */
	sent = $state(0);
	readonly bytes: number;
	/** Why it was refused, or that the line broke. */
	message = $state('');
	/** Once there is one. */
	id = $state<string | null>(null);
	thumb = $state<string | null>(null);
	#upload: Upload | undefined;
	#gone = false;

	constructor(
		private readonly file: File,
		private readonly settled: (file: SendingFile) => void
	) {
		this.name = file.name;
		this.bytes = file.size;
	}

	get percent(): number {
		return this.bytes === 0 ? 0 : Math.floor((this.sent * 100) / this.bytes);
	}

	/** Begins, or goes on where it was broken off: also after the page was closed in between. */
	async start(): Promise<void> {
		this.message = '';
		if (this.bytes === 0) return this.#refuse(filesText.refusals.empty);
		if (this.bytes > FILE_BYTES) return this.#refuse(filesText.refusals.too_large);
		this.state = 'sending';
		const { Upload } = await import('tus-js-client');
		if (this.#gone) return;
		this.#upload ??= new Upload(this.file, {
			endpoint: ENDPOINT,
			chunkSize: CHUNK_BYTES,
			retryDelays: RETRY_DELAYS_MS,
			metadata: { filename: this.file.name },
			removeFingerprintOnSuccess: true,
			onProgress: (sent) => (this.sent = sent),
			onSuccess: () => void this.#watch(),
			onError: (error) => this.#fail(error)
		});
		const [before] = await this.#upload.findPreviousUploads();
		if (before) this.#upload.resumeFromPreviousUpload(before);
		this.#upload.start();
	}

	/** Sends no more, and has what came thrown away. */
	async stop(): Promise<void> {
		this.#gone = true;
		await this.#upload?.abort(true).catch(() => undefined); // Nobody asks for it any more.
	}

	#refuse(message: string): void {
		this.state = 'refused';
		this.message = message;
		this.settled(this);
	}

	/** The server refuses in words; a line that breaks has none. */
	#fail(error: Error): void {
		const response = (error as { originalResponse?: { getBody(): string } | null })
			.originalResponse;
		const said = response ? detailOf(response.getBody()) : null;
		if (said !== null) return this.#refuse(said);
		this.state = 'broken';
		this.message = filesText.field.broken;
		this.settled(this);
	}

	async #watch(): Promise<void> {
		this.state = 'checking';
		this.id = this.#upload?.url?.split('/').at(-1) ?? null;
		while (!this.#gone && this.state === 'checking') {
			await new Promise((done) => setTimeout(done, LOOK_MS));
			const told = await stateOf(this.id);
			if (told?.state === 'refused') return this.#refuse(told.message ?? '');
			if (told?.state !== 'ready') continue;
			this.thumb = told.thumb;
			this.state = 'ready';
			this.settled(this);
		}
	}
}

/** Null while the line is down: it is asked again. */
async function stateOf(id: string | null): Promise<SentFileState | null> {
	try {
		const response = await fetch(`/files/${id}/state`);
		return response.ok ? await response.json() : null;
	} catch (error) {
		if (error instanceof TypeError) return null;
		throw error;
	}
}

function detailOf(body: string): string | null {
	try {
		const { detail } = JSON.parse(body) as { detail?: unknown };
		return typeof detail === 'string' ? detail : null;
	} catch (error) {
		if (error instanceof SyntaxError) return null;
		throw error;
	}
}

/** All files that are sent from one field, a few at a time. */
export class Sending {
	files = $state<SendingFile[]>([]);

	/** @param kept is told of each file that is kept */
	constructor(private readonly kept: (file: SendingFile) => void) {}

	add(chosen: Iterable<File>): void {
		for (const file of chosen) this.files.push(new SendingFile(file, (one) => this.#settled(one)));
		this.#next();
	}

	again(file: SendingFile): void {
		file.state = 'waits';
		this.#next();
	}

	async remove(file: SendingFile): Promise<void> {
		this.files = this.files.filter((one) => one !== file);
		await file.stop();
		this.#next();
	}

	#settled(file: SendingFile): void {
		if (file.state === 'ready') this.kept(file);
		this.#next();
	}

	#next(): void {
		const busy = this.files.filter(({ state }) => state === 'sending').length;
		const waiting = this.files.filter(({ state }) => state === 'waits');
		for (const file of waiting.slice(0, AT_ONCE - busy)) void file.start();
	}
}
