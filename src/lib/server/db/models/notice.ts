import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';
import { NOTICE_MAILS, type NoticeKind, type NoticeMail } from '../../../types';

export interface NoticeRecord {
	id: string;
	user_id: string;
	kind: NoticeKind;
	/** Its words, of which `data` tells the particulars. */
	template: string;
	data: unknown;
	/** How it goes by mail, as was wanted when it came. */
	mail: NoticeMail;
	created_at: Date;
	read_at: Date | null;
	archived_at: Date | null;
	/** When a daily mail was made of it, or left it out because it had been read. */
	digested_at: Date | null;
}

export interface NoticePreferenceRecord {
	user_id: string;
	kind: NoticeKind;
	mail: NoticeMail;
}

export const defineNotice = (
	sequelize: Sequelize
): ModelStatic<Model<NoticeRecord, NoticeRecord>> =>
	sequelize.define('notices', {
		id: { type: DataTypes.STRING(32), primaryKey: true },
		user_id: { type: DataTypes.STRING(32), allowNull: false },
		kind: { type: DataTypes.STRING(32), allowNull: false },
		template: { type: DataTypes.STRING(64), allowNull: false },
		data: { type: DataTypes.JSON, allowNull: false },
		mail: { type: DataTypes.ENUM(...NOTICE_MAILS), allowNull: false },
		created_at: { type: DataTypes.DATE(3), allowNull: false },
		read_at: DataTypes.DATE(3),
		archived_at: DataTypes.DATE(3),
		digested_at: DataTypes.DATE(3)
	});

export const defineNoticePreference = (
	sequelize: Sequelize
): ModelStatic<Model<NoticePreferenceRecord, NoticePreferenceRecord>> =>
	sequelize.define('notice_preferences', {
		user_id: { type: DataTypes.STRING(32), primaryKey: true },
		kind: { type: DataTypes.STRING(32), primaryKey: true },
		mail: { type: DataTypes.ENUM(...NOTICE_MAILS), allowNull: false }
	});
