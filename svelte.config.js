import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
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

// What our own server tells the adapter stands under names of its own (scripts/server/application.mjs).
const node = adapter({ out: 'build', envPrefix: 'ADAPTER_' });

/**
 * The manifest imports the route matchers anew for every request, which costs as much as reading a
 * serial; they are kept here, as its other modules are.
 * @type {import('@sveltejs/kit').Adapter['adapt']}
 */
async function adapt(builder) {
	const file = join(builder.getServerDirectory(), 'manifest.js');
	const manifest = readFileSync(file, 'utf8');
	const kept = manifest.replace(
		/matchers: (async \(\) => \{[^]*?return \{[^}]*\};\s*\})/,
		'matchers: __memo($1)'
	);
	if (kept === manifest) throw new Error('The manifest writes its matchers in another way now.');
	writeFileSync(file, kept);
	await node.adapt(builder);
}

/** @type {import('@sveltejs/kit').Config} */
export default {
	preprocess: [announcer, vitePreprocess()],
	kit: {
		adapter: { ...node, adapt },
		typescript: {
			config: (config) => ({
				...config,
				include: [...config.include, '../scripts/**/*.ts', '../scripts/**/*.mjs']
			})
		},
		// Hashes, not nonces: a page can then be kept in a cache without carrying a stale nonce.
		// hooks.server.ts looks at all that changes something, not at forms alone.
		csrf: { trustedOrigins: ['*'] },
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
