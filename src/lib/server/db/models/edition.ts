import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';
import { EDITION_CAUSES, type EditionCause } from '../../../types';

export interface EditionRecord {
	number: number;
	parent: number | null;
	digest: string;
	cause: EditionCause;
	/** What made it: the number of a release load, a correction's id. */
	cause_id: string | null;
	/** Whom to thank, as they chose to be named. */
	credits: readonly string[] | null;
	made_at: Date;
}

export const defineEdition = (
	sequelize: Sequelize
): ModelStatic<Model<EditionRecord, EditionRecord>> =>
	sequelize.define('editions', {
		number: { type: DataTypes.INTEGER.UNSIGNED, primaryKey: true },
		parent: DataTypes.INTEGER.UNSIGNED,
		digest: { type: DataTypes.CHAR(64), allowNull: false },
		cause: { type: DataTypes.ENUM(...EDITION_CAUSES), allowNull: false },
		cause_id: DataTypes.STRING(64),
		credits: DataTypes.JSON,
		made_at: { type: DataTypes.DATE(3), allowNull: false }
	});
