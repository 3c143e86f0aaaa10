import type { DesignDocument, Solution } from '../document/types';
import { hiddenAllowances } from './hidden-allowances';
import type { Finding } from './finding';

export interface MarginLine {
	readonly name: string;
	readonly of: 'flow' | 'pressure';
	/** Factor that it brings; 1 for a margin in pascal. */
	readonly factor: number;
	/** What it adds to the fan total pressure [Pa]; of a margin on flow, by the greater losses. */
	readonly pressure: number;
	/** What the factor is on. */
	readonly basis: 'flow of the fan' | 'fan total pressure';
	readonly reason: string | null;
}

export interface MarginLedger {
	readonly lines: readonly MarginLine[];
	/** Names that stand more than once. */
	readonly repeated: readonly string[];
	/** Allowances in a second place. */
	readonly hidden: readonly Finding[];
	/** Product of the factors on flow [-]. */
	readonly flowFactor: number;
	/** Product of the factors on pressure [-]. */
	readonly pressureFactor: number;
	/** Product of all factors [-]. */
	readonly product: number;
	/** Duty: flow [m3/s], fan total pressure [Pa]. */
	readonly dutyFlow: number;
	readonly dutyPressure: number;
	/** Flow that the fan is selected for [m3/s]. */
	readonly selectionFlow: number;
	/** Fan total pressure that the system asks at that flow, before margins on pressure [Pa]. */
	readonly systemPressure: number;
	/** Fan total pressure that the fan is selected for [Pa]. */
	readonly selectionPressure: number;
	/** The same as fan static pressure [Pa]; null without a supply row. */
	readonly selectionStaticPressure: number | null;
	/** The basis of the pressures, always said. */
	readonly basis: 'fan total pressure';
}

/**
 * Every allowance once, and what they come to together. A margin on flow raises the losses by its square; pressures of
 * rooms and thermal gravity stay. Then the factors on pressure, in their order, and last the margins in pascal.
 *
 *   Q = Q0 · fQ;  p = (p0 + (fQ² - 1) pl) · fp + sum of the pressures
 *
 * with pl the losses of the index path of each side. Losses whose exponent is not 2 are taken as if it were.
 *
 * @param document margins by name, as fractions or in [Pa]
 * @param solution duty Q0 [m3/s], p0 [Pa]
 * @returns lines, whose pressures add up to what the selection has above the duty; products [-], flow [m3/s], pressures [Pa]
 * @source fan laws, common practice
 */
export function marginLedger(document: DesignDocument, solution: Solution): MarginLedger {
	const { margins = [] } = document;
	const { fan } = solution;
	const factors = margins.map(({ fraction = 0 }) => 1 + fraction);
	const pressures = margins.map(() => 0);
	const losses = lossesOf(solution);
	let [flowFactor, pressureFactor] = [1, 1];
	const systemAt = (factor: number) => fan.totalPressure + (factor * factor - 1) * losses;
	margins.forEach(({ of }, at) => {
		if (of !== 'flow') return;
		const before = systemAt(flowFactor);
		flowFactor *= factors[at] ?? 1;
		pressures[at] = systemAt(flowFactor) - before;
	});
	const systemPressure = systemAt(flowFactor);
	let added = 0;
	margins.forEach(({ of, pressure = 0 }, at) => {
		if (of !== 'pressure') return;
		const before = systemPressure * pressureFactor;
		pressureFactor *= factors[at] ?? 1;
		pressures[at] = systemPressure * pressureFactor - before + pressure;
		added += pressure;
	});
	const selectionPressure = systemPressure * pressureFactor + added;
	const lines = margins.map(({ name, of, reason }, at): MarginLine => ({
		...{ name, of, factor: factors[at] ?? 1, pressure: pressures[at] ?? 0 },
		basis: of === 'flow' ? 'flow of the fan' : 'fan total pressure',
		reason: reason ?? null
	}));
	const names = lines.map(({ name }) => name.trim().toLowerCase());
	const atOutlet = fan.staticPressure === null ? null : fan.totalPressure - fan.staticPressure;
	return {
		lines,
		repeated: lines.flatMap(({ name }, at) => (names.indexOf(names[at] ?? '') < at ? [name] : [])),
		hidden: hiddenAllowances(document, solution),
		...{ flowFactor, pressureFactor, product: factors.reduce((all, factor) => all * factor, 1) },
		...{ dutyFlow: fan.flow, dutyPressure: fan.totalPressure, selectionFlow: fan.flow * flowFactor },
		...{ systemPressure, selectionPressure },
		selectionStaticPressure: atOutlet === null ? null : selectionPressure - atOutlet * flowFactor * flowFactor,
		basis: 'fan total pressure'
	};
}

/** Of the index path of each side, what grows with the flow [Pa]. */
function lossesOf({ paths, index, rows }: Solution): number {
	return [index.supply, index.return].reduce((sum, outlet) => {
		const path = outlet === null ? undefined : paths.find((one) => one.outlet === outlet);
		const along = (path?.rows ?? []).reduce(
			(all, tag) => all + (rows[tag]?.loss ?? 0) + (rows[tag]?.thermalGravity ?? 0),
			0
		);
		return sum + along;
	}, 0);
}
