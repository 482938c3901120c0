import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';

/** What an entry tells beside who, what and when: ids and words of closed sets, no name and no address. */
export type AuditDetail = Readonly<
	Record<string, string | number | boolean | null | readonly string[]>
>;

export interface AuditRecord {
	/** From 1 on, without a gap. */
	number: number;
	hash_before: string;
	hash: string;
	/** Id of who did it; null for the product itself and for whoever stands at its console. */
	actor: string | null;
	action: string;
	subject_kind: string;
	subject_id: string;
	detail: AuditDetail;
	at: Date;
}

export const defineAuditEntry = (
	sequelize: Sequelize
): ModelStatic<Model<AuditRecord, AuditRecord>> =>
	sequelize.define('audit', {
		number: { type: DataTypes.INTEGER.UNSIGNED, primaryKey: true },
		hash_before: { type: DataTypes.STRING(64), allowNull: false },
		hash: { type: DataTypes.STRING(64), allowNull: false },
		actor: DataTypes.STRING(32),
		action: { type: DataTypes.STRING(64), allowNull: false },
		subject_kind: { type: DataTypes.STRING(32), allowNull: false },
		subject_id: { type: DataTypes.STRING(96), allowNull: false },
		detail: { type: DataTypes.JSON, allowNull: false },
		at: { type: DataTypes.DATE(3), allowNull: false }
	});
