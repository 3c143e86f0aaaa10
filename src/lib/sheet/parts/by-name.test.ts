import { describe, expect, it } from 'vitest';
import { catalogue, fittingEntry, type RowSize } from '$lib/engine';
import { fittingsFor, readParts, type RowPlace } from './index';

const SIZES: Readonly<Record<RowSize['shape'], RowSize>> = {
	round: { shape: 'round', diameter: 0.3 },
	rectangular: { shape: 'rectangular', width: 0.6, height: 0.3 },
	oval: { shape: 'oval', width: 0.5, height: 0.25 }
};
const { round, rectangular, oval } = SIZES;
const wide: RowPlace = { joined: { shape: 'rectangular', width: 1, height: 0.5 }, towardFan: false };
const narrow: RowPlace = { joined: { shape: 'round', diameter: 0.2 }, towardFan: false };
const inward: RowPlace = { ...wide, towardFan: true };

function readIn(text: string, size: RowSize, place: RowPlace | null = null) {
	const reading = readParts(text, 'SI');
	if (!reading.ok) throw new Error(`${text}: ${reading.message}`);
	return fittingsFor(reading.value, size, place);
}

type Phrase = readonly [text: string, key: string, size: RowSize, place?: RowPlace];

const PHRASES: readonly Phrase[] = [
	['elbow', 'round-elbow-smooth', round],
	['4-piece elbow', 'round-elbow-segmented', round],
	['mitred elbow', 'round-elbow-mitred', round],
	['elbow', 'rectangular-elbow-smooth', rectangular],
	['square bend', 'rectangular-elbow-mitred', rectangular],
	['vaned elbow', 'rectangular-elbow-vaned', rectangular],
	['mitred elbow with turning vanes', 'rectangular-elbow-vaned', rectangular],
	['double vaned elbow', 'rectangular-elbow-vaned-double', rectangular],
	['2 elbows with hollow vanes', 'rectangular-elbow-vaned-double', rectangular],
	['mitred bend with double-thickness vanes', 'rectangular-elbow-vaned-double', rectangular],
	['elbow 2 splitters r0.5', 'rectangular-elbow-splitter', rectangular],
	['elbow with splitter vanes', 'rectangular-elbow-splitter', rectangular],
	['elbow', 'oval-elbow-smooth', oval],
	['5-piece elbow', 'oval-elbow-segmented', oval],
	['mitred elbow', 'oval-elbow-mitred', oval],
	['offset', 'offset-round', round],
	['offset 30° r1.5 spacing 3', 'offset-rectangular', rectangular],
	['offset', 'offset-rectangular', oval],
	['mitred offset', 'offset-mitred', round],
	['sudden expansion', 'sudden-expansion', round],
	['abrupt contraction a0.4', 'sudden-contraction', round],
	['gradual expansion a0.5 20°', 'gradual-expansion', round],
	['tapered contraction', 'gradual-contraction', round],
	['reducer', 'gradual-contraction', round, wide],
	['transition', 'gradual-expansion', round, narrow],
	['transition 20°', 'gradual-expansion', round, inward],
	['sudden transition', 'sudden-contraction', round, wide],
	['pyramidal transition', 'pyramidal-contraction', rectangular, wide],
	['pyramidal transition', 'pyramidal-expansion', rectangular, narrow],
	['one-sided transition', 'one-sided-contraction', rectangular, wide],
	['one-sided transition', 'one-sided-expansion', rectangular, narrow],
	['rect to round', 'rectangular-to-round-contraction', round, wide],
	['rect-to-round', 'rectangular-to-round-expansion', round, inward],
	['square to round', 'rectangular-to-round-contraction', round, wide],
	['round to rectangular transition', 'round-to-rectangular-expansion', rectangular, narrow],
	['round to rectangular contraction a0.7', 'round-to-rectangular-contraction', rectangular],
	['flush entry', 'entry-flush', round],
	['plain end entry', 'entry-plain-end', round],
	['projecting entry', 'entry-projecting', round],
	['bellmouth', 'entry-bellmouth', round],
	['bellmouth in wall', 'entry-bellmouth-in-wall', round],
	['angled entry 45°', 'entry-angled', round],
	['hood', 'hood-plain', round],
	['flanged hood', 'hood-flanged', rectangular],
	['tapered hood 45°', 'hood-tapered', rectangular],
	['cap', 'exhaust-cap', round],
	['cap', 'intake-cap', round, inward],
	['roof cap h/d 0.3', 'exhaust-cap', round, wide],
	['intake hood C1.1', 'intake-hood', round],
	['intake louvre C2.5', 'intake-louvre', rectangular],
	['exit', 'exit-plain', round],
	['exit diffuser a0.5 14°', 'exit-diffuser', round],
	['exhaust cowl C1.2', 'exhaust-hood', round],
	['exhaust louver C1.2', 'exhaust-louvre', rectangular],
	['exit against wall C1.6', 'discharge-against-wall', round],
	['exit against a wall C1.6', 'discharge-against-wall', round],
	['damper', 'damper-butterfly', round],
	['parallel blade damper 20°', 'damper-parallel-blades', rectangular],
	['opposed blade damper', 'damper-opposed-blades', rectangular],
	['opposed blade damper a0.8', 'damper-blades-open', rectangular],
	['fire damper', 'damper-fire-curtain', rectangular],
	['2 FD', 'damper-fire-curtain', round],
	['gate damper 70 % open', 'damper-gate', round],
	['blast gate', 'damper-gate', round],
	['slide damper', 'damper-gate', round],
	['screen f0.7', 'screen-wire', rectangular],
	['bird screen 60 % free', 'screen-wire', rectangular],
	['perforated plate f0.6', 'perforated-plate-thin', round],
	['perforated plate f0.6 t0.5', 'perforated-plate-thick', round],
	['obstruction', 'obstruction', round],
	['fan inlet effect C0.5', 'fan-inlet-effect', round],
	['fan outlet effect C0.3', 'fan-outlet-effect', round],
	['system effect at the outlet of the fan C0.3 straight 2 m', 'fan-outlet-effect', round],
	['tee branch', 'tee', round],
	['wye branch', 'wye', round],
	['45° shoe take-off', 'shoe-take-off', rectangular],
	['conical take-off', 'conical-take-off', round],
	['bullhead tee rounded edges', 'bullhead-tee', round],
	['cross branch', 'cross', round],
	['plenum', 'plenum', rectangular]
];

