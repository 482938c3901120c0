// npm run test:deep: what takes longer than npm test may.
import { endCommands } from './lib/commands.mjs';
import { runLanes, sumOf } from './lib/lanes/lane.mjs';
import * as checks from './lib/lanes/static.mjs';
import { vitestLane } from './lib/lanes/vitest.mjs';
import { ensurePackages } from './lib/packages.mjs';
import { sayError } from './lib/say-error.mjs';
import { step } from './lib/steps.mjs';

const HOURS_MS = 3_600_000;

for (const [signal, code] of Object.entries({ SIGINT: 130, SIGTERM: 143 }))
	process.on(signal, () => {
		endCommands('SIGINT');
		process.exit(code);
	});

try {
	await step('Packages', async (say) => say((await ensurePackages()) ? 'installed' : 'in place'));
	await checks.syncTypes();
	const results = await runLanes([{ name: 'deep', run: vitestLane('deep', [], 3 * HOURS_MS) }]);
	const { line, ok } = sumOf(results);
	console.log(`\n${line}`);
	process.exitCode = ok ? 0 : 1;
} catch (error) {
	sayError(error);
	console.log('0 passed, 1 failed');
	process.exitCode = 1;
}
