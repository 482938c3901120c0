import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';

/** How often something was tried in a window of time. */
export interface SharedCounterRecord {
	counter_key: string;
	window_from: Date;
	used: number;
	expires_at: Date;
}

export const defineSharedCounter = (
	sequelize: Sequelize
): ModelStatic<Model<SharedCounterRecord, SharedCounterRecord>> =>
	sequelize.define('shared_counters', {
		counter_key: { type: DataTypes.STRING(160), primaryKey: true },
		window_from: { type: DataTypes.DATE(3), primaryKey: true },
		used: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
		expires_at: { type: DataTypes.DATE(3), allowNull: false }
	});
