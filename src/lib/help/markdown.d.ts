declare module '*.md' {
	const page: import('./pages').HelpPage;
	export default page;
}
