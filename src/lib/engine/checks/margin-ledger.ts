import type { DesignDocument, Solution } from '../document/types';

export interface MarginLine {
	readonly name: string;
	readonly of: 'flow' | 'pressure';
	/** Factor that it brings; 1 for a margin in pascal. */
	readonly factor: number;
	/** What it adds in pressure [Pa]; 0 for a margin on flow. */
	readonly pressure: number;
	readonly reason: string | null;
}

export interface MarginLedger {
	readonly lines: readonly MarginLine[];
	/** Names that stand more than once. */
	readonly repeated: readonly string[];
	/** Product of the factors on flow [-]. */
	readonly flowFactor: number;
	/** Product of the factors on pressure [-]. */
	readonly pressureFactor: number;
	/** Flow that the fan is selected for [m3/s]. */
	readonly selectionFlow: number;
	/** Total pressure that the fan is selected for [Pa]. */
	readonly selectionPressure: number;
	/** The basis of the pressures, always said. */
	readonly basis: 'fan total pressure';
}

/**
 * Every allowance once, and what they come to together. Factors multiply the duty in the order in which they stand;
 * margins in pascal are added to what the factors made of it.
 *
 *   p = duty · product of the factors + sum of the pressures;  Q = flow · product of its factors
 *
 * @param document margins by name, as fractions or in [Pa]
 * @param solution duty: flow [m3/s], total pressure [Pa]
 * @returns lines, products [-], selection flow [m3/s] and pressure [Pa]
 */
export function marginLedger({ margins = [] }: DesignDocument, { fan }: Solution): MarginLedger {
	const lines = margins.map(({ name, of, fraction = 0, pressure = 0, reason }): MarginLine => ({
		...{ name, of, factor: 1 + fraction, pressure: of === 'pressure' ? pressure : 0, reason: reason ?? null }
	}));
	const product = (of: MarginLine['of']) => lines.reduce((all, line) => (line.of === of ? all * line.factor : all), 1);
	const [flowFactor, pressureFactor] = [product('flow'), product('pressure')];
	const names = lines.map(({ name, of }) => `${name.trim().toLowerCase()} ${of}`);
	const repeated = lines.flatMap(({ name }, at) => (names.indexOf(names[at] ?? '') < at ? [name] : []));
	return {
		...{ lines, repeated, flowFactor, pressureFactor },
		selectionFlow: fan.flow * flowFactor,
		selectionPressure: fan.totalPressure * pressureFactor + lines.reduce((sum, { pressure }) => sum + pressure, 0),
		basis: 'fan total pressure'
	};
}
