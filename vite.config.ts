import tailwindcss from '@tailwindcss/vite';
import { sveltekit } from '@sveltejs/kit/vite';
import { defineConfig } from 'vitest/config';
import { helpPlugin } from './scripts/vite/help.ts';
import { readerPlugin } from './scripts/vite/reader.ts';

export default defineConfig({
	plugins: [readerPlugin(), helpPlugin(), tailwindcss(), sveltekit()],
	build: {
		// Fonts under 4 kB would become data: addresses, which the policy refuses.
		assetsInlineLimit: 0
	},
	test: {
		projects: [
			{
				extends: true,
				test: {
					name: 'unit',
					include: ['src/**/*.test.ts', 'scripts/**/*.test.ts', 'tests/published/**/*.test.ts'],
					// Another lane may have the processors at the same time.
					testTimeout: 30_000
				}
			},
			{
				extends: true,
				test: {
					name: 'integration',
					include: ['tests/integration/**/*.test.ts'],
					globalSetup: ['tests/fixtures/test-server.ts'],
					testTimeout: 30_000,
					hookTimeout: 60_000,
					fileParallelism: false
				}
			},
			{
				extends: true,
				test: {
					name: 'e2e',
					include: ['tests/e2e/**/*.test.ts'],
					globalSetup: ['tests/fixtures/built-server.ts'],
					testTimeout: 60_000,
					hookTimeout: 120_000,
					// Browser tests mostly wait; two files at a time fill what two cores have.
					maxWorkers: 2,
					// A browser on a busy machine is late now and then; what fails twice is wrong.
					retry: 1
				}
			},
			{
				extends: true,
				test: {
					name: 'deep',
					include: ['tests/deep/**/*.test.ts'],
					testTimeout: 1_200_000,
					hookTimeout: 120_000,
					fileParallelism: false
				}
			}
		],
		coverage: {
			provider: 'v8',
			include: ['src/lib/decoder/**/*.ts'],
			exclude: ['**/*.test.ts'],
			reporter: ['text-summary', 'json-summary'],
			reportsDirectory: '.local/coverage'
		}
	}
});
