import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';
import type { Source } from '../../../types';
import type { Versioned } from './versioned';

/** A version of a source as it is stored. */
export interface SourceRecord extends Versioned, Omit<Source, 'key'> {
	source_key: string;
}

export const defineSource = (
	sequelize: Sequelize
): ModelStatic<Model<SourceRecord, SourceRecord>> =>
	sequelize.define('sources', {
		source_key: { type: DataTypes.STRING(80), primaryKey: true },
		version: { type: DataTypes.INTEGER.UNSIGNED, primaryKey: true },
		title: { type: DataTypes.STRING(300), allowNull: false },
		publisher: { type: DataTypes.STRING(200), allowNull: false },
		year: DataTypes.SMALLINT.UNSIGNED,
		kind: { type: DataTypes.STRING(32), allowNull: false },
		seen_at: { type: DataTypes.STRING(500), allowNull: false },
		licence: { type: DataTypes.STRING(200), allowNull: false },
		repeats: DataTypes.STRING(80),
		edition_from: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
		edition_to: DataTypes.INTEGER.UNSIGNED
	});