const CASES = PHRASES.map(([text, key, size, place = null]) => [text, key, size, place] as const);

describe('a part of the catalogue by the words of the trade', () => {
	it.each(CASES)('“%s” is %s', (text, key, size, place) => {
		const { fittings, junction, problems } = readIn(text, size, place);
		expect(problems).toEqual([]);
		expect([...fittings, ...[junction ?? []].flat()].map(({ kind }) => kind)).toEqual([key]);
	});

	it.each(catalogue.map(({ key }) => key))('has words for %s', (key) => {
		expect(PHRASES.filter(([, named]) => named === key).map(([text]) => text)).not.toEqual([]);
	});

	it.each(CASES)('“%s” is drawn as its entry is', (text, key, size, place) => {
		const reading = readParts(text, 'SI');
		const [part] = reading.ok ? [...reading.value.fittings, ...[reading.value.junction ?? []].flat()] : [];
		// A cap is drawn before the side of the row tells which it is; both look alike.
		expect([text, part?.picture, size, place]).toEqual([text, fittingEntry(key)?.picture, size, place]);
	});
});

describe('a fitting by the key of its entry', () => {
	const ASKED = ['exhaust-hood'];
	const along = catalogue.filter(({ place, key }) => place !== 'junction' && !ASKED.includes(key));

	it.each(along.map((entry) => [entry.key.replaceAll('-', ' '), entry] as const))('“%s”', (text, entry) => {
		const asksForC = entry.parameters.some(({ name }) => name === 'coefficient');
		const { fittings } = readIn(asksForC ? `${text} C1.5` : text, SIZES[entry.shapes[0] ?? 'round']);
		expect(fittings.map(({ kind }) => kind)).toEqual([entry.key]);
	});
});

