const marked = new WeakSet<object>();

/**
 * Marks the data of a page without framework script: SvelteKit would write all of it out for a
 * browser that never asks, which costs as much as drawing the page.
 */
export function forServerAlone<Data extends object>(data: Data): Data {
	marked.add(data);
	return data;
}

export const isForServerAlone = (data: unknown): boolean =>
	typeof data === 'object' && data !== null && marked.has(data);
