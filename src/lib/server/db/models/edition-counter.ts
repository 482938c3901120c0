import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';

/** The one row that says which edition is the newest. */
export interface EditionCounterRecord {
	id: 1;
	number: number;
}

export const defineEditionCounter = (
	sequelize: Sequelize
): ModelStatic<Model<EditionCounterRecord, EditionCounterRecord>> =>
	sequelize.define('edition_counter', {
		id: { type: DataTypes.TINYINT.UNSIGNED, primaryKey: true },
		number: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false }
	});
