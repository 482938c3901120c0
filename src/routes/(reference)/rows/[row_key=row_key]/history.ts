import { cellChanges, type CellChange, type TitleOf } from '$lib/format/row-changes';
import type { RowVersion } from '$lib/server/reference';
import { tablesText } from '$lib/text/en/tables';

export interface VersionView {
	readonly version: number;
	readonly edition: number;
	/** "editions 2 to 4", "since edition 5". */
	readonly span: string;
	/** What it has otherwise than the version before; none for the first. */
	readonly changes: readonly CellChange[];
}

/** Versions of a row, the latest first, each with what it changed. */
export function historyView(versions: readonly RowVersion[], titleOf: TitleOf): VersionView[] {
	const text = tablesText.row;
	return versions
		.map((version, index) => {
			const before = versions[index - 1];
			return {
				version: version.version,
				edition: version.edition_from,
				span:
					version.edition_to === null
						? text.since(version.edition_from)
						: text.between(version.edition_from, version.edition_to),
				changes: before ? cellChanges(before, version, titleOf) : []
			};
		})
		.reverse();
}
