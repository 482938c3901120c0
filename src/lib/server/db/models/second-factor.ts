import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';

export interface SecondFactorRecord {
	user_id: string;
	/** Sealed with the secret of the installation. */
	sealed_secret: string;
	created_at: Date;
	/** Null until a first code was given: it is not asked for before. */
	confirmed_at: Date | null;
	/** The step of 30 seconds whose code was taken last. */
	last_step: number;
}

export const defineSecondFactor = (
	sequelize: Sequelize
): ModelStatic<Model<SecondFactorRecord, SecondFactorRecord>> =>
	sequelize.define('second_factors', {
		user_id: { type: DataTypes.STRING(32), primaryKey: true },
		sealed_secret: { type: DataTypes.STRING(255), allowNull: false },
		created_at: { type: DataTypes.DATE(3), allowNull: false },
		confirmed_at: DataTypes.DATE(3),
		last_step: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false }
	});
