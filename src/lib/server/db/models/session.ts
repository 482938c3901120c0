import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';

/** By what somebody got in: the closed set stands in lib/types. */
export interface SessionRecord {
	/** The hash of what the cookie carries. */
	id: string;
	user_id: string;
	/** "Firefox on Windows", as far as the browser says. */
	device: string;
	way: string;
	/** When the second factor was given in it. */
	code_given_at: Date | null;
	created_at: Date;
	/** The last request, to an hour or so. */
	seen_at: Date;
	expires_at: Date;
	revoked_at: Date | null;
}

export const defineSession = (
	sequelize: Sequelize
): ModelStatic<Model<SessionRecord, SessionRecord>> =>
	sequelize.define('sessions', {
		id: { type: DataTypes.STRING(64), primaryKey: true },
		user_id: { type: DataTypes.STRING(32), allowNull: false },
		device: { type: DataTypes.STRING(120), allowNull: false },
		way: { type: DataTypes.STRING(16), allowNull: false },
		code_given_at: DataTypes.DATE(3),
		created_at: { type: DataTypes.DATE(3), allowNull: false },
		seen_at: { type: DataTypes.DATE(3), allowNull: false },
		expires_at: { type: DataTypes.DATE(3), allowNull: false },
		revoked_at: DataTypes.DATE(3)
	});
