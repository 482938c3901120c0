import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';
import type { Claim } from '../../../types';
import type { Versioned } from './versioned';

/** A version of a claim of completeness as it is stored: scope columns hold cells. */
export interface ClaimRecord extends Versioned, Omit<Claim, 'table' | 'division' | 'line'> {
	table_name: Claim['table'];
	division: string;
	line: string;
}

export const defineClaim = (sequelize: Sequelize): ModelStatic<Model<ClaimRecord, ClaimRecord>> =>
	sequelize.define('claims', {
		claim_key: { type: DataTypes.STRING(80), primaryKey: true },
		version: { type: DataTypes.INTEGER.UNSIGNED, primaryKey: true },
		maker: { type: DataTypes.STRING(16), allowNull: false },
		table_name: { type: DataTypes.STRING(32), allowNull: false },
		division: { type: DataTypes.STRING(400), allowNull: false },
		line: { type: DataTypes.STRING(400), allowNull: false },
		years_from: DataTypes.SMALLINT.UNSIGNED,
		years_to: DataTypes.SMALLINT.UNSIGNED,
		source: { type: DataTypes.STRING(80), allowNull: false },
		note: { type: DataTypes.STRING(600), allowNull: false },
		edition_from: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
		edition_to: DataTypes.INTEGER.UNSIGNED
	});
