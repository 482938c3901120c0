/** The form that a stamp is typed into, and the page around it before anything is read. */
export const entryText = {
	pageTitle: 'Read a stamp',
	heading: 'Read what is stamped on the car',
	label: 'Serial number, stamp or code, as it stands on the car',
	labelShort: 'Serial number, stamp or code',
	read: 'Read',
	hint: {
		before: 'Write ',
		unread: '?',
		between: ' for a character you cannot read, ',
		either: '[38]',
		after:
			' for one that could be either. Spaces and dividers do not matter; write / between the lines of a tag.'
	},
	kind: {
		legend: 'Read as',
		any: 'whatever fits',
		serial: 'serial number',
		body_tag: 'body tag',
		engine: 'engine stamp',
		casting: 'casting',
		date: 'date',
		code: 'single code'
	},
	/** Under the field while something is typed; {n} is the number of characters. */
	detected: {
		code: 'Characters: {n}. A single code.',
		sequence: 'Six figures: the sequence of a serial number, or a code.',
		short:
			'{n} characters: an engine stamp, a casting, the beginning of a serial number, or a code.',
		serial: '{n} characters: a serial number.',
		seventeen: '17 characters: a serial number in the standard form.',
		long: '{n} characters: more than a serial number has, as on a body tag.'
	},
	wasRead: {
		serial: (n: number) => `Read as a serial number, ${n} characters.`,
		body_tag: 'Read as a body tag.',
		engine: 'Read as an engine stamp.',
		casting: 'Read as a casting.',
		date: 'Read as a date.',
		code: 'Read as a single code.'
	},
	maker: 'Maker, if known',
	year: 'Model year, if known',
	makerShort: 'Maker',
	yearShort: 'Model year',
	any: 'any',
	wholeMaker: (name: string) => `${name}, any division`,
	more: 'Maker, year, kind',
	try: {
		heading: 'Three to try',
		note: 'Real code patterns, invented sequence numbers.',
		stamps: [
			{
				text: 'RH23L0E904127',
				about:
					'1970 Plymouth. Its year figure stands for two years: two readings, ranked, each with its reason.'
			},
			{
				text: '242379P9?4117',
				about: '1969 Pontiac with a character lost to corrosion. What is still certain.'
			},
			{
				text: '1G1AY8760B5900417',
				about: 'The 17-character form, with its check digit worked through.'
			}
		]
	},
	ways: {
		heading: 'With more on the bench',
		pages: [
			{
				name: 'A body tag, line by line',
				address: '/tag',
				about: 'Type it as it stands, and hold it against the serial number.'
			},
			{
				name: 'A loose part',
				address: '/part',
				about: 'What its number names, and which decade its date can mean.'
			},
			{
				name: 'Where the stamps sit',
				address: '/where',
				about: 'By maker and year, each place with its source.'
			},
			{
				name: 'Paint codes',
				address: '/paint',
				about: 'The codes of a make and model year, with chips.'
			}
		]
	},
	example: {
		heading: 'What a reading tells',
		text: 'RM23N0G904127',
		about:
			'Each character, what it stands for, and how well that is supported. The sequence number is invented.',
		open: 'Open this reading',
		codes: 'What the codes say',
		car: 'The car itself',
		half: 'A reading is one half. Nobody has looked at the car: what is fitted to it, and what is struck where, is the other.'
	}
} as const;
