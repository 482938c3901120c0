import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';
import type { MailKind } from '../../../types';

export interface OutboxMailRecord {
	id: string;
	/** Whose account it is about; null when it goes to an address without one. */
	user_id: string | null;
	recipient: string;
	kind: MailKind;
	/** With its angle brackets; the same however often it is tried. */
	message_id: string;
	subject: string;
	/** Empty once it is sent: mails carry links that open an account. */
	body_text: string;
	body_html: string | null;
	unsubscribe_url: string | null;
	/** Two mails of one key are one. */
	once_key: string | null;
	created_at: Date;
	due_at: Date;
	taken_by: string | null;
	taken_until: Date | null;
	attempts: number;
	last_error: string | null;
	sent_at: Date | null;
	/** When it was given up. */
	failed_at: Date | null;
}

export const defineOutboxMail = (
	sequelize: Sequelize
): ModelStatic<Model<OutboxMailRecord, OutboxMailRecord>> =>
	sequelize.define('outbox', {
		id: { type: DataTypes.STRING(32), primaryKey: true },
		user_id: DataTypes.STRING(32),
		recipient: { type: DataTypes.STRING(254), allowNull: false },
		kind: { type: DataTypes.STRING(64), allowNull: false },
		message_id: { type: DataTypes.STRING(320), allowNull: false },
		subject: { type: DataTypes.STRING(300), allowNull: false },
		body_text: { type: DataTypes.TEXT('medium'), allowNull: false },
		body_html: DataTypes.TEXT('medium'),
		unsubscribe_url: DataTypes.STRING(500),
		once_key: DataTypes.STRING(160),
		created_at: { type: DataTypes.DATE(3), allowNull: false },
		due_at: { type: DataTypes.DATE(3), allowNull: false },
		taken_by: DataTypes.STRING(64),
		taken_until: DataTypes.DATE(3),
		attempts: { type: DataTypes.SMALLINT.UNSIGNED, allowNull: false },
		last_error: DataTypes.STRING(500),
		sent_at: DataTypes.DATE(3),
		failed_at: DataTypes.DATE(3)
	});
