import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';
import { FILE_STATES, type FileRefusal, type FileState, type KeptType } from '../../../types';

export interface FileRecord {
	id: string;
	/** Null once its owner's account is gone. */
	owner: string | null;
	/** As its sender named it: text, never a path. */
	name: string;
	state: FileState;
	refusal: FileRefusal | null;
	/** What its objects' keys begin with. */
	storage_key: string;
	/** Of what is kept; null before. */
	media_type: KeptType | null;
	/** Of what was sent; null while it is not known how much will come. */
	bytes: number | null;
	/** How much of it has come. */
	received: number;
	kept_bytes: number | null;
	/** Of what was sent, in hexadecimal. */
	sha256: string | null;
	width: number | null;
	height: number | null;
	/** What the camera's clock said: ISO 8601, with an offset where the camera knew one. */
	taken_at: string | null;
	created_at: Date;
	/** When something last came. */
	touched_at: Date | null;
	/** Its objects go soon after. */
	deleted_at: Date | null;
}

export interface FilePieceRecord {
	file_id: string;
	at_byte: number;
	bytes: number;
	object_key: string;
}

export const defineFile = (sequelize: Sequelize): ModelStatic<Model<FileRecord, FileRecord>> =>
	sequelize.define('files', {
		id: { type: DataTypes.STRING(32), primaryKey: true },
		owner: DataTypes.STRING(32),
		name: { type: DataTypes.STRING(200), allowNull: false },
		state: { type: DataTypes.ENUM(...FILE_STATES), allowNull: false },
		refusal: DataTypes.STRING(32),
		storage_key: { type: DataTypes.STRING(160), allowNull: false },
		media_type: DataTypes.STRING(100),
		bytes: DataTypes.INTEGER.UNSIGNED,
		received: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
		kept_bytes: DataTypes.INTEGER.UNSIGNED,
		sha256: DataTypes.CHAR(64),
		width: DataTypes.SMALLINT.UNSIGNED,
		height: DataTypes.SMALLINT.UNSIGNED,
		taken_at: DataTypes.STRING(32),
		created_at: { type: DataTypes.DATE(3), allowNull: false },
		touched_at: DataTypes.DATE(3),
		deleted_at: DataTypes.DATE(3)
	});

export const defineFilePiece = (
	sequelize: Sequelize
): ModelStatic<Model<FilePieceRecord, FilePieceRecord>> =>
	sequelize.define('file_pieces', {
		file_id: { type: DataTypes.STRING(32), primaryKey: true },
		at_byte: { type: DataTypes.INTEGER.UNSIGNED, primaryKey: true },
		bytes: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
		object_key: { type: DataTypes.STRING(160), allowNull: false }
	});
