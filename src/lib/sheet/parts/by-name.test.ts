import { describe, expect, it } from 'vitest';
import { catalogue, type CatalogueEntry, type RowSize } from '$lib/engine';
import { fittingsFor, readParts } from './index';

const SIZES: Readonly<Record<RowSize['shape'], RowSize>> = {
	round: { shape: 'round', diameter: 0.3 },
	rectangular: { shape: 'rectangular', width: 0.6, height: 0.3 },
	oval: { shape: 'oval', width: 0.5, height: 0.25 }
};
const sizeOf = ({ shapes }: CatalogueEntry) => SIZES[shapes[0] ?? 'round'];
const along = catalogue.filter(({ place }) => place !== 'junction');

function kindsOf(text: string, size: RowSize) {
	const reading = readParts(text, 'SI');
	if (!reading.ok) return reading.message;
	const { fittings, problems } = fittingsFor(reading.value, size);
	return problems.length ? problems.map(({ message }) => message).join(' ') : fittings.map(({ kind }) => kind);
}

describe('a fitting by its own name', () => {
	it.each(along.map((entry) => [entry.key.replaceAll('-', ' '), entry] as const))(
		'“%s” is that entry',
		(text, entry) => {
			expect(kindsOf(text, sizeOf(entry))).toEqual([entry.key]);
		}
	);

	it.each([
		['pyramidal expansion a0.5 20°', SIZES.rectangular, { kind: 'pyramidal-expansion', areaRatio: 0.5, angle: 20 }],
		['2 x elbow 2 splitters', SIZES.rectangular, { kind: 'rectangular-elbow-splitter', vanes: 2, count: 2 }],
		['plate thin perforated f0.6', SIZES.round, { kind: 'perforated-plate-thin', freeArea: 0.6 }],
		['oval elbow smooth', SIZES.oval, { kind: 'oval-elbow-smooth' }],
		['elbow r1.5', SIZES.oval, { kind: 'oval-elbow-smooth', radiusRatio: 1.5 }]
	] as const)('“%s” takes its figures along', (text, size, fitting) => {
		const reading = readParts(text, 'SI');
		if (!reading.ok) throw new Error(reading.message);
		expect(fittingsFor(reading.value, size)).toMatchObject({ fittings: [fitting], problems: [] });
	});

	it('gives way to a coefficient or a pressure that is typed beside it', () => {
		const reading = readParts('fire damper curtain 8 Pa', 'SI');
		expect(reading.ok && reading.value.equipment.length).toBe(1);
	});
});
