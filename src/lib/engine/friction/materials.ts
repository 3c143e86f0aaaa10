/** A duct material and its absolute roughness. */
export interface Material {
	readonly key: string;
	readonly name: string;
	/** Absolute roughness for design [m] */
	readonly roughness: number;
	/** Smoothest and roughest of the source [m]; both the design value where it names one value */
	readonly low: number;
	readonly high: number;
	readonly source: string;
	/** Whether the range was read in a source or is remembered; a design value within a range is ours */
	readonly known: 'published table' | 'from memory';
	/** The inner surface is a liner: the clear size is less than that of the metal. */
	readonly lined: boolean;
}

const TABLE = 'Published duct roughness table (2021 form)';
const FEET = 'printed in feet';

/** The roughnesses [mm] are low, design, high. */
type Roughness = readonly [low: number, design: number, high: number];

function material(
	key: string,
	name: string,
	[low, design, high]: Roughness,
	source: string,
	known: Material['known'] = 'published table'
): Material {
	const of = { low: low / 1000, roughness: design / 1000, high: high / 1000 };
	return { key, name, ...of, source, known, lined: key.startsWith('liner') };
}

/** Roughness by material; the design value is ours within the published range, unless the source says otherwise. */
export const materials: readonly Material[] = [
	material(
		'galvanized-steel',
		'Galvanised steel',
		[0.049, 0.09, 0.098],
		`${TABLE}: round with longitudinal seam, 1.2 m joints, 0.00016 to 0.00032 ${FEET}`
	),
	material(
		'galvanized-steel-spiral',
		'Galvanised steel, spiral',
		[0.061, 0.09, 0.122],
		`${TABLE}: 3 m joints, 0.0002 to 0.0004 ${FEET}`
	),
	material(
		'galvanized-steel-spiral-ribbed',
		'Galvanised steel, spiral with ribs',
		[0.088, 0.11, 0.116],
		`${TABLE}: one to three ribs, 3.7 m joints, 0.00029 to 0.00038 ${FEET}`
	),
	material(
		'galvanized-steel-rectangular',
		'Galvanised steel, rectangular',
		[0.082, 0.12, 0.152],
		`${TABLE}: 1.2 m joints, 0.00027 to 0.0005 ${FEET}`
	),
	material(
		'galvanized-steel-short-joints',
		'Galvanised steel, 0.75 m joints',
		[0.15, 0.15, 0.15],
		`${TABLE}: one value, 0.0005 ${FEET}, the basis of older friction charts`
	),
	material(
		'steel-corrugated',
		'Steel, spiral corrugated',
		[0.549, 0.9, 0.914],
		`${TABLE}: beaded slip joints, 0.0018 to 0.0030 ${FEET}`
	),
	material(
		'aluminium',
		'Aluminium, round, crimped joints',
		[0.037, 0.05, 0.061],
		`${TABLE}: 0.00012 to 0.0002 ${FEET}`
	),
	material('plastic', 'Plastic (PVC)', [0.009, 0.03, 0.046], `${TABLE}: 0.00003 to 0.00015 ${FEET}`),
	material('drawn-tubing', 'Drawn tubing', [0.0005, 0.0005, 0.0005], `${TABLE}: one value, 0.0000015 ${FEET}`),
	material(
		'flexible-extended',
		'Flexible duct, fully extended',
		[0.09, 0.9, 0.914],
		`${TABLE}: 0.0003 to 0.003 ${FEET}; rougher over a coarse wire helix`
	),
	material(
		'liner-coated',
		'Fibrous liner, coated',
		[0.9, 0.9, 1.5],
		'Air side faced: 0.003 to 0.005 in feet, from memory',
		'from memory'
	),
	material(
		'liner-uncoated',
		'Fibrous liner, uncoated',
		[3, 3, 3],
		'Bare or sprayed: one value, about 0.01 in feet, from memory',
		'from memory'
	),
	material(
		'concrete',
		'Concrete or masonry',
		[0.3, 1.3, 3],
		'0.001 to 0.01 in feet, from memory; another public table has 0.3 to 1 mm',
		'from memory'
	)
];

/** The key of the material when none is named. */
export const DEFAULT_MATERIAL = 'galvanized-steel';

const byKey: ReadonlyMap<string, Material> = new Map(materials.map((entry) => [entry.key, entry]));

/** The material of a key, or null. */
export function findMaterial(key: string): Material | null {
	return byKey.get(key) ?? null;
}
