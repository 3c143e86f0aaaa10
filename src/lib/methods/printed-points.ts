import { subjectsOfTopic, type CatalogueEntry } from '$lib/engine';
import { publishedFiles } from './published-files';

/** Inputs of published checks that are parameters of the catalogue. */
const PARAMETERS: Readonly<Record<string, string>> = {
	r_over_D: 'radiusRatio',
	R0_over_D: 'radiusRatio',
	r_over_W: 'radiusRatio',
	R0_over_W: 'radiusRatio',
	angle: 'angle',
	included_angle: 'angle',
	closed_angle: 'angle',
	angle_to_wall_deg: 'angle',
	A1_over_A2: 'areaRatio',
	A_small_over_A_large: 'areaRatio',
	free_area_ratio: 'freeArea',
	L_over_D: 'lengthRatio',
	t_over_D: 'thicknessRatio',
	l_over_d: 'thicknessRatio',
	pieces: 'pieces'
};
/** Inputs that the plotted duct has, or that matter less than the width of a mark. */
const AS_PLOTTED: Readonly<Record<string, (value: unknown) => boolean>> = {
	regime: () => true,
	H_over_W: (value) => value === 1,
	H_over_W_or_round: (value) => value === 1,
	fd: (value) => typeof value === 'number' && value > 0.016 && value < 0.02,
	Re: (value) => typeof value === 'string' || (typeof value === 'number' && value >= 1.4e5),
	D: () => true,
	eps: () => true,
	Re_wire: () => true,
	shape: (value) => value === 'round'
};
/** Topics whose figures are a part of a coefficient, or hold the wall friction that the plotted ones leave to the row. */
const PARTIAL = /Re-factor|geometry|conical|elbow-round-smooth\.(rennels|miller|ito)/;

/**
 * Printed coefficients of an entry that a plot can show as marks: all their inputs but the one along the axis are as
 * plotted. Values of `free` parameters are those of any of its curves.
 */
export function printedPoints(
	{ key, family, parameters }: CatalogueEntry,
	along: string,
	at: Readonly<Record<string, number | string>>,
	free: readonly string[]
): readonly { readonly x: number; readonly C: number }[] {
	// What is printed for one elbow is half of an offset, and what is printed for another shape is no point of an oval.
	if (family === 'offsets' || family === 'elbows-oval') return [];
	const standard = (name: string) => at[name] ?? parameters.find((one) => one.name === name)?.default;
	return publishedFiles
		.flatMap(({ checks = [] }) => checks)
		.filter(({ topic }) => subjectsOfTopic(topic).includes(key) && !PARTIAL.test(topic))
		.flatMap(({ inputs, expected }) => {
			if (typeof expected !== 'number') return [];
			const given = Object.entries(inputs).map(([name, value]) => ({ name: PARAMETERS[name], input: name, value }));
			const x = given.find(({ name }) => name === along)?.value;
			const fits = given.every(({ name, input, value }) =>
				name === undefined
					? (AS_PLOTTED[input]?.(value) ?? false)
					: name === along || free.includes(name) || value === standard(name)
			);
			return typeof x === 'number' && fits ? [{ x, C: expected }] : [];
		});
}
