/** A loose part: its number and its date, away from any car. */
export const partText = {
	title: 'A loose part',
	intro:
		'A part on the bench, its number and its date: what it is, which years and lines it was made for, and when it was made.',
	number: 'Casting or part number',
	numberHint: 'As it stands, with its letters and dividers.',
	date: 'Date stamp, if there is one',
	dateHint: 'Letters and figures as cast or struck.',
	maker: 'Maker, if known',
	read: 'Look it up',
	clear: 'Start again',
	help: 'Where castings carry them, and how to clean one',
	empty: {
		heading: 'What it answers',
		lines: [
			'The number names the casting: block, head, manifold, and the engines and years it served.',
			'The date says when it was cast. Most repeat every ten years; the years of the number settle which decade.',
			'A casting served several engines and lines. It never says by itself which car it came from.'
		],
		example: 'Fill in an example',
		note: 'A 283 block: its number’s years leave one of several decades.',
		values: { number: '3789935', date: 'K122', maker: 'gm' }
	},
	what: {
		heading: 'What it is',
		none: 'The number is not in our tables. That says nothing against the part: the tables have a few of many thousand castings.',
		fits: 'Listed for',
		row: 'Row and sources'
	},
	when: {
		heading: 'When it was made',
		none: 'None of these days lies in the years that we have for the number. Read both again first: a misread character is more likely than a wrong part.',
		noDate:
			'No form that we know fits the date. Type it with its letters, and ? for what cannot be read.',
		open: 'Nothing settles the decade yet: the number’s years, or the car’s, would.',
		one: (words: string): string => `The years of the number leave ${words}.`,
		against: 'outside the years of the number',
		form: 'Form'
	},
	limit:
		'A number and a date say what a part is. They do not say that it left the factory in a given car.',
	caution:
		'Clean with solvent and a nylon brush or plastic scraper. No wire wheel and no grinder: both take the figures with the dirt. Lift heavy castings with help, and mind lead paint and asbestos in old gaskets.'
} as const;