describe('what stands beside the name', () => {
	it.each([
		['pyramidal expansion a0.5 20°', rectangular, { kind: 'pyramidal-expansion', areaRatio: 0.5, angle: 20 }],
		['2 x elbow 2 splitters', rectangular, { kind: 'rectangular-elbow-splitter', vanes: 2, count: 2 }],
		['vaned elbow 50/38', rectangular, { kind: 'rectangular-elbow-vaned', vanes: '50/38' }],
		['elbow hard way', oval, { kind: 'oval-elbow-smooth', bend: 'hard' }],
		['elbow plane width', oval, { kind: 'oval-elbow-smooth', bend: 'hard' }],
		['elbow plane height', oval, { kind: 'oval-elbow-smooth', bend: 'easy' }],
		['offset 30° spacing 3 across', round, { angle: 30, spacing: 3, second: 'across' }],
		['one-sided expansion smaller leg', rectangular, { kind: 'one-sided-expansion', leg: 'smaller' }],
		['roof cap h/d 0.3', round, { distanceRatio: 0.3 }],
		['fire damper curtain out of the air stream', round, { kind: 'damper-fire-curtain', curtain: 'out' }],
		['gate damper open 0.7', round, { opening: 0.7 }],
		['gate damper 70% open', round, { opening: 0.7 }],
		['obstruction flat bar 12 % blocked', round, { form: 'flat bar', blockage: 0.12 }],
		['wire mesh 60 % free area', round, { freeArea: 0.6 }],
		['parallel blade damper a0.9', rectangular, { kind: 'damper-blades-open', blades: 'parallel', areaRatio: 0.9 }],
		['fan outlet effect C0.3 straight 5 ft', round, { coefficient: 0.3, straight: 1.524 }],
		['gate damper GD-1?', round, { name: 'Gate damper GD-1', toBeConfirmed: true }],
		['elbow r1.5 by rennels', round, { kind: 'round-elbow-smooth', radiusRatio: 1.5, method: 'rennels' }],
		['tapered contraction by Rennels', round, { kind: 'gradual-contraction', method: 'rennels' }],
		['gradual expansion by idelchik table', round, { method: 'idelchik-table' }]
	] as const)('“%s” is taken along', (text, size, fitting) => {
		expect(readIn(text, size)).toMatchObject({ fittings: [fitting], problems: [] });
	});

	it('is the author of a junction, too', () => {
		expect(readIn('tee branch by crane', round).junction).toMatchObject({
			kind: 'tee',
			method: 'crane',
			leg: 'branch'
		});
		expect(readIn('bullhead tee sharp edges', round).junction).toMatchObject({ edges: 'sharp' });
	});

	it.each([
		['elbow by crane', round, 'Elbow has no method by Crane.', 'by Idelchik; by SMACNA; by Rennels; by Miller; by Ito'],
		['4-piece elbow by rennels', round, 'Elbow has no method by Rennels.', 'no author: the catalogue has one method'],
		['vaned elbow 99/11', rectangular, 'vane radius/spacing in mm 99/11 is none of the choices', '50/38, 114/57'],
		['screen f1.5', round, 'is outside the catalogue’s range', 'C, such as C0.23']
	] as const)('“%s” is named where it does not suit', (text, size, message, expected) => {
		const { fittings, problems } = readIn(text, size);
		expect(fittings).toEqual([]);
		expect(problems[0]?.message.toLowerCase()).toContain(message.toLowerCase());
		expect(problems[0]?.expected).toContain(expected);
	});

	it('gives way to a coefficient or a pressure of its own', () => {
		const reading = readParts(
			'fire damper 8 Pa; gate damper C0.5; exhaust hood C0.4; weather louvre + screen 25 Pa',
			'SI'
		);
		if (!reading.ok) throw new Error(reading.message);
		expect(reading.value.equipment.map(({ name }) => name)).toEqual(['Fire damper', 'Weather louvre + screen']);
		expect(reading.value.fittings.map(({ kind, coefficient }) => [kind, coefficient])).toEqual([
			['fixed', 0.5],
			['fixed', 0.4]
		]);
	});

	it.each([
		['obstruction C0.2', 'grille'],
		['perforated plate C2', 'grille'],
		['rect to round C0.1', 'transition'],
		['cap C1', 'louvre']
	])('“%s” is one by its name alone', (text, picture) => {
		const reading = readParts(text, 'SI');
		expect(reading).toMatchObject({ ok: true, value: { fittings: [{ kind: 'fixed', picture }] } });
	});

	it.each(['weather louvre + screen', 'smoke gate damper', 'coil screen'])(
		'“%s” is no part of the catalogue: another part stands beside the name',
		(text) => expect(readParts(text, 'SI').ok).toBe(false)
	);
});

