import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';
import { JOB_STATES, type JobState } from '../../../types';

export interface JobRecord {
	id: string;
	kind: string;
	payload: unknown;
	/** For whom; null for what the product does of its own accord. */
	user_id: string | null;
	/** Two jobs of one key are one. */
	once_key: string | null;
	state: JobState;
	due_at: Date;
	taken_by: string | null;
	taken_until: Date | null;
	attempts: number;
	/** How much is done, of `total` where that is known. */
	progress: number;
	total: number | null;
	/** Where to go on after a break, in the words of its kind. */
	checkpoint: unknown;
	stop_asked_at: Date | null;
	last_error: string | null;
	created_at: Date;
	finished_at: Date | null;
}

export const defineJob = (sequelize: Sequelize): ModelStatic<Model<JobRecord, JobRecord>> =>
	sequelize.define('jobs', {
		id: { type: DataTypes.STRING(32), primaryKey: true },
		kind: { type: DataTypes.STRING(64), allowNull: false },
		payload: { type: DataTypes.JSON, allowNull: false },
		user_id: DataTypes.STRING(32),
		once_key: DataTypes.STRING(160),
		state: { type: DataTypes.ENUM(...JOB_STATES), allowNull: false },
		due_at: { type: DataTypes.DATE(3), allowNull: false },
		taken_by: DataTypes.STRING(64),
		taken_until: DataTypes.DATE(3),
		attempts: { type: DataTypes.SMALLINT.UNSIGNED, allowNull: false },
		progress: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
		total: DataTypes.INTEGER.UNSIGNED,
		checkpoint: DataTypes.JSON,
		stop_asked_at: DataTypes.DATE(3),
		last_error: DataTypes.STRING(500),
		created_at: { type: DataTypes.DATE(3), allowNull: false },
		finished_at: DataTypes.DATE(3)
	});
