import type { DesignDocument, Flag } from '../document/types';
import { airFlags } from './air-flags';
import type { RangeNote } from './items';
import type { Network } from './network';
import { unreadKeyFlags } from './unread-keys';
import { rowFlags } from './row-flags';
import { partFlags } from './part-flags';
import { partHints } from './part-hints';
import type { RowAir } from './row-airs';
import type { RowLoss } from './row-loss';
import { serviceFlags } from './service-flags';

/** Difference of the sums of supply and of the other side that is worth a word: common practice. */
const FLOWS_DIFFER = 0.005;
const NO_NOTES: readonly RangeNote[] = [];

interface Found {
	readonly losses: readonly RowLoss[];
	readonly notes: ReadonlyMap<string, readonly RangeNote[]>;
	readonly totals: { readonly supplyFlow: number; readonly returnFlow: number };
	/** Total pressure of the fan [Pa]. */
	readonly duty: number;
	/** Of the design's air [kg/m3]. */
	readonly density: number;
	readonly airs: readonly RowAir[];
	/** Leakage and pressures suit each other. */
	readonly isSettled: boolean;
}

/** What an engineer should look at, in the order of the rows; what concerns the whole design comes first. */
export function flagsOf(
	document: DesignDocument,
	network: Network,
	{ losses, notes, totals, duty, density, airs, isSettled }: Found
): readonly Flag[] {
	const flags: Flag[] = [
		...serviceFlags(document),
		...fanFlowFlags(totals),
		...dutyFlags(duty),
		...densityFlags(document, density)
	];
	if (!isSettled)
		flags.push({
			rule: 'leakage-not-settled',
			row: null,
			severity: 'fault',
			message: 'Leakage and pressures did not settle: the leakage is so great that no flow suits it.',
			basis: 'iteration by substitution'
		});
	unreadKeyFlags(document, flags);
	airFlags(document, network, losses, airs, flags);
	const outlets = { supply: 0, other: 0 };
	for (const { side, outlet } of network.rows) if (outlet) outlets[side === 'supply' ? 'supply' : 'other']++;
	const hintsOf = partHints();
	network.rows.forEach((row, place) => {
		const solved = losses[place];
		if (solved === undefined) return;
		const alone = outlets[row.side === 'supply' ? 'supply' : 'other'] === 1;
		const joined = network.joined[place] === 1;
		rowFlags(row, solved, joined, document.criteria, flags);
		partFlags(row, solved, notes.get(row.tag) ?? NO_NOTES, hintsOf(row), document.criteria, alone, flags);
	});
	return flags;
}

function fanFlowFlags({ supplyFlow, returnFlow }: { supplyFlow: number; returnFlow: number }): Flag[] {
	if (supplyFlow === 0 || returnFlow === 0) return [];
	const value = Math.abs(supplyFlow - returnFlow) / Math.max(supplyFlow, returnFlow);
	if (value <= FLOWS_DIFFER) return [];
	return [
		{
			rule: 'fan-flows-differ',
			row: null,
			severity: 'caution',
			message: 'The flows of the supply side and of the return side of the fan differ.',
			value,
			threshold: FLOWS_DIFFER,
			basis: 'conservation of mass; the threshold is common practice'
		}
	];
}

function dutyFlags(duty: number): Flag[] {
	if (duty >= 0) return [];
	return [
		{
			rule: 'negative-duty',
			row: null,
			severity: 'caution',
			message:
				'The fan would have to give less than nothing: rooms at pressure or thermal gravity drive this flow. Check their signs.',
			value: duty,
			threshold: 0,
			basis: 'sum of the requirements of both sides'
		}
	];
}

/** Air of which makers' data are given [kg/m3]; a difference that is worth a word. Common practice. */
const RATED = 1.2;
const DENSITY_DIFFERS = 0.05;

function densityFlags({ rows }: DesignDocument, density: number): Flag[] {
	if (Math.abs(density / RATED - 1) <= DENSITY_DIFFERS) return [];
	if (!rows.some(({ equipment, outlet }) => (equipment?.length ?? 0) > 0 || outlet?.loss !== undefined)) return [];
	return [
		{
			rule: 'losses-as-entered',
			row: null,
			severity: 'note',
			message: 'Losses of equipment and outlets are counted as entered; makers give them for air of about 1.2 kg/m³.',
			value: density,
			threshold: RATED,
			basis: 'common practice: a loss grows in proportion to the density'
		}
	];
}
