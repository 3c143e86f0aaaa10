import type { Solution } from '$lib/engine';

/** The index outlet of the side that asks more of the fan: the one named first where there is room for one. */
export function mainIndex(solution: Solution | null): string | null {
	if (!solution) return null;
	const { index, fan } = solution;
	return (fan.returnPressure > fan.supplyPressure ? index.return : index.supply) ?? index.supply ?? index.return;
}
