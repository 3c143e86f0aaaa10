import { plainSigns, type Reading, type UnitSystem } from '$lib/engine';
import { describePart } from './describe-part';
import type { PartEquipment, PartFitting, Parts } from './parts';
import { readPart } from './read-part';
import { splitParts } from './split-parts';

const LONGEST = 2000; // characters
const MOST = 100; // parts of one row, as typed
const MOST_LOSSES = 500; // of equipment, with their counts
const EXPECTED = 'parts between commas, such as 2x elbow r1.0 C0.23, silencer 25 Pa, damper';

/**
 * Reads a Parts cell. With a coefficient a part is a fitting, with a pressure it is equipment, with neither it comes
 * from the catalogue where that has it. An empty text is a row without parts. Never throws.
 */
export function readParts(text: string, units: UnitSystem): Reading<Parts> {
	if (text.length > LONGEST) return { ok: false, message: 'the text is too long for one row', expected: EXPECTED };
	const pieces = splitParts(plainSigns(text.replace(/[\r\n]+/g, ';')));
	if (pieces.length > MOST) return { ok: false, message: `more than ${MOST} parts in one row`, expected: EXPECTED };
	let junction: PartFitting | null = null;
	const fittings: PartFitting[] = [];
	const equipment: PartEquipment[] = [];
	for (const piece of pieces) {
		const reading = readPart(piece, units);
		if (!reading.ok) return reading;
		if (reading.slot === 'equipment') equipment.push(...Array.from({ length: reading.count }, () => reading.part));
		else if (reading.slot === 'fitting') fittings.push(reading.part);
		else if (junction === null) junction = reading.part;
		else {
			const message = `“${piece}” is a second junction: a row has one, at its fan end`;
			return { ok: false, message, expected: 'put the other junction in the row that starts there' };
		}
	}
	if (equipment.length > MOST_LOSSES)
		return {
			ok: false,
			message: `${equipment.length} losses of equipment in one row`,
			expected: `at most ${MOST_LOSSES}`
		};
	const parts: Parts = { junction, fittings, equipment };
	const all = [...(junction ? [junction] : []), ...fittings, ...equipment];
	const computed = fittings.filter((part) => part.kind !== 'fixed').map((part) => part.name.toLowerCase());
	return {
		ok: true,
		value: parts,
		words: all.length === 0 ? 'no parts' : all.map((part) => describePart(part, units).words).join('; '),
		why:
			computed.length === 0 ? null : `without a coefficient, from the catalogue: ${[...new Set(computed)].join(', ')}`,
		other: null
	};
}
