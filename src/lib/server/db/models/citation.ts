import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';
import { READ_EXTENTS, STANCES, type Citation } from '../../../types';

/** A citation of one version of a row, in the order of the released tables. */
export interface CitationRecord extends Citation {
	version: number;
	position: number;
}

export const defineCitation = (
	sequelize: Sequelize
): ModelStatic<Model<CitationRecord, CitationRecord>> =>
	sequelize.define('citations', {
		row_key: { type: DataTypes.STRING(80), primaryKey: true },
		version: { type: DataTypes.INTEGER.UNSIGNED, primaryKey: true },
		position: { type: DataTypes.SMALLINT.UNSIGNED, primaryKey: true },
		source: { type: DataTypes.STRING(80), allowNull: false },
		stance: { type: DataTypes.ENUM(...STANCES), allowNull: false },
		read: DataTypes.ENUM(...READ_EXTENTS),
		locator: { type: DataTypes.STRING(200), allowNull: false },
		quotation: { type: DataTypes.STRING(400), allowNull: false },
		seen_on: DataTypes.DATEONLY
	});
