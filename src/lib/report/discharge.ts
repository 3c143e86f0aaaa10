import type { DesignDocument, Side } from '$lib/engine';
import { SIDE } from './wording';

/** Whether the fan only carries air out of the building: what leaves it is its discharge and no supply of rooms. */
export function isExhaustOnly({ rows }: DesignDocument): boolean {
	return (
		rows.some(({ side }) => side === 'exhaust') && rows.every(({ side }) => side === 'exhaust' || side === 'supply')
	);
}

/** The side of a row in words. */
export function sideWords(side: Side, exhaustOnly: boolean): string {
	return side === 'supply' && exhaustOnly ? 'Discharge' : SIDE[side];
}
