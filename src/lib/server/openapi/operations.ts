import type { z } from 'zod';
import * as asked from '../../types/api-requests';
import { MAKERS, TABLE_NAMES } from '../../types';
import type { SchemaName } from './components';

/** One GET or POST of the interface, as the document tells it. */
export interface Operation {
	readonly path: string;
	readonly method: 'get' | 'post';
	readonly id: string;
	readonly summary: string;
	readonly description?: string;
	readonly places?: Readonly<
		Record<string, { description: string; example: string; values?: readonly string[] }>
	>;
	readonly query?: z.ZodObject;
	/** One schema, or the several that a body may be of. */
	readonly body?: SchemaName | readonly SchemaName[];
	/** Left out for the document itself, which has no schema of its own. */
	readonly answers?: SchemaName | readonly SchemaName[];
	readonly csv?: boolean;
	/** Refusals beside those that every address has. */
	readonly refuses: readonly (404 | 413 | 415 | 422)[];
}

const rowKey = { row_key: { description: 'Key of a row', example: 'gm.engine.w.1' } };

export const OPERATIONS: readonly Operation[] = [
	{
		path: '/readings',
		method: 'get',
		id: 'read',
		summary: 'Read a stamp',
		description:
			'Answers 200 for every text with at least one character that can be struck. `readings` may be empty; `problems` then names layout, character and offers. A reading is a function of edition, reader and question.',
		query: asked.readingQuerySchema,
		answers: 'ReadAnswer',
		refuses: [404, 422]
	},
	{
		path: '/readings',
		method: 'post',
		id: 'readPosted',
		summary: 'Read a stamp, or several of one car, asked as JSON',
		description:
			'One stamp: the same as GET, for askers who keep serials out of addresses. Several under `stamps`: a result each, in the order asked, and `lines` in which they agree or disagree.',
		body: ['ReadingBody', 'StampsBody'],
		answers: ['ReadAnswer', 'StampsAnswer'],
		refuses: [404, 413, 415, 422]
	},
	{
		path: '/makers',
		method: 'get',
		id: 'makers',
		summary: 'Makers and divisions, with every name that is taken for them',
		query: asked.listQuerySchema,
		answers: 'Makers',
		refuses: []
	},
	{
		path: '/layouts',
		method: 'get',
		id: 'layouts',
		summary: 'Layouts: which characters of a stamp mean what',
		query: asked.listQuerySchema,
		answers: 'Layouts',
		refuses: []
	},
	{
		path: '/tables',
		method: 'get',
		id: 'tables',
		summary: 'Tables that have rows',
		query: asked.tablesQuerySchema,
		answers: 'Tables',
		refuses: [404, 422]
	},
	{
		path: '/tables/{maker}/{table}',
		method: 'get',
		id: 'table',
		summary: 'Rows of a table',
		description:
			'As JSON, a page at a time; as CSV, all rows unless `limit` is given, then with a Link to the next page. A cursor stays in the edition in which its list began.',
		places: {
			maker: { description: 'Corporation', example: 'gm', values: MAKERS },
			table: { description: 'Table', example: 'engine', values: TABLE_NAMES }
		},
		query: asked.tableQuerySchema,
		answers: 'Rows',
		csv: true,
		refuses: [404, 422]
	},
	{
		path: '/rows/{row_key}',
		method: 'get',
		id: 'row',
		summary: 'One row with its citations',
		places: rowKey,
		query: asked.editionQuerySchema,
		answers: 'RowDetail',
		refuses: [404]
	},
	{
		path: '/rows/{row_key}/history',
		method: 'get',
		id: 'rowHistory',
		summary: 'Every version of a row, the latest first',
		places: rowKey,
		query: asked.listQuerySchema,
		answers: 'RowHistory',
		refuses: [404]
	},
	{
		path: '/sources',
		method: 'get',
		id: 'sources',
		summary: 'Works that rows cite',
		query: asked.sourcesQuerySchema,
		answers: 'Sources',
		refuses: [404, 422]
	},
	{
		path: '/sources/{key}',
		method: 'get',
		id: 'source',
		summary: 'One source and the rows that cite it',
		places: { key: { description: 'Key of a source', example: 'memory' } },
		query: asked.editionQuerySchema,
		answers: 'SourceDetail',
		refuses: [404]
	},
	{
		path: '/items',
		method: 'get',
		id: 'items',
		summary: 'Visible equipment that can be looked for on a car',
		query: asked.itemsQuerySchema,
		answers: 'Items',
		refuses: [404, 422]
	},
	{
		path: '/editions',
		method: 'get',
		id: 'editions',
		summary: 'Editions, the latest first',
		query: asked.listQuerySchema,
		answers: 'Editions',
		refuses: []
	},
	{
		path: '/editions/{n}',
		method: 'get',
		id: 'edition',
		summary: 'One edition, and what it changed of the one before',
		places: { n: { description: 'Number of an edition', example: '1' } },
		answers: 'EditionDetail',
		refuses: [404]
	},
	{
		path: '/openapi.json',
		method: 'get',
		id: 'openapi',
		summary: 'This document',
		refuses: []
	}
];
