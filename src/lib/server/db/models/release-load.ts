import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';

export interface ReleaseLoadRecord {
	/** 1 is the first release that this database was given. */
	number: number;
	/** The edition that was the newest when it had been merged. */
	edition: number;
	digest: string;
	/** The release as it was released: JSON of its content, gzip. */
	content: Buffer;
	loaded_at: Date;
}

export const defineReleaseLoad = (
	sequelize: Sequelize
): ModelStatic<Model<ReleaseLoadRecord, ReleaseLoadRecord>> =>
	sequelize.define('release_loads', {
		number: { type: DataTypes.INTEGER.UNSIGNED, primaryKey: true },
		edition: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
		digest: { type: DataTypes.CHAR(64), allowNull: false },
		content: { type: DataTypes.BLOB('long'), allowNull: false },
		loaded_at: { type: DataTypes.DATE(3), allowNull: false }
	});
