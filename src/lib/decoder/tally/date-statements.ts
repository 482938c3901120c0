/** The dates among what the stamps say, as intervals of days. */
import type {
	Dated,
	Maker,
	Reading,
	ReadingField,
	RowValues,
	StampKind,
	TallyStamp,
	Weight
} from '../../types';
import { DATE_FORMATS, type DateFormat } from '../dates';
import { dayOfIso, type DaySpan } from '../dates/days';
import type { CompiledRow, TableSet } from '../engine/table-set';
import { weightOf } from './weights';

/** What a part belongs to; null when it is not known. */
export type Unit = 'engine' | 'gearbox' | 'axle';

export interface DateStatement {
	readonly stamp: number;
	readonly kind: StampKind;
	readonly place: string | null;
	readonly maker: Maker | null;
	readonly division: string | null;
	readonly year: number | null;
	readonly format: DateFormat;
	readonly dates: Dated;
	readonly unit: Unit | null;
	readonly label: string;
	readonly code: string;
	/** Every interval that the date can be. */
	readonly spans: readonly DaySpan[];
	readonly words: string;
	readonly rows: readonly CompiledRow[];
	/** Whether a firm or fair row says how such dates are read. */
	readonly supported: boolean;
	readonly weight: Weight;
}

const FORMATS = new Map(DATE_FORMATS.map((format) => [format.id, format]));

/** Parts by the unit that is put together from them; others go on the car. */
const UNITS: readonly (readonly [RegExp, Unit])[] = [
	[/block|head|intake|engine/i, 'engine'],
	[/gearbox|transmission|four-speed/i, 'gearbox'],
	[/axle|differential/i, 'axle']
];

const unitOf = (words: string): Unit | null =>
	UNITS.find(([part]) => part.test(words))?.[1] ?? null;

function spanOf({ earliest, latest }: RowValues): DaySpan | null {
	return typeof earliest === 'string' && typeof latest === 'string'
		? [dayOfIso(earliest), dayOfIso(latest)]
		: null;
}

/** Every interval of a field; none when one of them is open. */
function spansOf(field: ReadingField): readonly DaySpan[] {
	const values = field.possible.length > 0 ? field.possible : [field];
	const spans = values.map((one) => spanOf(one.values));
	return spans.some((span) => span === null) ? [] : (spans as DaySpan[]);
}

/** What the dated part belongs to: the part of a casting number beside it, the place, or the form of the date. */
function unitNear(reading: Reading, stamp: TallyStamp, format: DateFormat): Unit | null {
	const parts = reading.fields.flatMap(({ values }) =>
		typeof values.part === 'string' ? [values.part] : []
	);
	const named = unitOf([...parts, stamp.place ?? ''].join(' '));
	return named ?? format.unit ?? (stamp.kind === 'engine' ? 'engine' : null);
}

/** The dates of the stamps' first readings. */
export function dateStatementsOf(tables: TableSet, stamps: readonly TallyStamp[]): DateStatement[] {
	return stamps.flatMap((stamp, index) => {
		const [reading] = stamp.readings;
		if (reading === undefined) return [];
		const equal = stamp.readings.filter(({ rank }) => rank === reading.rank).length > 1;
		return reading.fields.flatMap((field): DateStatement[] => {
			const format = FORMATS.get(String(field.values.format));
			if (format === undefined) return [];
			const rows = field.rows.flatMap((key) => tables.rows.get(key) ?? []);
			const supported = rows.filter(({ strength }) => strength === 'firm' || strength === 'fair');
			return [
				{
					stamp: index,
					kind: stamp.kind,
					place: stamp.place ?? null,
					maker: reading.maker,
					division: reading.division,
					year: reading.model_year,
					format,
					dates: format.dates,
					unit: unitNear(reading, stamp, format),
					label: field.label,
					code: field.code,
					// Another equal reading may have it as another date.
					spans: equal ? [] : spansOf(field),
					words: field.meaning ?? '',
					rows: supported.length > 0 ? supported : rows,
					supported: supported.length > 0,
					weight: weightOf(stamp.kind, stamp.place, reading.maker, false)
				}
			];
		});
	});
}
