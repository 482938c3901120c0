import type { Database } from '../../src/lib/server/db';
import { loadRelease } from '../../src/lib/server/reference';
import { readContent } from '../data/read';
import { PROJECT } from './database';

/** Loads the release in data/, or merges it with the corrections made here, and says what became of it. */
export async function loadData(database: Database): Promise<void> {
	const began = performance.now();
	const report = await loadRelease(database, readContent(`${PROJECT}data`));
	const took = `${((performance.now() - began) / 1000).toFixed(1)} s`;
	if (!report.loaded) {
		console.log(`The release is loaded already; edition ${report.edition}`);
		return;
	}
	console.log(
		`Loaded the release as edition ${report.edition}: ` +
			`${report.written} entries written, ${report.retired} retired (${took})`
	);
	if (report.conflicts.length > 0)
		console.log(
			`${report.conflicts.length} entries that a correction had changed stay as they are, ` +
				'and are listed for moderators'
		);
}
