/** A duct material and its absolute roughness. */
export interface Material {
	readonly key: string;
	readonly name: string;
	/** Absolute roughness for design [m] */
	readonly roughness: number;
	readonly source: string;
}

const RANGE = 'Published duct roughness table (2021 form), range';
const MEMORY = 'from memory';

function material(key: string, name: string, roughness_mm: number, source: string): Material {
	return { key, name, roughness: roughness_mm / 1000, source };
}

/** Roughness by material; the design value is ours within the published range, unless the source says otherwise. */
export const materials: readonly Material[] = [
	material('galvanized-steel', 'Galvanised steel', 0.09, `${RANGE} 0.05 to 0.10 mm for 1.2 m joints`),
	material('galvanized-steel-spiral', 'Galvanised steel, spiral', 0.09, `${RANGE} 0.06 to 0.12 mm for 3 m joints`),
	material(
		'galvanized-steel-spiral-ribbed',
		'Galvanised steel, spiral with ribs',
		0.11,
		`${RANGE} 0.088 to 0.116 mm for 3.7 m joints`
	),
	material(
		'galvanized-steel-rectangular',
		'Galvanised steel, rectangular',
		0.12,
		`${RANGE} 0.08 to 0.15 mm for 1.2 m joints`
	),
	material(
		'galvanized-steel-short-joints',
		'Galvanised steel, 0.75 m joints',
		0.15,
		`${RANGE.replace(', range', '')}: 0.15 mm, the basis of older friction charts`
	),
	material('steel-corrugated', 'Steel, spiral corrugated', 0.9, `${RANGE} 0.55 to 0.91 mm`),
	material('aluminium', 'Aluminium, round, crimped joints', 0.05, `${RANGE} 0.037 to 0.06 mm`),
	material('plastic', 'Plastic (PVC)', 0.03, `${RANGE} 0.009 to 0.046 mm`),
	material('drawn-tubing', 'Drawn tubing', 0.0005, `${RANGE.replace(', range', '')}: 0.0005 mm`),
	material('flexible-extended', 'Flexible duct, fully extended', 0.9, `${RANGE} 0.09 to 0.9 mm`),
	material('liner-coated', 'Fibrous liner, coated', 0.9, `0.9 to 1.5 mm, ${MEMORY}`),
	material('liner-uncoated', 'Fibrous liner, uncoated', 3, `about 3 mm, ${MEMORY}`),
	material('concrete', 'Concrete or masonry', 1.3, `0.3 to 3 mm, ${MEMORY}`)
];

/** The key of the material when none is named. */
export const DEFAULT_MATERIAL = 'galvanized-steel';

const byKey: ReadonlyMap<string, Material> = new Map(materials.map((entry) => [entry.key, entry]));

/** The material of a key, or null. */
export function findMaterial(key: string): Material | null {
	return byKey.get(key) ?? null;
}
