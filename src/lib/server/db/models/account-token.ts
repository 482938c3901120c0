import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';

export interface AccountTokenRecord {
	/** SHA-256 of what stands in the link. */
	hash: string;
	purpose: string;
	/** Null for a sign-up: there is no account yet. */
	user_id: string | null;
	/** Where the link was sent. */
	address: string;
	detail: unknown;
	created_at: Date;
	expires_at: Date;
}

export const defineAccountToken = (
	sequelize: Sequelize
): ModelStatic<Model<AccountTokenRecord, AccountTokenRecord>> =>
	sequelize.define('account_tokens', {
		hash: { type: DataTypes.STRING(64), primaryKey: true },
		purpose: { type: DataTypes.STRING(16), allowNull: false },
		user_id: DataTypes.STRING(32),
		address: { type: DataTypes.STRING(254), allowNull: false },
		detail: { type: DataTypes.JSON, allowNull: false },
		created_at: { type: DataTypes.DATE(3), allowNull: false },
		expires_at: { type: DataTypes.DATE(3), allowNull: false }
	});
