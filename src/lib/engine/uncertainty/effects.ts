import type { DesignDocument, DesignRow, Item, Solution, SolvedRow } from '../document/types';
import { DEFAULT_MATERIAL, findMaterial, frictionFactor, type Material } from '../friction';
import { linedSize, sectionOf } from '../shape';
import { SPREADS, type SpreadOptions } from './spreads';
import type { SpreadInput } from './types';

/** What each input does to the loss of each row, for one spread [Pa]. */
export interface Effects {
	readonly inputs: readonly SpreadInput[];
	/** By tag of the row: place of the input, and its effect. */
	readonly ofRow: ReadonlyMap<string, readonly (readonly [input: number, effect: number])[]>;
}

/** Parts whose loss goes with the density of the air. */
const WITH_DENSITY: readonly Item['part'][] = ['duct', 'flexible', 'fitting', 'junction'];

/**
 * First-order effects: a loss that goes with a coefficient changes by the spread of it; friction by the slope of the
 * friction factor. One method is wrong in the same way wherever it is used, so that it is one input of the whole design.
 *
 *   dp_i = u_i x_i d(dp)/dx_i
 *
 * @param document the design; roughness and materials of its rows
 * @param solution losses of its items [Pa]
 * @param options spreads in place of the standing ones [-]
 * @returns inputs, and their effects on the losses of the rows [Pa]
 */
export function effectsOf(document: DesignDocument, solution: Solution, options: SpreadOptions): Effects {
	const inputs: SpreadInput[] = [];
	const places = new Map<string, number>();
	const place = (input: SpreadInput): number => {
		const known = places.get(input.key);
		if (known !== undefined) return known;
		places.set(input.key, inputs.length);
		inputs.push(input);
		return inputs.length - 1;
	};
	const ofRow = new Map<string, (readonly [number, number])[]>();
	for (const row of document.rows) {
		const solved = solution.rows[row.tag];
		if (!solved) continue;
		const sums = new Map<number, number>();
		const add = (input: SpreadInput, loss: number) => {
			if (loss === 0 || input.spread === 0) return;
			const at = place(input);
			sums.set(at, (sums.get(at) ?? 0) + input.spread * loss);
		};
		for (const item of solved.items) {
			const input = inputOf(item, row, options);
			if (input) add(input, item.loss);
			if (WITH_DENSITY.includes(item.part)) add(densityInput(options), item.loss);
		}
		const roughness = roughnessInput(row, document, options);
		// The rigid and the flexible friction both go with the friction factor.
		add(roughness, (solved.frictionLoss + solved.flexibleLoss) * sensitivityToRoughness(row, solved, document));
		ofRow.set(row.tag, [...sums]);
	}
	return { inputs, ofRow };
}

function inputOf(item: Item, row: DesignRow, options: SpreadOptions): SpreadInput | null {
	const standing = (name: keyof typeof SPREADS, key: string, words: string): SpreadInput => ({
		...{ key, name: words, spread: options[name] ?? SPREADS[name].spread, basis: SPREADS[name].basis }
	});
	const { part, kind, name, catalogue } = item;
	if (catalogue && kind)
		return {
			key: `method ${kind} ${catalogue.methodKey ?? ''}`,
			name: `${kind.replaceAll('-', ' ')}, ${catalogue.method}`,
			spread: catalogue.uncertainty,
			basis: `stated with the method, ${catalogue.known}`
		};
	switch (part) {
		case 'fitting':
		case 'junction':
			return standing('coefficient', `coefficient ${name}`, `${name}, coefficient entered by hand`);
		case 'equipment':
			return standing('equipment', `equipment ${row.tag} ${name}`, `${name} in ${row.tag}`);
		case 'outlet':
			return standing('outlet', `outlet ${row.tag}`, `${name} at the end of ${row.tag}`);
		case 'flexible':
			return standing('flexible', 'flexible', 'Flexible duct as installed');
		default:
			return null;
	}
}

const densityInput = (options: SpreadOptions): SpreadInput => ({
	...{ key: 'density', name: 'Density of the air', spread: options.density ?? SPREADS.density.spread },
	basis: SPREADS.density.basis
});

function materialOf(row: DesignRow, document: DesignDocument): Material | null {
	if (row.roughness !== undefined) return null;
	if (row.material !== undefined) return findMaterial(row.material);
	return document.roughness !== undefined ? null : findMaterial(document.material ?? DEFAULT_MATERIAL);
}

/** The range of a material is taken as two spreads to either side. */
function roughnessInput(row: DesignRow, document: DesignDocument, options: SpreadOptions): SpreadInput {
	const material = materialOf(row, document);
	const range =
		material && material.high > material.low ? (material.high - material.low) / 4 / material.roughness : null;
	return {
		key: `roughness ${material?.key ?? 'entered'}`,
		name: material ? `Roughness of ${material.name.toLowerCase()}` : 'Roughness as entered',
		spread: options.roughness ?? range ?? SPREADS.roughness.spread,
		basis:
			range === null || options.roughness !== undefined
				? SPREADS.roughness.basis
				: `range of the material: ${material?.source ?? ''}`
	};
}

/** Step of the difference [-]: the factor is smooth, and a double has sixteen digits. */
const STEP = 1e-4;

/** d(ln f)/d(ln roughness), by a central difference of the friction factor itself. */
function sensitivityToRoughness(
	row: DesignRow,
	{ reynolds, hydraulicDiameter }: SolvedRow,
	document: DesignDocument
): number {
	const roughness = row.roughness ?? materialOf(row, document)?.roughness ?? document.roughness ?? 0;
	if (roughness === 0) return 0;
	const size = row.lining ? linedSize(row.size, row.lining.thickness, row.lining.sizeIs) : row.size;
	const { laminar } = sectionOf(size);
	const at = (factor: number) =>
		frictionFactor({ reynolds, relativeRoughness: (roughness * factor) / hydraulicDiameter, laminar });
	return (at(1 + STEP) - at(1 - STEP)) / (2 * STEP * at(1));
}
