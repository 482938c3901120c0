import adapter from '@sveltejs/adapter-node';

/** A bare application: what SvelteKit costs by itself, for ratios. */
export default {
	kit: { adapter: adapter({ out: '../../../.local/bench-bare' }) }
};
