import { formatPressure, unitOf, type Solution, type UnitSystem } from '$lib/engine';
import { mainIndex } from '$lib/sheet/main-index';
import type { Zone } from './frame/ZoneRuler.svelte';

/** The sheets of a design, in the order of their numbers. */
export const SHEETS = [
	{ key: 'sheet', name: 'Run sheet' },
	{ key: 'ledger', name: 'Ledger' },
	{ key: 'basis', name: 'Basis of design' },
	{ key: 'versions', name: 'Versions' },
	{ key: 'hand-over', name: 'Hand-over' }
] as const;

export type SheetKey = (typeof SHEETS)[number]['key'];

interface Facts {
	readonly solution: Solution | null;
	readonly units: UnitSystem;
	/** Cells to mend. */
	readonly problems: number;
	readonly revision: string | null;
}

/** The zone of each sheet with its one live fact. */
export function zonesOf(designId: string, open: SheetKey, { solution, units, problems, revision }: Facts): Zone[] {
	const checks = solution?.flags.filter(({ severity }) => severity !== 'note').length ?? 0;
	const index = mainIndex(solution) ?? '';
	const facts: Record<SheetKey, string> = {
		sheet: problems ? `${problems} to mend` : checks === 1 ? '1 check' : checks ? `${checks} checks` : '',
		ledger: index,
		basis: solution ? `${formatPressure(solution.fan.totalPressure, units)} ${unitOf('pressure', units)}` : '',
		versions: revision ?? '',
		'hand-over': ''
	};
	return SHEETS.map(({ key, name }) => ({
		name,
		href: `/designs/${designId}/${key}`,
		fact: facts[key],
		isOpen: key === open
	}));
}

/** Place of a sheet among the others. */
export const placeOf = (key: SheetKey) => {
	const at = SHEETS.findIndex((one) => one.key === key);
	return { number: at + 1, of: SHEETS.length, name: SHEETS[at]?.name ?? '' };
};
