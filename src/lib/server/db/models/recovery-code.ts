import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';

export interface RecoveryCodeRecord {
	user_id: string;
	hash: string;
	used_at: Date | null;
}

export const defineRecoveryCode = (
	sequelize: Sequelize
): ModelStatic<Model<RecoveryCodeRecord, RecoveryCodeRecord>> =>
	sequelize.define('recovery_codes', {
		user_id: { type: DataTypes.STRING(32), primaryKey: true },
		hash: { type: DataTypes.STRING(64), primaryKey: true },
		used_at: DataTypes.DATE(3)
	});
