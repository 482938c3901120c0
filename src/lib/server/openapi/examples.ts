import type { SchemaName } from './components';

const digest = '0f1e2d3c4b5a69788796a5b4c3d2e1f00f1e2d3c4b5a69788796a5b4c3d2e1f0';
const source = {
	key: 'works-manual',
	title: 'Works manual, 1967',
	locator: 'p. 12',
	kind: 'factory_paper'
};
const plain = {
	detail: '',
	values: {},
	strength: 'firm',
	strength_why: 'Rests on one factory paper.',
	sources: [source],
	alternatives: [],
	possible: []
};

/** Shapes with values made up to show them; a test holds each against its schema. */
export const EXAMPLES: Partial<Record<SchemaName, unknown>> = {
	StampsBody: {
		stamps: [
			{ kind: 'serial', text: '24237?B1?????', place: 'dash' },
			{ kind: 'engine', text: '0112 WS', place: 'pad of the block' }
		],
		context: { maker: 'Pontiac' }
	},
	ReadingBody: { text: '*24237?B1?????*', kind: 'serial', context: { maker: 'Pontiac' } },
	ReadAnswer: {
		edition: 1,
		digest,
		reader: '0a1b2c3d4e5f',
		input: { kind: 'serial', text: '24237-7P', normalised: '242377P' },
		readings: [
			{
				layout: 'example-layout',
				layout_title: 'A layout, to show the shape',
				maker: 'General Motors',
				maker_key: 'gm',
				division: 'Pontiac',
				model_year: 1967,
				state: 'partial',
				rank: 1,
				why: 'Two of two fields are in the tables.',
				fields: [
					{
						...plain,
						name: 'division',
						label: 'Division',
						from: 1,
						to: 1,
						code: '2',
						outcome: 'found',
						meaning: 'Pontiac',
						rows: ['gm.division.2.1']
					},
					{
						...plain,
						name: 'model_year',
						label: 'Model year',
						from: 6,
						to: 6,
						code: '7',
						outcome: 'found',
						meaning: '1967',
						values: { model_year: 1967 },
						rows: ['gm.model_year.7.1']
					}
				]
			}
		],
		more: 0,
		problems: []
	},
	Makers: {
		items: [
			{
				key: 'ford',
				name: 'Ford Motor Company',
				aliases: ['Ford', 'FoMoCo'],
				divisions: [{ name: 'Mercury', aliases: ['Merc'] }]
			}
		],
		next: null
	},
	Editions: {
		items: [
			{
				number: 1,
				parent: null,
				digest,
				cause: 'release',
				cause_id: null,
				made_at: '2026-12-01T04:00:00.000Z'
			}
		],
		next: null
	},
	Problem: {
		type: 'about:blank',
		title: 'Unprocessable Content',
		status: 422,
		detail: 'A model year is a whole number from 1955 to 2039.',
		errors: [
			{
				field: 'year',
				code: 'year_out_of_range',
				message: 'A model year is a whole number from 1955 to 2039.',
				accepted: []
			}
		]
	}
};
