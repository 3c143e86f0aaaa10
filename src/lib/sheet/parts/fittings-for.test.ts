import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { catalogue, type RowSize } from '$lib/engine';
import { describePart, fittingsFor, readParts } from './index';

const round: RowSize = { shape: 'round', diameter: 0.2 };
const rectangular: RowSize = { shape: 'rectangular', width: 0.6, height: 0.35 };
const oval: RowSize = { shape: 'oval', width: 0.51, height: 0.255 };

function parts(text: string) {
	const reading = readParts(text, 'SI');
	if (!reading.ok) throw new Error(`${text}: ${reading.message}`);
	return reading.value;
}

describe('parts in the design document', () => {
	it('keep their coefficients, counts and marks', () => {
		expect(fittingsFor(parts('2x elbow r1.0 C0.23?, silencer 25 Pa, tee branch C0.8, VCD C0.2'), round)).toEqual({
			junction: { kind: 'fixed', coefficient: 0.8, name: 'Tee branch' },
			fittings: [
				{ kind: 'fixed', coefficient: 0.23, name: 'Elbow, r 1', count: 2, toBeConfirmed: true },
				{ kind: 'fixed', coefficient: 0.2, name: 'Volume damper' }
			],
			equipment: [{ name: 'Silencer', loss: 25, exponent: 2 }],
			problems: []
		});
	});

	it.each([
		['elbow r1.5 45°', round, { kind: 'round-elbow-smooth', name: 'Elbow', radiusRatio: 1.5, angle: 45 }],
		['2 elbow r1.5', rectangular, { kind: 'rectangular-elbow-smooth', name: 'Elbow', count: 2, radiusRatio: 1.5 }],
		['elbow', oval, { kind: 'oval-elbow-smooth', name: 'Elbow' }],
		['mitred elbow', round, { kind: 'round-elbow-mitred', name: 'Mitred elbow' }],
		['mitred elbow', rectangular, { kind: 'rectangular-elbow-mitred', name: 'Mitred elbow' }],
		['3-piece elbow', round, { kind: 'round-elbow-segmented', name: 'Elbow', pieces: 3 }],
		['90° vaned elbow?', rectangular, { kind: 'rectangular-elbow-vaned', name: 'Vaned elbow', toBeConfirmed: true }],
		['sudden expansion a0.5', rectangular, { kind: 'sudden-expansion', name: 'Sudden expansion', areaRatio: 0.5 }],
		['flush entry', round, { kind: 'entry-flush', name: 'Flush entry' }],
		['damper 20°', round, { kind: 'damper-butterfly', name: 'Damper', angle: 20 }],
		[
			'opposed blade damper 30°',
			rectangular,
			{ kind: 'damper-opposed-blades', name: 'Opposed blade damper', angle: 30 }
		]
	] as const)('%s takes the entry for its duct', (text, size, fitting) => {
		expect(fittingsFor(parts(text), size)).toMatchObject({ fittings: [fitting], problems: [] });
	});

	it.each([
		['vaned elbow', round, 'rectangular'],
		['3-piece elbow', rectangular, 'round'],
		['vaned elbow 45°', rectangular, '45°'],
		['mitred elbow r1.5', round, 'r 1.5'],
		['elbow r50', round, '50'],
		['4-piece elbow plane width', round, 'width in the plane']
	] as const)('%s is left out and named where it does not suit', (text, size, named) => {
		const { fittings, problems } = fittingsFor(parts(text), size);
		expect(fittings).toEqual([]);
		expect(problems).toHaveLength(1);
		expect(problems[0]?.message).toContain(named);
		expect(problems[0]?.expected.length).toBeGreaterThan(0);
	});

	it('name only keys that the catalogue has, for every shape', () => {
		const words = [
			'elbow',
			'mitred elbow',
			'vaned elbow',
			'5-piece elbow',
			'damper',
			'flush entry',
			'bellmouth',
			'exit',
			'sudden contraction'
		];
		const keys = new Set(catalogue.map((entry) => entry.key));
		fc.assert(
			fc.property(fc.subarray(words), fc.constantFrom(round, rectangular, oval), (list, size) => {
				const { fittings, problems } = fittingsFor(parts(list.join(', ')), size);
				expect(fittings.length + problems.length).toBe(list.length);
				expect(fittings.every((fitting) => keys.has(fitting.kind))).toBe(true);
			})
		);
	});
});

describe('a part in words', () => {
	it('has the key of its symbol', () => {
		const { junction, equipment } = parts('45° shoe take-off, branch C0.6, fire damper FD-02 6 Pa?');
		expect(junction && describePart(junction)).toEqual({ words: 'Shoe take-off branch, 45°, C 0.6', picture: 'shoe' });
		expect(equipment[0] && describePart(equipment[0])).toEqual({
			words: 'Fire damper FD-02, 6.0 Pa, to be confirmed',
			picture: 'firedamper'
		});
		expect(equipment[0] && describePart(equipment[0], 'IP').words).toBe(
			'Fire damper FD-02, 0.024 in. wg, to be confirmed'
		);
	});
});
