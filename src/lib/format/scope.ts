import { tablesText } from '../text/en/tables';
import { MAKER_NAMES, type Maker, type ReferenceRow, type ScopeColumn } from '../types';
import { yearSpan } from './years';

type Scope = Pick<ReferenceRow, 'maker' | 'years_from' | 'years_to' | ScopeColumn>;
const text = tablesText.scope;

/** "All of Ford Motor Company"; the tables of no one corporation hold for every maker. */
export const wholeMaker = (maker: Maker): string =>
	maker === 'other' ? text.everyMaker : text.allOf(MAKER_NAMES[maker]);

/**
 * Where a row holds, its years aside.
 * @example scopeWords(row) // 'Plymouth, Dodge; Charger; body 23, 27'
 */
export function scopeWords({ maker, division, line, body, engine, plant, market }: Scope): string {
	const parts = [
		division.join(', '),
		line.join(', '),
		body.length > 0 ? text.body(body.join(', ')) : '',
		engine.length > 0 ? text.engine(engine.join(', ')) : '',
		plant.length > 0 ? text.plant(plant.join(', ')) : '',
		market.join(', ')
	].filter(Boolean);
	if (division.length === 0)
		parts.unshift(maker === 'other' ? text.everyMaker : MAKER_NAMES[maker]);
	return parts.join('; ');
}

/** One column of a row's scope, in words. */
export interface ScopeCell {
	readonly label: string;
	readonly value: string;
}

/** Where a row holds, column by column; columns that are open are left out, but for make and years. */
export function scopeCells(scope: Scope): ScopeCell[] {
	const { columns } = text;
	const set = (['line', 'body', 'engine', 'plant', 'market'] as const)
		.filter((column) => scope[column].length > 0)
		.map((column) => ({ label: columns[column], value: scope[column].join(', ') }));
	return [
		{
			label: columns.division,
			value: scope.division.length > 0 ? scope.division.join(', ') : wholeMaker(scope.maker)
		},
		...set,
		{ label: text.years, value: yearSpan(scope.years_from, scope.years_to) }
	];
}
