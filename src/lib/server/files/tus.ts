import type { Readable } from 'node:stream';
import { DataStore, Server, Upload } from '@tus/server';
import { filesText } from '../../text/en/files';
import type { Actor } from '../actor';
import { fault, problemResponse, refusalOf } from '../http';
import { arrivalFor, expectFile, takePart } from './arrivals';
import { FileRefusedError, WrongPlaceError } from './errors';
import type { FileGround } from './ground';
import { deleteFile } from './mine';

/** Where uploads are asked for; each then has its id behind it. */
const PATH = '/files/uploads';

/** Files on their way, as the protocol's server sees them: those of who asks. */
class Arrivals extends DataStore {
	override extensions = ['creation', 'termination'];

	constructor(
		private readonly ground: FileGround,
		private readonly actor: Actor
	) {
		super();
	}

	override write(body: Readable, id: string, offset: number): Promise<number> {
		return takePart(this.ground, this.actor, id, offset, body);
	}

	override async getUpload(id: string): Promise<Upload> {
		const { received, bytes } = await arrivalFor(this.ground, this.actor, id);
		return new Upload({ id, offset: received, ...(bytes !== null && { size: bytes }) });
	}

	override remove(id: string): Promise<void> {
		return deleteFile(this.ground, this.actor, id);
	}
}

interface Failure {
	readonly status: number;
	readonly code: string;
	readonly message: string;
}

/** How a failure is answered; null for one that the protocol's server knows itself. @throws what was not foreseen */
function failureOf(error: unknown): Failure | null {
	if (!(error instanceof Error)) return null;
	const { message } = error;
	if (error instanceof FileRefusedError) {
		const status = error.refusal === 'too_large' ? 413 : 422;
		return { status, code: error.refusal, message };
	}
	if (error instanceof WrongPlaceError) return { status: 409, code: error.code, message };
	const refusal = refusalOf(error);
	return refusal && { status: refusal.status, code: refusal.errors[0]?.code ?? '', message };
}

/**
 * Answers one request of the resumable upload protocol (tus 1.0) for who asks. What is refused is said in words, as
 * everywhere in the interface.
 */
export async function answerTus(
	ground: FileGround,
	actor: Actor,
	request: Request
): Promise<Response> {
	let failure: Failure | null = null;
	let unforeseen: unknown = null;
	const server = new Server({
		path: PATH,
		relativeLocation: true,
		datastore: new Arrivals(ground, actor),
		// Our own pages alone.
		allowedOrigins: [],
		namingFunction: (asked, metadata) =>
			expectFile(ground, actor, {
				name: metadata?.['filename'] ?? '',
				bytes: Number(asked.headers.get('upload-length'))
			}),
		async onResponseError(_asked, error) {
			failure = failureOf(error);
			if (failure !== null) return { status_code: failure.status, body: failure.message };
			if (error instanceof Error && !('status_code' in error)) unforeseen = error;
			return undefined;
		}
	});
	const response = await server.handleWeb(request);
	if (unforeseen !== null) throw unforeseen;
	if (response.status < 400) return response;
	const { status, code, message } = failure ?? {
		status: response.status,
		code: 'upload_protocol',
		message: filesText.protocol
	};
	return problemResponse(status, message, [fault('file', code, message)], {
		'tus-resumable': '1.0.0'
	});
}
