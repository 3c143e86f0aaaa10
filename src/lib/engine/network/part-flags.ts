import type { Criteria, DesignRow, Flag } from '../document/types';
import { fittingEntry } from '../fitting';
import type { RangeNote } from './items';
import type { RowLoss } from './row-loss';

const DAMPER = /damper|\b(vcd|fsd)\b/i;
/** Dampers that do not balance: they close, or open, by themselves. */
const UNSUITED = /\b(fire|smoke|fsd|back-?\s?dra(?:ugh|f)t|non-?return|check)\b/i;
const FIRE = /\b(fire|smoke|fsd)\b/i;

/**
 * Fittings, equipment and outlet of one row: what is not settled, out of range, missing or needs a caution.
 * `alone`: no other outlet is on its side of the fan, so that there is nothing to balance it against.
 */
export function partFlags(
	row: DesignRow,
	solved: RowLoss,
	notes: readonly RangeNote[],
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

	if (solved.items.some((item) => item.toBeConfirmed)) {
		const open = solved.items.filter((item) => item.toBeConfirmed).map((item) => item.name);
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

	if (hasNamed(row, (name) => FIRE.test(name) && DAMPER.test(name)))
		flags.push({
			rule: 'fire-damper-caution',
			row: row.tag,
			severity: 'note',
			message:
				'Fire or smoke damper: only its pressure drop is counted. Where it must stand, its rating, listing, installation and access are not checked here.',
			basis: 'outside the scope of a pressure calculation'
		});

	if (criteria?.damperAtOutlet === true && row.outlet !== undefined && !alone && !hasBalancingDamper(row))
		flags.push({
			rule: 'damper-missing',
			row: row.tag,
			severity: 'caution',
			message: 'The row has an outlet but no damper to balance it.',
			basis: 'criteria of the design'
		});

	endFlag(row, flags);
	if (row.flexible !== undefined && row.flexible.length > 0 && row.flexible.factor === undefined)
		flags.push({
			rule: 'flexible-default',
			row: row.tag,
			severity: 'note',
			message: 'Flexible duct is taken at 4 times the rigid rate, the program’s default; as installed it can be more.',
			basis: 'illustrative: published tests give about 4 times for moderate and near 10 times for severe compression'
		});
	if (row.fittings?.some((one) => fittingEntry(one.kind)?.family === 'dampers' && !('angle' in one)) === true)
		flags.push({
			rule: 'damper-open-assumed',
			row: row.tag,
			severity: 'note',
			message: 'A damper without an angle is taken as fully open.',
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

/** An entry or exit of the catalogue is the end of its run: the outlet's own loss would count it a second time. */
function endFlag(row: DesignRow, flags: Flag[]): void {
	if (row.outlet === undefined || row.outlet.loss === 0) return;
	const end = row.fittings
		?.map((one) => fittingEntry(one.kind))
		.find((entry) => entry?.family === 'entries' || entry?.family === 'exits');
	if (!end) return;
	flags.push({
		rule: 'end-counted-twice',
		row: row.tag,
		severity: 'caution',
		message: `${end.name} and the loss of the outlet are both counted. Where the fitting is the end of the run, the outlet loses 0.`,
		basis: 'an end loses its velocity pressure once'
	});
}

function hasBalancingDamper(row: DesignRow): boolean {
	if (hasNamed(row, (name) => DAMPER.test(name) && !UNSUITED.test(name))) return true;
	return row.fittings?.some((one) => fittingEntry(one.kind)?.family === 'dampers') ?? false;
}

/** Whether a fitting or a piece of equipment has a name such as this. */
function hasNamed(row: DesignRow, isSuch: (name: string) => boolean): boolean {
	if (row.fittings?.some((one) => one.name !== undefined && isSuch(one.name)) === true) return true;
	return row.equipment?.some((one) => isSuch(one.name)) ?? false;
}
