import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';
import type { Maker, RowValues, ScopeColumn, TableName } from '../../../types';
import type { Versioned } from './versioned';

/** A version of a row as it is stored: scope columns hold the cells of the released tables. */
export interface ReferenceRowRecord extends Versioned, Record<ScopeColumn, string> {
	row_key: string;
	maker: Maker;
	table_name: TableName;
	years_from: number | null;
	years_to: number | null;
	code: string;
	meaning: string;
	values: RowValues;
	note: string;
}

/** A new object each: Sequelize writes the column's name into it. */
const scope = () => ({ type: DataTypes.STRING(400), allowNull: false });

export const defineReferenceRow = (
	sequelize: Sequelize
): ModelStatic<Model<ReferenceRowRecord, ReferenceRowRecord>> =>
	sequelize.define('reference_rows', {
		row_key: { type: DataTypes.STRING(80), primaryKey: true },
		version: { type: DataTypes.INTEGER.UNSIGNED, primaryKey: true },
		maker: { type: DataTypes.STRING(16), allowNull: false },
		table_name: { type: DataTypes.STRING(32), allowNull: false },
		division: scope(),
		line: scope(),
		body: scope(),
		engine: scope(),
		plant: scope(),
		market: scope(),
		years_from: DataTypes.SMALLINT.UNSIGNED,
		years_to: DataTypes.SMALLINT.UNSIGNED,
		code: { type: DataTypes.STRING(64), allowNull: false },
		meaning: { type: DataTypes.STRING(600), allowNull: false },
		values: { type: DataTypes.JSON, allowNull: false },
		note: { type: DataTypes.STRING(1200), allowNull: false },
		edition_from: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
		edition_to: DataTypes.INTEGER.UNSIGNED
	});
