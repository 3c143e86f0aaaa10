import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/engine';
import { partFigure, WIDTH } from '.';
import { parameterLetter } from '../parameter-letters';

const entries = catalogue.map((entry) => ({ key: entry.key, entry }));

describe('the drawings of the parts', () => {
	it.each(entries)('have one of $key, with walls, flow and letters', ({ entry }) => {
		const figure = partFigure(entry);
		if (figure === null) throw new Error(`nobody drew ${entry.key}`);
		expect(figure.wall).toMatch(/^M/);
		expect(figure.flow).toMatch(/^M/);
		expect(figure.letters.length).toBeGreaterThan(0);
		const paths = Object.values(figure).filter((part) => typeof part === 'string');
		for (const path of paths) expect(path).not.toMatch(/NaN|undefined|Infinity/);
	});

	it.each(entries)('keep the letters of $key on the sheet', ({ entry }) => {
		const figure = partFigure(entry);
		for (const { x, y, text } of figure?.letters ?? []) {
			expect(x, text).toBeGreaterThan(0);
			expect(x, text).toBeLessThan(WIDTH);
			expect(y, text).toBeGreaterThan(8);
			expect(y, text).toBeLessThanOrEqual(figure?.height ?? 0);
		}
	});

	it('tell apart the entries that share one by what they have and where they flow', () => {
		const differ = (a: string, b: string) => {
			const [one, other] = [a, b].map((key) => catalogue.find((entry) => entry.key === key));
			if (!one || !other) throw new Error(`the catalogue lacks ${a} or ${b}`);
			expect({ ...partFigure(one), label: '' }, `${a} and ${b}`).not.toEqual({ ...partFigure(other), label: '' });
		};
		differ('sudden-expansion', 'sudden-contraction');
		differ('entry-bellmouth', 'entry-bellmouth-in-wall');
		differ('damper-parallel-blades', 'damper-opposed-blades');
		differ('intake-louvre', 'exhaust-louvre');
		differ('intake-cap', 'exhaust-cap');
		differ('exit-plain', 'discharge-against-wall');
		differ('rectangular-elbow-vaned', 'rectangular-elbow-vaned-double');
	});

	it.each(entries.filter(({ entry }) => entry.parameters.some(({ unit }) => unit === '°')))(
		'show the angle that $key asks for, by its letter',
		({ entry }) => {
			const letters = partFigure(entry)?.letters.map(({ text }) => text);
			for (const { name, unit } of entry.parameters)
				if (unit === '°') expect(letters).toContain(parameterLetter(entry, name));
		}
	);
});
