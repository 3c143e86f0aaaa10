import type { Criteria, DesignRow, Flag, Item } from '../document/types';
import type { RangeNote } from './items';
import type { PartHints } from './part-hints';
import type { RowLoss } from './row-loss';

/**
 * Fittings, equipment and outlet of one row: what is not settled, out of range, missing or needs a caution.
 * `alone`: no other outlet is on its side of the fan, so that there is nothing to balance it against.
 */
export function partFlags(
	row: DesignRow,
	solved: RowLoss,
	notes: readonly RangeNote[],
	hints: PartHints,
	criteria: Criteria | undefined,
	alone: boolean,
	flags: Flag[]
): void {
	for (const { name, inRange, note } of notes)
		flags.push({
			rule: 'coefficient-range',
			row: row.tag,
			severity: inRange ? 'note' : 'caution',
			message: `${name}: ${note}.`,
			basis: 'range of the source of the coefficient'
		});

	if (hints.toBeConfirmed || row.junction?.toBeConfirmed === true || row.outlet?.toBeConfirmed === true) {
		const open = solved.items.filter(isOpen).map((item) => item.name);
		const names = [...new Set(open)];
		flags.push({
			rule: 'to-be-confirmed',
			row: row.tag,
			severity: 'note',
			message: `To be confirmed: ${names.join(', ')}.`,
			value: open.length,
			basis: 'marked so in the design'
		});
	}

	if (hints.fireDamper)
		flags.push({
			rule: 'fire-damper-caution',
			row: row.tag,
			severity: 'note',
			message:
				'Fire or smoke damper: only its pressure drop is counted. Where it must stand, its rating, listing, installation and access are not checked here.',
			basis: 'outside the scope of a pressure calculation'
		});

	if (criteria?.damperAtOutlet === true && row.outlet !== undefined && !alone && !hints.balances)
		flags.push({
			rule: 'damper-missing',
			row: row.tag,
			severity: 'caution',
			message: 'The row has an outlet but no damper to balance it.',
			basis: 'criteria of the design'
		});

	endFlag(row, hints.end, flags);
	if (row.flexible !== undefined && row.flexible.length > 0 && row.flexible.factor === undefined)
		flags.push({
			rule: 'flexible-default',
			row: row.tag,
			severity: 'note',
			message: 'Flexible duct is taken at 4 times the rigid rate, the program’s default; as installed it can be more.',
			basis: 'illustrative: published tests give about 4 times for moderate and near 10 times for severe compression'
		});
	if (hints.openAssumed)
		flags.push({
			rule: 'damper-open-assumed',
			row: row.tag,
			severity: 'note',
			message: 'A damper without a setting is taken as fully open.',
			basis: 'default of the catalogue'
		});

	if (row.outlet?.lossIs === 'static' && row.side !== 'supply')
		flags.push({
			rule: 'static-loss-at-inlet',
			row: row.tag,
			severity: 'note',
			message:
				'The loss of the inlet is given as static: one velocity pressure is added, as at an outlet. Give the total-pressure loss if the maker states it.',
			basis: 'rule of the design document'
		});
}

const isOpen = (item: Item) => item.toBeConfirmed;

/** An entry or exit of the catalogue is the end of its run: the outlet's own loss would count it a second time. */
function endFlag(row: DesignRow, end: PartHints['end'], flags: Flag[]): void {
	if (end === null || row.outlet === undefined || row.outlet.loss === 0) return;
	flags.push({
		rule: 'end-counted-twice',
		row: row.tag,
		severity: 'caution',
		message: `${end.name} and the loss of the outlet are both counted. Where the fitting is the end of the run, the outlet loses 0.`,
		basis: 'an end loses its velocity pressure once'
	});
}
