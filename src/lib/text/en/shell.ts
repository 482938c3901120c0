/** What stands on every page: head, foot, skip link. */
export const shellText = {
	name: 'Tallyplate',
	/** Title of a page in the browser's tab. */
	title: (page: string) => `${page} · Tallyplate`,
	skip: 'Skip to the page',
	home: 'Tallyplate, to the reading page',
	menu: 'Menu',
	mainNavigation: 'Main',
	sections: [
		{ name: 'Read', address: '/' },
		{ name: 'Tables', address: '/tables' },
		{ name: 'Help', address: '/help' }
	],
	moreNavigation: 'More',
	more: [
		{ name: 'Where the stamps sit', address: '/where' },
		{ name: 'Paint codes', address: '/paint' },
		{ name: 'Sources', address: '/sources' },
		{ name: 'Editions', address: '/editions' },
		{ name: 'Coverage', address: '/coverage' }
	],
	limit:
		'Tallyplate reads codes and compares. It does not value cars, register them or decide title: ask a licensed appraiser, the state’s inspection officers or the police.'
} as const;
