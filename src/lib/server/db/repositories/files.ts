import { Op, type Transaction } from 'sequelize';
import type { Database } from '../connection';
import type { FilePieceRecord, FileRecord } from '../models';

/** A file that is about to come. */
export type NewFile = Pick<
	FileRecord,
	'id' | 'owner' | 'name' | 'storage_key' | 'bytes' | 'created_at'
>;

const NOTHING_YET = {
	state: 'arriving',
	refusal: null,
	media_type: null,
	received: 0,
	kept_bytes: null,
	sha256: null,
	width: null,
	height: null,
	taken_at: null,
	deleted_at: null
} as const;

export async function addFile(
	{ models }: Database,
	file: NewFile,
	transaction?: Transaction
): Promise<void> {
	await models.files.create(
		{ ...NOTHING_YET, ...file, touched_at: file.created_at },
		{ transaction }
	);
}

/** A file that is not deleted; null when there is none. */
export async function fileById({ models }: Database, id: string): Promise<FileRecord | null> {
	const found = await models.files.findOne({ where: { id, deleted_at: null } });
	return found && found.get({ plain: true });
}

/** Somebody's files, newest first. */
export async function filesOf({ models }: Database, owner: string): Promise<FileRecord[]> {
	const found = await models.files.findAll({
		where: { owner, deleted_at: null },
		order: [
			['created_at', 'DESC'],
			['id', 'ASC']
		]
	});
	return found.map((one) => one.get({ plain: true }));
}

/** How many files somebody has that are not refused, how many of them are arriving, and their bytes. */
export async function roomTakenBy(
	{ models }: Database,
	owner: string
): Promise<{ files: number; arriving: number; bytes: number }> {
	const found = await models.files.findAll({
		attributes: ['state', 'bytes', 'kept_bytes'],
		where: { owner, deleted_at: null, state: { [Op.ne]: 'refused' } },
		raw: true
	});
	const records = found as unknown as Pick<FileRecord, 'state' | 'bytes' | 'kept_bytes'>[];
	return {
		files: records.length,
		arriving: records.filter(({ state }) => state === 'arriving').length,
		bytes: records.reduce((sum, { bytes, kept_bytes }) => sum + (kept_bytes ?? bytes ?? 0), 0)
	};
}

/**
 * Adds a piece where the file ends so far. Answers false when it ends elsewhere by now, or takes no more:
 * of two that send the same piece, one is too late.
 */
export async function addPiece(
	{ models }: Database,
	piece: FilePieceRecord,
	now: Date,
	transaction: Transaction
): Promise<boolean> {
	const [grown] = await models.files.update(
		{ received: piece.at_byte + piece.bytes, touched_at: now },
		{
			where: { id: piece.file_id, state: 'arriving', received: piece.at_byte, deleted_at: null },
			transaction
		}
	);
	if (grown === 0) return false;
	await models.filePieces.create(piece, { transaction });
	return true;
}

/** The pieces of a file, in their order. */
export async function piecesOf(
	{ models }: Database,
	file_id: string,
	transaction?: Transaction
): Promise<FilePieceRecord[]> {
	const found = await models.filePieces.findAll({
		where: { file_id },
		order: ['at_byte'],
		transaction
	});
	return found.map((one) => one.get({ plain: true }));
}

/** Changes a file that stands in a given state. Answers false when it does not any more. */
export async function changeFile(
	{ models }: Database,
	id: string,
	from: FileRecord['state'],
	changes: Partial<FileRecord>,
	transaction?: Transaction
): Promise<boolean> {
	const [changed] = await models.files.update(changes, {
		where: { id, state: from, deleted_at: null },
		transaction
	});
	return changed > 0;
}

/** Forgets which pieces a file came in. */
export async function forgetPieces(
	{ models }: Database,
	file_id: string,
	transaction: Transaction
): Promise<void> {
	await models.filePieces.destroy({ where: { file_id }, transaction });
}

/** Marks a file as deleted; its objects go with the next clean-up. Answers false when there is none. */
export async function deleteFile(
	{ models }: Database,
	{ id, owner }: { id: string; owner: string },
	now: Date,
	transaction: Transaction
): Promise<boolean> {
	const [changed] = await models.files.update(
		{ deleted_at: now },
		{ where: { id, owner, deleted_at: null }, transaction }
	);
	return changed > 0;
}

/** Marks all files of somebody as deleted, and takes their name and owner off at once. */
export async function deleteFilesOf(
	{ models }: Database,
	owner: string,
	now: Date,
	transaction: Transaction
): Promise<void> {
	await models.files.update(
		{ deleted_at: now, owner: null, name: '' },
		{ where: { owner, deleted_at: null }, transaction }
	);
}

/** Marks files as deleted that nothing has come of since a time. */
export async function deleteAbandoned(
	{ models }: Database,
	before: Date,
	now: Date
): Promise<number> {
	const [changed] = await models.files.update(
		{ deleted_at: now },
		{ where: { state: 'arriving', touched_at: { [Op.lt]: before }, deleted_at: null } }
	);
	return changed;
}

/** Files whose objects are still to go. */
export async function deletedFiles({ models }: Database, limit: number): Promise<FileRecord[]> {
	const found = await models.files.findAll({
		where: { deleted_at: { [Op.ne]: null } },
		order: ['deleted_at'],
		limit
	});
	return found.map((one) => one.get({ plain: true }));
}

/** Files that were checked, and whose pieces are still on record. */
export async function filesWithLeftovers(
	{ models }: Database,
	limit: number
): Promise<FileRecord[]> {
	const pieces = await models.filePieces.findAll({
		attributes: ['file_id'],
		group: 'file_id',
		raw: true
	});
	const found = await models.files.findAll({
		where: {
			id: (pieces as unknown as FilePieceRecord[]).map(({ file_id }) => file_id),
			state: ['ready', 'refused'],
			deleted_at: null
		},
		limit
	});
	return found.map((one) => one.get({ plain: true }));
}

/** Takes a file off the record, once its objects are gone. */
export async function forgetFile({ models }: Database, id: string): Promise<void> {
	await models.files.destroy({ where: { id, deleted_at: { [Op.ne]: null } } });
}
