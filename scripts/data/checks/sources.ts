import { at, type Finding } from '../finding';
import type { Data } from '../read';

export const name = 'sources';

/** Whatever is cited is in sources.csv, and whatever is there is cited by something. */
export function check(data: Data): Finding[] {
	const known = new Set(data.sources.map(({ value }) => value.key));
	const used = new Set<string>();
	const findings: Finding[] = [];
	for (const citing of [...data.citations, ...data.claims]) {
		const { source } = citing.value;
		used.add(source);
		if (!known.has(source)) findings.push(at(citing, `source ${source} is not in sources.csv`));
	}
	for (const source of data.sources) {
		const { key, repeats } = source.value;
		if (repeats === null) continue;
		used.add(repeats);
		if (repeats === key) findings.push(at(source, `${key} repeats itself`));
		else if (!known.has(repeats))
			findings.push(at(source, `${key} repeats ${repeats}, which is not in sources.csv`));
	}
	for (const source of data.sources)
		if (!used.has(source.value.key))
			findings.push(at(source, `nothing cites source ${source.value.key}`));
	return findings;
}
