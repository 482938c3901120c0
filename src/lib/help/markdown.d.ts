declare module '*.md' {
	import type { HelpPage } from '$lib/help/pages';
	const page: HelpPage;
	export default page;
}