describe('a transition by the sizes of two rows', () => {
	it.each<[string, RowSize, RowPlace, object]>([
		['reducer', round, narrow, { kind: 'gradual-expansion', areaRatio: 4 / 9, leg: 'larger' }],
		['reducer', round, { ...narrow, towardFan: true }, { kind: 'gradual-contraction', leg: 'larger' }],
		['transition 20°', rectangular, wide, { kind: 'gradual-contraction', areaRatio: 0.36, angle: 20, leg: 'smaller' }],
		['transition a0.8', rectangular, wide, { kind: 'gradual-contraction', areaRatio: 0.8, leg: 'smaller' }]
	])('%s', (text, size, place, fitting) => {
		const { fittings, problems } = readIn(text, size, place);
		expect(problems).toEqual([]);
		const { areaRatio, ...more } = fitting as { areaRatio?: number };
		expect(fittings).toMatchObject([more]);
		if (areaRatio !== undefined) expect(fittings[0]?.['areaRatio']).toBeCloseTo(areaRatio, 11);
	});

	it.each<[string, RowPlace | null, string]>([
		['transition', null, 'no size of a row that it joins is known'],
		['transition', { joined: null, towardFan: false }, 'no size of a row that it joins is known'],
		['reducer', { joined: round, towardFan: false }, 'have the same area'],
		['tee straight; reducer', wide, 'the size of the junction’s leg is not on the sheet']
	])('%s asks where it cannot tell', (text, place, message) => {
		const { fittings, problems } = readIn(text, round, place);
		expect(fittings).toEqual([]);
		expect(problems[0]?.message).toContain(message);
		const examples = problems[0]?.expected.split(/[;,] (?:or )?/) ?? [];
		for (const example of examples) expect(readIn(example, round).problems).toEqual([]);
	});

	it('is stretched where the two rows have one area and another shape', () => {
		const same: RowPlace = { joined: { shape: 'rectangular', width: Math.PI * 0.15, height: 0.15 }, towardFan: false };
		expect(readIn('rect to round', round, same).problems).toEqual([]);
	});
});

describe('what is said of it', () => {
	it.each([
		[
			'fire damper',
			'Fire damper: from the catalogue, at curtain in the stream; its coefficient is from memory; for others type fire damper 8 Pa or fire damper C0.2.'
		],
		[
			'reducer',
			'Reducer: from the catalogue, direction and area ratio by the sizes of this row and the one it joins, at 30°; for others type reducer 20° or reducer C0.1.'
		],
		[
			'gate damper',
			'Gate damper: from the catalogue, fully open; its coefficient is from memory; for others type gate damper open 0.7 or gate damper C0.5.'
		],
		[
			'offset',
			'Offset: from the catalogue, at 45°, r 1.5, spacing 2 in round duct or 45°, r 1, spacing 2 in rectangular duct; for others type offset C0.3.'
		],
		['hood', 'Hood: without a coefficient, from the catalogue; its coefficient is from memory.']
	])('“%s”', (text, why) => expect(readParts(text, 'SI')).toMatchObject({ why }));

	it('names the author and the figure of the maker', () => {
		expect(readParts('elbow r1.5 by idelchik; fan outlet effect C0.3', 'SI')).toMatchObject({
			words: 'Elbow, r 1.5, by Idelchik, from the catalogue; Fan outlet effect, C 0.3'
		});
	});

	it('has examples that it reads itself', () => {
		for (const [text, , size, place] of PHRASES) {
			const reading = readParts(text, 'SI');
			const [, examples] = /for others type ([^.]*(?:\.\d[^.]*)*)/.exec((reading.ok && reading.why) || '') ?? [];
			for (const example of examples?.split(' or ') ?? [])
				expect([example, readIn(example, size, place ?? wide).problems]).toEqual([example, []]);
		}
	});
});
