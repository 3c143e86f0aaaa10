import { plainSigns, quoted, sentence, type Reading, type UnitSystem } from '$lib/engine';
import { describePart, describeSeveral } from './describe-part';
import type { PartEquipment, PartFitting, Parts } from './parts';
import { readPart } from './read-part';
import { splitParts } from './split-parts';
import { assumedOf, cautionOf, exampleOf } from './assumed';

const LONGEST = 2000; // characters
const MOST = 100; // parts of one row, as typed
const MOST_LOSSES = 500; // of equipment, with their counts
const EXPECTED = 'parts between commas, such as 2x elbow r1.0 C0.23, silencer 25 Pa, damper';

/**
 * Reads a Parts cell. With a coefficient a part is a fitting, with a pressure it is equipment, with neither it comes
 * from the catalogue where that has it. An empty text is a row without parts. Never throws.
 */
export function readParts(text: string, units: UnitSystem): Reading<Parts> {
	if (text.length > LONGEST) return { ok: false, message: 'The text is too long for one row.', expected: EXPECTED };
	const pieces = splitParts(plainSigns(text.replace(/[\r\n]+/g, ';')));
	if (pieces.length > MOST)
		return { ok: false, message: `There are more than ${MOST} parts in one row.`, expected: EXPECTED };
	let junction: PartFitting | null = null;
	const fittings: PartFitting[] = [];
	const equipment: PartEquipment[] = [];
	const doubts: string[] = [];
	for (const piece of pieces) {
		const reading = readPart(piece, units);
		if (!reading.ok) return reading;
		if (reading.doubt) doubts.push(`${quoted(piece)}: ${reading.doubt}`);
		if (reading.slot === 'equipment') equipment.push(...Array.from({ length: reading.count }, () => reading.part));
		else if (reading.slot === 'fitting') fittings.push(reading.part);
		else if (junction === null) junction = reading.part;
		else {
			const message = `${quoted(piece)} is a second junction: a row has one, at its fan end.`;
			return { ok: false, message, expected: 'the other junction in the row that starts there' };
		}
	}
	if (equipment.length > MOST_LOSSES)
		return {
			ok: false,
			message: `There are ${equipment.length} losses of equipment in one row.`,
			expected: `at most ${MOST_LOSSES}`
		};
	const parts: Parts = { junction, fittings, equipment };
	return { ok: true, value: parts, words: wordsOf(parts, units), why: whyOf(parts, doubts), other: null };
}

function wordsOf({ junction, fittings, equipment }: Parts, units: UnitSystem): string {
	const words = [...(junction ? [junction] : []), ...fittings].map((part) => describePart(part, units).words);
	for (let at = 0; at < equipment.length;) {
		const one = equipment[at] as PartEquipment;
		let end = at + 1;
		while (equipment[end] === one) end += 1;
		words.push(end - at > 1 ? describeSeveral(one, end - at, units) : describePart(one, units).words);
		at = end;
	}
	return words.length === 0 ? 'no parts' : words.join('; ');
}

/** What a person should know of how it was read: what comes from the catalogue, and what a count counts. */
function whyOf({ junction, fittings, equipment }: Parts, doubts: readonly string[]): string | null {
	const said = new Set<string>(doubts);
	if (junction && junction.kind !== 'fixed')
		said.add(`${junction.name.toLowerCase()}: from the catalogue, with the flows and sizes of the rows that meet`);
	const computed = fittings.filter((part) => part.kind !== 'fixed');
	for (const part of computed) {
		const name = part.name.toLowerCase();
		// Its maker's figure was typed.
		if (part.parameters['coefficient'] !== undefined) continue;
		const [assumed, caution] = [assumedOf(part), cautionOf(part)];
		const told = [assumed ?? 'without a coefficient', caution].filter((words) => words !== null);
		if (assumed === null) said.add(`${name}: ${told[0]}, from the catalogue${caution === null ? '' : `; ${caution}`}`);
		else said.add(`${name}: from the catalogue, ${told.join('; ')}; for others type ${exampleOf(part)}`);
	}
	if (equipment.some((one, at) => one === equipment[at + 1])) said.add('a pressure behind a count is that of each');
	return said.size === 0 ? null : [...said].map(sentence).join(' ');
}
