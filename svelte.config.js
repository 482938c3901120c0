import adapter from '@sveltejs/adapter-node';
import { vitePreprocess } from '@sveltejs/vite-plugin-svelte';

/**
 * The framework tells each new page's title to screen readers from an element hidden by a style attribute,
 * which the policy refuses: it would then stand on the page. A class hides it as well.
 * @type {import('svelte/compiler').PreprocessorGroup}
 */
const announcer = {
	name: 'announcer',
	markup: ({ content, filename }) =>
		filename?.endsWith('/generated/root.svelte')
			? {
					code: content.replace(/(id="svelte-announcer"[^>]*) style="[^"]*"/, '$1 class="sr-only"')
				}
			: undefined
};

/** @type {import('@sveltejs/kit').Config} */
export default {
	preprocess: [announcer, vitePreprocess()],
	kit: {
		// What our own server tells the adapter stands under names of its own (scripts/server/application.mjs).
		adapter: adapter({ out: 'build', envPrefix: 'ADAPTER_' }),
		typescript: {
			config: (config) => ({
				...config,
				include: [...config.include, '../scripts/**/*.ts', '../scripts/**/*.mjs']
			})
		},
		// Hashes, not nonces: a page can then be kept in a cache without carrying a stale nonce.
		csp: {
			mode: 'hash',
			directives: {
				'default-src': ['self'],
				'script-src': ['self'],
				'style-src': ['self'],
				'img-src': ['self', 'data:'],
				'font-src': ['self'],
				'connect-src': ['self'],
				'object-src': ['none'],
				'base-uri': ['self'],
				'form-action': ['self'],
				'frame-ancestors': ['none']
			}
		}
	}
};
