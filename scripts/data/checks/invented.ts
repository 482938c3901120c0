import { parseData, type Data } from '../read';

const text = (...lines: string[]): string => lines.map((line) => `${line}\n`).join('');

const ROWS =
	'row_key,division,line,body,engine,plant,market,years_from,years_to,code,meaning,values,note';
const CITATIONS = 'row_key,source,stance,read,locator,quotation,seen_on';

/** A small folder of invented facts that keeps every rule. */
export const INVENTED: Readonly<Record<string, string>> = {
	'gm/engine.csv': text(
		ROWS,
		'gm.engine.k.1,Pontiac,,,,,,1966,1967,K,"300 V8, two-barrel","{""cylinders"":8,""displacement_cuin"":300}",',
		'gm.engine.k.2,Pontiac,Kestrel,,,,,1966,1967,K,"310 V8, four-barrel","{""cylinders"":8,""displacement_cuin"":310}",Kestrel alone.',
		'gm.engine.m.1,Pontiac,,,,,,1966,1967,M,"200 six, one-barrel","{""cylinders"":6}",'
	),
	'gm/engine.citations.csv': text(
		CITATIONS,
		'gm.engine.k.1,kestrel-manual,for,page,page 4,,',
		'gm.engine.k.1,kestrel-register,for,excerpt,,,',
		'gm.engine.k.2,memory,for,,,,',
		'gm.engine.m.1,memory,for,,,,'
	),
	'gm/series.csv': text(
		ROWS,
		'gm.series.42.1,Pontiac,,,,,,1966,1967,42,Kestrel,"{""line"":""Kestrel""}",'
	),
	'gm/series.citations.csv': text(CITATIONS, 'gm.series.42.1,kestrel-manual,for,page,page 3,,'),
	'gm/paint.csv': text(
		ROWS,
		'gm.paint.a.1,Pontiac,,,,,US,1966,1966,A,Heron Gray,"{""hex_approximate"":""#8A8D8F""}",'
	),
	'gm/paint.citations.csv': text(CITATIONS, 'gm.paint.a.1,kestrel-manual,for,page,page 9,,'),
	'gm/note.csv': text(
		ROWS,
		'gm.note.x.1,Pontiac,,,,,,,,,A first remark,{},',
		'gm.note.x.2,Pontiac,,,,,,,,,A second remark,{},'
	),
	'gm/note.citations.csv': text(
		CITATIONS,
		'gm.note.x.1,memory,for,,,,',
		'gm.note.x.2,memory,for,,,,'
	),
	'other/country.csv': text(
		ROWS,
		'other.country.aa-ah.1,,,,,,,,,AA-AH,Fernland,"{""country"":""Fernland""}",',
		'other.country.aj-an.1,,,,,,,,,AJ-AN,Mossland,"{""country"":""Mossland""}",'
	),
	'other/country.citations.csv': text(
		CITATIONS,
		'other.country.aa-ah.1,memory,for,,,,',
		'other.country.aj-an.1,memory,for,,,,'
	),
	'sources.csv': text(
		'key,title,publisher,year,kind,seen_at,licence,repeats',
		'kestrel-manual,Kestrel Shop Manual,Invented Motors,1966,factory_paper,State library,,',
		'kestrel-register,How to read a Kestrel number,Kestrel Register,1990,club_research,https://kestrel.example/numbers,,kestrel-manual',
		'memory,Memory,,,memory,,,'
	),
	'claims.csv': text(
		'claim_key,maker,table,division,line,years_from,years_to,source,note',
		'gm.paint.1966,gm,paint,Pontiac,Kestrel,1966,1966,kestrel-manual,'
	),
	'mapping.csv': text(
		'family,area,field,table',
		'birds,codes,engine,engine',
		'birds,codes,engine,rejected',
		'birds,paint,code,paint'
	),
	'candidates.csv': text(
		'candidate,area,field,digest,outcome,targets',
		'birds-1,codes,engine,0123456789ab,row,gm.engine.k.1|gm.engine.k.2',
		'birds-2,paint,code,0123456789ac,row,gm.paint.a.1',
		'birds-10,codes,engine,0123456789ad,rejected,'
	),
	'REJECTED.csv': text(
		'candidate,division,years,area,field,code,meaning,reason',
		'birds-10,Pontiac,1966,codes,engine,Z,999 V8,Twice the size of any engine of the make'
	)
};

/**
 * The invented folder with single texts exchanged, to break one rule at a time.
 * @param changes by file: what stands there, and what stands there instead
 * @throws Error when a text to be exchanged is not in its file
 */
export function invented(
	changes: Readonly<Record<string, readonly [from: string, to: string]>> = {}
): Data {
	const files = new Map(Object.entries(INVENTED));
	for (const [file, [from, to]] of Object.entries(changes)) {
		const before = files.get(file) ?? '';
		if (!before.includes(from)) throw new Error(`${file} does not hold ${from}`);
		files.set(file, before.replace(from, to));
	}
	return parseData(files);
}
