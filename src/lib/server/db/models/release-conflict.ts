import { DataTypes, type Model, type ModelStatic, type Sequelize } from 'sequelize';

export const CONFLICT_KINDS = ['row', 'source', 'claim'] as const;
/**
 * Why a release could not be taken for one entry.
 * - `added_in_both`, `changed_in_both`: it says something else than a correction made here;
 * - `retired_here`: the release changes what was retired here;
 * - `retired_in_release`: the release retires what was changed here;
 * - `still_cited`: the release retires a source that something here still cites.
 */
export const CONFLICT_REASONS = [
	'added_in_both',
	'changed_in_both',
	'retired_here',
	'retired_in_release',
	'still_cited'
] as const;

export interface ReleaseConflictRecord {
	load_number: number;
	kind: (typeof CONFLICT_KINDS)[number];
	entry_key: string;
	reason: (typeof CONFLICT_REASONS)[number];
	/** The entry in the release before, in the new release, and here; null where it was not there. */
	base: unknown;
	theirs: unknown;
	ours: unknown;
	resolved_at: Date | null;
	resolved_by: string | null;
}

export const defineReleaseConflict = (
	sequelize: Sequelize
): ModelStatic<Model<ReleaseConflictRecord, ReleaseConflictRecord>> =>
	sequelize.define('release_conflicts', {
		load_number: { type: DataTypes.INTEGER.UNSIGNED, primaryKey: true },
		kind: { type: DataTypes.ENUM(...CONFLICT_KINDS), primaryKey: true },
		entry_key: { type: DataTypes.STRING(80), primaryKey: true },
		reason: { type: DataTypes.ENUM(...CONFLICT_REASONS), allowNull: false },
		base: DataTypes.JSON,
		theirs: DataTypes.JSON,
		ours: DataTypes.JSON,
		resolved_at: DataTypes.DATE(3),
		resolved_by: DataTypes.STRING(32)
	});
