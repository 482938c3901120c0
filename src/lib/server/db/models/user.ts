import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';
import { ROLES, type Division, type Role } from '../../../types';

export interface UserRecord {
	id: string;
	/** Null once the account is deleted, as is the address. */
	name: string | null;
	email: string | null;
	email_verified_at: Date | null;
	password_hash: string | null;
	role: Role;
	/** Divisions that a moderator decides for. */
	areas: Division[];
	paused_until: Date | null;
	pause_reason: string | null;
	/** The license that their contributions are under, as it was named to them. */
	consented_to: string | null;
	consented_at: Date | null;
	/** Made up for a demonstration. */
	demo: boolean;
	version: number;
	created_at: Date;
	deleted_at: Date | null;
}

export const defineUser = (sequelize: Sequelize): ModelStatic<Model<UserRecord, UserRecord>> =>
	sequelize.define('users', {
		id: { type: DataTypes.STRING(32), primaryKey: true },
		name: DataTypes.STRING(120),
		email: DataTypes.STRING(254),
		email_verified_at: DataTypes.DATE(3),
		password_hash: DataTypes.STRING(255),
		role: { type: DataTypes.ENUM(...ROLES), allowNull: false },
		areas: { type: DataTypes.JSON, allowNull: false },
		paused_until: DataTypes.DATE(3),
		pause_reason: DataTypes.STRING(300),
		consented_to: DataTypes.STRING(32),
		consented_at: DataTypes.DATE(3),
		demo: { type: DataTypes.BOOLEAN, allowNull: false },
		version: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
		created_at: { type: DataTypes.DATE(3), allowNull: false },
		deleted_at: DataTypes.DATE(3)
	});
