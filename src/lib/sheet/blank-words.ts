import type { UnitSystem } from '$lib/engine';
import { EXAMPLES } from './parts/takes';
import type { RowField } from './sheet';

interface BlankWords {
	/** What a blank means. */
	readonly words: string;
	/** Texts that the cell takes. */
	readonly examples: readonly string[];
}

const LIKE: Readonly<Record<RowField, Readonly<Record<UnitSystem, readonly string[]>>>> = {
	tag: { SI: ['S01'], IP: ['S01'] },
	joins: { SI: ['S01'], IP: ['S01'] },
	side: { SI: ['supply', 'exhaust'], IP: ['supply', 'exhaust'] },
	serves: { SI: [], IP: [] },
	flow: { SI: ['200', '720 m³/h'], IP: ['400', '1.2k'] },
	size: { SI: ['600x300', 'Ø250', 'oval 510x255'], IP: ['24x12', '12"', '17 1/2" x 9 3/8"'] },
	length: { SI: ['6.5', '6500 mm'], IP: [`12'-6"`, '21.5'] },
	rise: { SI: ['3.2', '-3.2'], IP: ['10.5', '-10.5'] },
	flex: { SI: ['1.2', '1200 mm'], IP: ['4', `4'-6"`] },
	material: { SI: [], IP: [] },
	lining: { SI: ['25', '25 metal'], IP: ['1', '1 metal'] },
	leakage: { SI: ['C', 'ATC 3'], IP: ['CL 6', 'C'] },
	temperature: { SI: ['16'], IP: ['61'] },
	parts: EXAMPLES,
	outlet: { SI: ['grille 25 Pa', 'louvre C 1.2', '12 static'], IP: ['grille 0.1', 'louvre C 1.2', '0.05 static'] },
	pressure: { SI: ['10', '-10'], IP: ['0.04', '-0.04'] }
};

const MEANS: Readonly<Partial<Record<RowField, string>>> = {
	joins: 'Blank: meets the fan',
	side: 'Blank: as the row it joins',
	rise: 'Blank: level',
	flex: 'Blank: none',
	material: 'Blank: as in the basis of design',
	lining: 'Blank: no lining',
	leakage: 'Blank: as in the basis of design',
	temperature: 'Blank: as the row it joins',
	parts: 'Blank: no parts',
	outlet: 'Blank: an open end, one velocity pressure',
	pressure: 'Blank: as outside'
};

/** What the echo says of a cell in which nothing is typed yet. */
export function blankWords(field: RowField | null, units: UnitSystem): BlankWords {
	if (field === null) return { words: 'Blank', examples: [] };
	return { words: MEANS[field] ?? 'Blank', examples: LIKE[field][units] };
}
