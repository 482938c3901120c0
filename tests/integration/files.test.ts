import { createHash } from 'node:crypto';
import { mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { buffer } from 'node:stream/consumers';
import sharp from 'sharp';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { startStore } from '../../scripts/local/store.mjs';
import { VISITOR } from '../../src/lib/server/actor';
import {
	answerTus,
	checkFileKind,
	deleteFile,
	expectFile,
	endFile,
	fileAddress,
	fileFor,
	filesFor,
	giveUpAbandoned,
	NO_STORE,
	openFile,
	removeFilesKind,
	s3Store,
	takePart,
	type FileGround,
	type Store
} from '../../src/lib/server/files';
import { runNext, stopWork, workFor } from '../../src/lib/server/jobs';
import { FILE_BYTES } from '../../src/lib/types';
import { DAY, HOUR, MINUTE, standingClock } from '../fixtures/clock';
import { openTestDatabase, type TestDatabase } from '../fixtures/database';
import { actorOf, addPerson } from '../fixtures/people';
import {
	heic,
	jpegThatSays,
	largeJpeg,
	pdf,
	phoneJpeg,
	plainPng,
	plainWebp,
	zip
} from '../fixtures/pictures';

const folder = mkdtempSync(join(tmpdir(), 'tallyplate-store-'));
let database: TestDatabase;
let store: Store;
let server: Awaited<ReturnType<typeof startStore>>;
let ann: ReturnType<typeof actorOf>;
let bob: ReturnType<typeof actorOf>;
let { clock, ahead } = standingClock();
let ground: FileGround;

const storeAt = ({ environment }: typeof server): Store =>
	s3Store({
		endpoint: environment['S3_ENDPOINT'],
		region: 'us-east-1',
		bucket: environment['S3_BUCKET']!,
		accessKeyId: environment['S3_ACCESS_KEY_ID']!,
		secretAccessKey: environment['S3_SECRET_ACCESS_KEY']!
	});

beforeAll(async () => {
	database = await openTestDatabase();
	server = await startStore(folder);
	store = storeAt(server);
	[ann, bob] = [actorOf(await addPerson(database)), actorOf(await addPerson(database))];
});
afterAll(async () => {
	await server.close();
	rmSync(folder, { recursive: true });
});
beforeEach(async () => {
	({ clock, ahead } = standingClock());
	await database.models.jobs.destroy({ where: {} });
	await database.models.files.destroy({ where: {} });
	await store.removeUnder('files/');
	ground = { database, clock, store, secret: 'a secret of the tests' };
});

async function* parts(...all: readonly Uint8Array[]) {
	yield* all;
}

const never = new AbortController().signal;
/** Does all that is due. */
async function work(kept: Store = store) {
	const kinds = [checkFileKind(kept), removeFilesKind(kept)];
	const results: string[] = [];
	for (;;) {
		const done = await runNext({ database, clock, kinds, worker: 'one', signal: never });
		if (done === null) return results;
		results.push(`${done.kind} ${done.result}`);
	}
}

async function send(bytes: Buffer, name = 'plate.jpg', owner = ann): Promise<string> {
	const id = await expectFile(ground, owner, { name, bytes: bytes.length });
	await takePart(ground, owner, id, 0, parts(bytes));
	return id;
}
const kept = async (bytes: Buffer, name?: string) => {
	const id = await send(bytes, name);
	await work();
	return fileFor(ground, ann, id);
};
/** An address as its route takes it apart. */
function asked(address: string) {
	const url = new URL(address, 'https://tallyplate.example');
	const [, , id = '', rendition = ''] = url.pathname.split('/');
	const [until, key] = ['until', 'key'].map((name) => url.searchParams.get(name)!);
	return { id, rendition, until: until!, key: key! };
}
const read = async (id: string, rendition: 'whole' | 'view' | 'thumb') => {
	const opened = await openFile(ground, ann, asked(fileAddress(ground, ann, id, rendition)));
	return { ...opened, body: await buffer(opened.body) };
};
const objects = () =>
	readdirSync(folder, { recursive: true, withFileTypes: true })
		.filter((entry) => entry.isFile() && entry.name.endsWith('_object'))
		.map((entry) => entry.name.replace(/\._S3rver_object$/, ''));

describe('a picture', () => {
	it('is turned upright and written anew, without its place; time and digest of what was sent stay', async () => {
		const sent = await phoneJpeg(400, 300);
		const file = await kept(sent);
		expect(file).toMatchObject({
			state: 'ready',
			name: 'plate.jpg',
			type: 'image/jpeg',
			width: 300,
			height: 400,
			takenAt: '2026-06-12T10:31:07+02:00',
			sha256: createHash('sha256').update(sent).digest('hex')
		});
		const whole = await read(file.id, 'whole');
		const meta = await sharp(whole.body).metadata();
		expect(meta).toMatchObject({ format: 'jpeg', width: 300, height: 400 });
		expect([meta.exif, meta.xmp, meta.iptc, meta.orientation]).toEqual(Array(4).fill(undefined));
		expect(whole.body.includes('Invented Phones')).toBe(false);
		expect(file.bytes).toBe(whole.body.length);
		// The upper left corner of what was sent is the upper right one of what is kept.
		const corner = async (image: Buffer, left: number, top: number) =>
			[...(await sharp(image).extract({ left, top, width: 8, height: 8 }).stats()).channels].map(
				({ mean }) => Math.round(mean / 16)
			);
		expect(await corner(whole.body, 292, 0)).toEqual(await corner(sent, 0, 0));
	});

	it('comes in a size for the screen and one for lists', async () => {
		const { id } = await kept(await phoneJpeg(2400, 1200));
		expect(await sharp((await read(id, 'view')).body).metadata()).toMatchObject({
			format: 'jpeg',
			width: 800,
			height: 1600
		});
		expect(await sharp((await read(id, 'thumb')).body).metadata()).toMatchObject({
			format: 'jpeg',
			width: 160,
			height: 320
		});
	});

	it('leaves nothing of what was sent in the store', async () => {
		await kept(await phoneJpeg());
		expect(objects().sort()).toEqual(['thumb', 'view', 'whole']);
	});

	it.each([
		['PNG', plainPng, 'image/png'],
		['WebP', plainWebp, 'image/jpeg']
	])('may be a %s, and is kept as what reports can show', async (_what, make, type) => {
		expect(await kept(await make())).toMatchObject({
			state: 'ready',
			type,
			width: 200,
			height: 100,
			takenAt: null
		});
	});

	it('of 60 megapixels is taken', { timeout: 60_000 }, async () => {
		expect(await kept(await largeJpeg(9_000, 6_700))).toMatchObject({
			state: 'ready',
			width: 9_000,
			height: 6_700
		});
	});

	it('is known by its content, whatever its name says, and handed out under a name that fits', async () => {
		const { id, type } = await kept(await plainPng(), 'paper.pdf');
		expect(type).toBe('image/png');
		expect(await read(id, 'whole')).toMatchObject({ type: 'image/png', name: 'paper.png' });
	});

	it('with script in its name keeps it as text', async () => {
		const name = '<img src=x onerror=alert(1)>.jpg';
		expect((await kept(await phoneJpeg(), name)).name).toBe(name);
	});
});

describe('a PDF', () => {
	it('is kept as it came', async () => {
		const file = await kept(pdf(), 'build sheet.pdf');
		expect(file).toMatchObject({ state: 'ready', type: 'application/pdf', width: null });
		const { body, type, name } = await read(file.id, 'whole');
		expect(body.equals(pdf())).toBe(true);
		expect([type, name]).toEqual(['application/pdf', 'build sheet.pdf']);
		await expect(read(file.id, 'thumb')).rejects.toMatchObject({ code: 'unknown_file' });
	});
});

describe('at once, by its first bytes, is refused', () => {
	const html = Buffer.from(`<!doctype html><script>alert(1)</script>${' '.repeat(5_000)}`);
	const svg = Buffer.from(
		`<svg xmlns="http://www.w3.org/2000/svg"><script/>${' '.repeat(5_000)}</svg>`
	);
	it.each([
		['a phone’s own format', heic(), 'heic', /Settings, Camera, Formats, Most Compatible/],
		['a page', html, 'not_taken', /whatever its name says/],
		['a vector drawing', svg, 'not_taken', /JPEG, PNG, WebP or PDF/],
		['an archive', zip(), 'not_taken', /JPEG, PNG, WebP or PDF/],
		['a short text', Buffer.from('hello'), 'not_taken', /JPEG, PNG, WebP or PDF/]
	])('%s', async (_what, bytes, refusal, words) => {
		const sending = send(bytes);
		await expect(sending).rejects.toMatchObject({ code: 'file_refused', refusal });
		await expect(sending).rejects.toThrow(words);
		expect(await filesFor(ground, ann)).toEqual([]);
		expect(objects()).toEqual([]);
	});

	it('what is empty or too large, before a byte has come', async () => {
		const expecting = (bytes: number) => expectFile(ground, ann, { name: 'a.jpg', bytes });
		await expect(expecting(0)).rejects.toMatchObject({ refusal: 'empty' });
		await expect(expecting(FILE_BYTES + 1)).rejects.toMatchObject({ refusal: 'too_large' });
		await expecting(FILE_BYTES);
	});

	it('what goes on beyond the size that was said', async () => {
		const id = await expectFile(ground, ann, { name: 'a.jpg', bytes: 1_000 });
		const more = parts(await phoneJpeg());
		await expect(takePart(ground, ann, id, 0, more)).rejects.toMatchObject({
			refusal: 'too_large'
		});
		const endless = await expectFile(ground, ann, { name: 'a.jpg', bytes: null });
		const megabytes = Array<Buffer>(27).fill(Buffer.alloc(1024 ** 2, await phoneJpeg()));
		await expect(takePart(ground, ann, endless, 0, parts(...megabytes))).rejects.toMatchObject({
			refusal: 'too_large'
		});
	});
});

describe('after a look at the whole of it is refused', () => {
	it.each([
		['a JPEG that breaks off', async () => (await phoneJpeg()).subarray(0, 20_000), 'broken'],
		['a PNG that breaks off', async () => (await plainPng()).subarray(0, 20_000), 'broken'],
		['a WebP that breaks off', async () => (await plainWebp()).subarray(0, 5_000), 'broken'],
		['a PDF that breaks off', async () => pdf().subarray(0, 5_000), 'broken'],
		[
			'a JPEG that is a page after its head',
			async () => Buffer.concat([(await phoneJpeg()).subarray(0, 200), Buffer.alloc(9_000, '<p>')]),
			'broken'
		],
		['a picture of 101 megapixels', () => jpegThatSays(10_100, 10_000), 'too_many_pixels'],
		['a pixel bomb', () => jpegThatSays(65_500, 65_500), 'too_many_pixels']
	])('%s', async (_what, make, refusal) => {
		const file = await kept(await make());
		expect(file).toMatchObject({ state: 'refused', refusal, type: null });
		expect(objects()).toEqual([]);
		await expect(read(file.id, 'whole')).rejects.toMatchObject({ code: 'unknown_file' });
	});

	it('a piece too short to tell what it is', async () => {
		const bytes = heic();
		const id = await expectFile(ground, ann, { name: 'a.jpg', bytes: bytes.length });
		expect(await takePart(ground, ann, id, 0, parts(bytes.subarray(0, 500)))).toBe(500);
		await takePart(ground, ann, id, 500, parts(bytes.subarray(500)));
		await work();
		expect(await fileFor(ground, ann, id)).toMatchObject({ refusal: 'heic' });
	});
});

describe('a file on its way', () => {
	it('goes on where it was broken off, and only there', async () => {
		const bytes = await phoneJpeg();
		const id = await expectFile(ground, ann, { name: 'a.jpg', bytes: bytes.length });
		async function* breaking() {
			yield bytes.subarray(0, 9_000);
			throw new Error('the line broke');
		}
		await expect(takePart(ground, ann, id, 0, breaking())).rejects.toThrow('the line broke');
		// What was not a whole piece yet has to come again.
		expect(await takePart(ground, ann, id, 0, parts(bytes.subarray(0, 9_000)))).toBe(9_000);
		for (const from of [0, 8_999, 9_001])
			await expect(takePart(ground, ann, id, from, parts(bytes))).rejects.toMatchObject({
				code: 'wrong_place'
			});
		await takePart(ground, ann, id, 9_000, parts(bytes.subarray(9_000)));
		await work();
		expect(await fileFor(ground, ann, id)).toMatchObject({
			state: 'ready',
			sha256: createHash('sha256').update(bytes).digest('hex')
		});
	});

	it('takes one of two parts that come for the same place', async () => {
		const bytes = await phoneJpeg();
		const id = await expectFile(ground, ann, { name: 'a.jpg', bytes: bytes.length });
		const both = await Promise.allSettled([
			takePart(ground, ann, id, 0, parts(bytes)),
			takePart(ground, ann, id, 0, parts(bytes))
		]);
		expect(both.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
		await work();
		expect(await fileFor(ground, ann, id)).toMatchObject({ state: 'ready' });
		expect(objects()).toHaveLength(3);
	});

	it('of unknown size is whole when its sender says so', async () => {
		const id = await expectFile(ground, ann, { name: 'a.jpg', bytes: null });
		await takePart(ground, ann, id, 0, parts(await phoneJpeg()));
		expect(await work()).toEqual([]);
		await endFile(ground, ann, id);
		await endFile(ground, ann, id);
		await work();
		expect(await fileFor(ground, ann, id)).toMatchObject({ state: 'ready' });
		const nothing = await expectFile(ground, ann, { name: 'a.jpg', bytes: null });
		await expect(endFile(ground, ann, nothing)).rejects.toMatchObject({ refusal: 'empty' });
	});

	it('that does not go on for a day is thrown away', async () => {
		const bytes = await phoneJpeg();
		const id = await expectFile(ground, ann, { name: 'a.jpg', bytes: bytes.length });
		await takePart(ground, ann, id, 0, parts(bytes.subarray(0, 9_000)));
		ahead(23 * HOUR);
		expect(await giveUpAbandoned(ground)).toBe(0);
		ahead(2 * HOUR);
		expect(await giveUpAbandoned(ground)).toBe(1);
		await expect(fileFor(ground, ann, id)).rejects.toMatchObject({ code: 'unknown_file' });
	});

	it('finds no room beside twenty others', async () => {
		const expecting = () => expectFile(ground, bob, { name: 'a.jpg', bytes: 1_000 });
		for (let n = 0; n < 20; n += 1) await expecting();
		await expect(expecting()).rejects.toMatchObject({ refusal: 'full' });
	});

	it('shows its check as work, which its owner can stop', async () => {
		const id = await send(await phoneJpeg());
		const [check] = await workFor(ground, ann);
		expect(check).toMatchObject({ kind: 'check_file', state: 'due' });
		await stopWork(ground, ann, check!.id);
		await work();
		expect(await fileFor(ground, ann, id)).toMatchObject({ state: 'refused', refusal: 'stopped' });
	});
});

describe('when the store is away', () => {
	it('nothing is taken, and what came before stays to go on from', async () => {
		const bytes = await phoneJpeg();
		const id = await expectFile(ground, ann, { name: 'a.jpg', bytes: bytes.length });
		await takePart(ground, ann, id, 0, parts(bytes.subarray(0, 9_000)));
		const rest = () => parts(bytes.subarray(9_000));
		for (const away of [
			NO_STORE,
			storeAt({
				...server,
				environment: { ...server.environment, S3_ENDPOINT: 'http://127.0.0.1:1' }
			})
		])
			await expect(
				takePart({ ...ground, store: away }, ann, id, 9_000, rest())
			).rejects.toMatchObject({ code: 'storage_away' });
		await takePart(ground, ann, id, 9_000, rest());
		expect(await work(NO_STORE)).toEqual(['check_file later']);
		expect(await fileFor(ground, ann, id)).toMatchObject({ state: 'checking' });
		for (let hour = 0; hour < 12; hour += 1) {
			ahead(HOUR);
			await work(NO_STORE);
		}
		ahead(MINUTE);
		await work();
		expect(await fileFor(ground, ann, id)).toMatchObject({ state: 'ready' });
	});

	it('what is kept is not lost', async () => {
		const { id } = await kept(await phoneJpeg());
		const address = asked(fileAddress(ground, ann, id, 'whole'));
		await expect(openFile({ ...ground, store: NO_STORE }, ann, address)).rejects.toMatchObject({
			code: 'storage_away'
		});
		await openFile(ground, ann, address);
	});
});

describe('a worker that is killed', () => {
	it('leaves its file to the next, whatever it had written', async () => {
		const id = await send(await phoneJpeg());
		const dying: Store = {
			...store,
			put: async (key, body, type) => {
				await store.put(key, body, type);
				await new Promise(() => {});
			}
		};
		const kinds = [checkFileKind(dying)];
		void runNext({ database, clock, kinds, worker: 'dead', signal: never, heartbeatMs: HOUR });
		await expect.poll(objects).toContain('whole');
		ahead(2 * MINUTE);
		await work();
		expect(await fileFor(ground, ann, id)).toMatchObject({ state: 'ready' });
		expect(objects().sort()).toEqual(['thumb', 'view', 'whole']);
	});
});

describe('somebody else’s file', () => {
	it('is nowhere to be found, to be gone on with, or to be deleted', async () => {
		const { id } = await kept(await phoneJpeg());
		const arriving = await expectFile(ground, ann, { name: 'a.jpg', bytes: 1_000 });
		const unknown = { code: 'unknown_file' };
		await expect(fileFor(ground, bob, id)).rejects.toMatchObject(unknown);
		await expect(deleteFile(ground, bob, id)).rejects.toMatchObject(unknown);
		await expect(deleteFile(ground, bob, 'no such')).rejects.toMatchObject(unknown);
		await expect(takePart(ground, bob, arriving, 0, parts())).rejects.toMatchObject(unknown);
		await expect(endFile(ground, bob, arriving)).rejects.toMatchObject(unknown);
		expect(await filesFor(ground, bob)).toEqual([]);
		for (const work of [
			fileFor(ground, VISITOR, id),
			filesFor(ground, VISITOR),
			deleteFile(ground, VISITOR, id),
			expectFile(ground, VISITOR, { name: 'a', bytes: 1 })
		])
			await expect(work).rejects.toMatchObject({ code: 'sign_in_needed' });
	});

	it('is not sent by who is paused', async () => {
		const paused = { ...ann, paused: { until: new Date(clock().getTime() + DAY), reason: 'spam' } };
		await expect(expectFile(ground, paused, { name: 'a.jpg', bytes: 1_000 })).rejects.toMatchObject(
			{ code: 'paused' }
		);
	});
});

describe('an address', () => {
	it('is good for whom it was made, for what it names, and until it runs out', async () => {
		const { id } = await kept(await phoneJpeg());
		const address = asked(fileAddress(ground, ann, id, 'thumb'));
		const unknown = { code: 'unknown_file' };
		await openFile(ground, ann, address);
		const forged = [
			{ ...address, rendition: 'whole' },
			{ ...address, rendition: '../thumb' },
			{ ...address, until: String(Number(address.until) + 1) },
			{ ...address, until: 'Infinity' },
			{ ...address, key: `${address.key.slice(0, -1)}!` },
			{ ...address, key: '' },
			{ ...address, id: 'no such' }
		];
		for (const one of forged)
			await expect(openFile(ground, ann, one)).rejects.toMatchObject(unknown);
		await expect(openFile(ground, bob, address)).rejects.toMatchObject(unknown);
		await expect(openFile(ground, VISITOR, address)).rejects.toMatchObject({
			code: 'sign_in_needed'
		});
		await expect(openFile({ ...ground, secret: 'another' }, ann, address)).rejects.toMatchObject(
			unknown
		);
		ahead(59 * MINUTE);
		expect(fileAddress(ground, ann, id, 'thumb')).toContain(address.key);
		await openFile(ground, ann, address);
		ahead(61 * MINUTE);
		await expect(openFile(ground, ann, address)).rejects.toMatchObject(unknown);
	});

	it('of a deleted file is good for nothing, and its bytes go', async () => {
		const { id } = await kept(await phoneJpeg());
		const address = asked(fileAddress(ground, ann, id, 'thumb'));
		await deleteFile(ground, ann, id);
		await expect(openFile(ground, ann, address)).rejects.toMatchObject({ code: 'unknown_file' });
		expect(await filesFor(ground, ann)).toEqual([]);
		await work(NO_STORE);
		ahead(MINUTE);
		await work();
		expect(objects()).toEqual([]);
		expect(await database.models.files.count()).toBe(0);
	});
});

describe('the upload protocol', () => {
	const at = 'https://tallyplate.example/files/uploads';
	const tus = (
		method: string,
		address: string,
		headers: Record<string, string>,
		body?: Uint8Array<ArrayBuffer>,
		who: Parameters<typeof answerTus>[1] = ann
	) =>
		answerTus(
			ground,
			who,
			new Request(new URL(address, at), {
				method,
				headers: { 'tus-resumable': '1.0.0', ...headers },
				...(body && { body, duplex: 'half' })
			} as RequestInit)
		);
	const create = (bytes: number, name = 'plate.jpg') =>
		tus('POST', at, {
			'upload-length': String(bytes),
			'upload-metadata': `filename ${Buffer.from(name).toString('base64')}`
		});
	const patch = (address: string, offset: number, body: Buffer) =>
		tus(
			'PATCH',
			address,
			{ 'upload-offset': String(offset), 'content-type': 'application/offset+octet-stream' },
			new Uint8Array(body)
		);

	it('takes a file in parts, says how far it is, and asks no other origin in', async () => {
		const bytes = await phoneJpeg();
		const created = await create(bytes.length, 'the plate.jpg');
		expect(created.status).toBe(201);
		const address = created.headers.get('location')!;
		expect(address).toMatch(/^\/files\/uploads\/[0-9a-f]{32}$/);
		expect(created.headers.get('access-control-allow-origin')).toBeNull();
		expect((await patch(address, 0, bytes.subarray(0, 9_000))).status).toBe(204);
		const told = await tus('HEAD', address, {});
		expect(told.headers.get('upload-offset')).toBe('9000');
		expect(told.headers.get('upload-length')).toBe(String(bytes.length));
		const last = await patch(address, 9_000, bytes.subarray(9_000));
		expect(last.headers.get('upload-offset')).toBe(String(bytes.length));
		await work();
		expect(await filesFor(ground, ann)).toMatchObject([{ name: 'the plate.jpg', state: 'ready' }]);
	});

	it('refuses in words', async () => {
		const refusals: [Promise<Response>, number, string][] = [
			[create(FILE_BYTES + 1), 413, 'too_large'],
			[create(0), 422, 'empty'],
			[patch((await create(8_024)).headers.get('location')!, 0, heic()), 422, 'heic'],
			[patch((await create(8_024)).headers.get('location')!, 5, heic()), 409, 'upload_protocol'],
			[tus('HEAD', `${at}/no-such`, {}), 404, 'unknown_file'],
			[tus('POST', at, {}), 400, 'upload_protocol']
		];
		for (const [answer, status, code] of refusals) {
			const response = await answer;
			expect(response.status).toBe(status);
			expect(await response.json()).toMatchObject({ errors: [{ code }] });
		}
	});

	it('gives up what its sender no longer wants', async () => {
		const address = (await create(1_000)).headers.get('location')!;
		expect((await tus('DELETE', address, {})).status).toBe(204);
		expect((await tus('HEAD', address, {})).status).toBe(404);
	});

	it('knows nothing of the uploads of others', async () => {
		const address = (await create(1_000)).headers.get('location')!;
		expect((await tus('HEAD', address, {}, undefined, bob)).status).toBe(404);
		expect((await tus('DELETE', address, {}, undefined, bob)).status).toBe(404);
		expect((await tus('HEAD', address, {})).status).toBe(200);
	});
});
