import {
	authorOf,
	findMaterial,
	fittingEntry,
	formatDensity,
	formatElevation,
	formatFlow,
	formatHumidity,
	formatRoughness,
	formatTemperature,
	formatViscosity,
	STANDARD_DENSITY,
	unitOf,
	type DesignAir,
	type DesignDocument,
	type Solution,
	type UnitSystem
} from '$lib/engine';
import type { ReportInput } from './input';
import type { Labelled } from './model';
import { SERVICE } from './wording';

/** What the figures rest on: air, formulas, roughness, what is counted and what is not. */
export function basisOf({ document, solution, units, heading }: ReportInput): Labelled[] {
	const density = `${formatDensity(solution.air.density, units)} ${unitOf('density', units)}`;
	const viscosity = `${formatViscosity(solution.air.viscosity, units)} ${unitOf('viscosity', units)}`;
	const { surroundings } = document;
	const assumed = 'density' in document.air && document.air.viscosity === undefined ? ', of air at 20 °C' : '';
	return [
		{ label: 'Air', value: [...airWords(document.air, units), density].join(', ') },
		{ label: 'Viscosity', value: `${viscosity}${assumed}` },
		...(surroundings ? [{ label: 'Surroundings', value: surroundingsWords(surroundings, units) }] : []),
		{ label: 'Service', value: document.service ? SERVICE[document.service] : 'not named; taken as general' },
		...(heading.service.trim() ? [{ label: 'Serves', value: heading.service.trim() }] : []),
		{ label: 'Friction', value: 'Darcy–Weisbach, Colebrook–White' },
		{ label: 'Roughness', value: roughnessWords(document, units) },
		{ label: 'Losses', value: 'coefficient × own velocity pressure; equipment and outlets as entered' },
		...methodWords(solution).map((value) => ({ label: 'Methods', value })),
		{ label: 'Flexible duct', value: flexibleWords(document) },
		{ label: 'Leakage, margin', value: leakageWords(document, solution, units) },
		...(document.flowBasis === 'standard'
			? [{ label: 'Flows', value: `of outlets as air of ${standardWords(document, units)}; others actual` }]
			: []),
		{ label: 'Engine', value: `Evendraft ${solution.engineVersion}` }
	];
}

function airWords(air: DesignAir, units: UnitSystem): string[] {
	if ('density' in air) return ['density as entered'];
	const { temperature, relativeHumidity = 0, elevation = 0 } = air;
	const words = [`${formatTemperature(temperature, units)} ${unitOf('temperature', units)}`];
	if (relativeHumidity > 0) words.push(`${formatHumidity(relativeHumidity, units)} % RH`);
	if (air.pressure !== undefined) words.push('pressure as entered');
	else words.push(elevation === 0 ? 'sea level' : `${formatElevation(elevation, units)} ${unitOf('elevation', units)}`);
	return words;
}

function surroundingsWords(air: DesignAir, units: UnitSystem): string {
	if ('density' in air) return `${formatDensity(air.density, units)} ${unitOf('density', units)}, for thermal gravity`;
	return `${formatTemperature(air.temperature, units)} ${unitOf('temperature', units)}, for thermal gravity`;
}

function standardWords({ standardDensity = STANDARD_DENSITY }: DesignDocument, units: UnitSystem): string {
	return `${formatDensity(standardDensity, units)} ${unitOf('density', units)}`;
}

/** Authors that were chosen in place of the catalogue's own, each kind of fitting once; nothing where none was. */
function methodWords({ rows }: Solution): string[] {
	const chosen = new Set<string>();
	for (const { items } of Object.values(rows))
		for (const { kind, catalogue } of items) {
			const entry = kind === null ? null : fittingEntry(kind);
			const key = catalogue?.methodKey;
			if (entry && key !== undefined && key !== entry.standardMethod)
				chosen.add(`${lowered(entry.name)} by ${authorOf(key).replace(',', '')}`);
		}
	return chosen.size === 0 ? [] : [`${[...chosen].join('; ')}; others by the catalogue’s own`];
}

type Holder = { readonly roughness?: number; readonly material?: string };

/** The roughness in use, row by row, each named once; a figure goes before a material that stands beside it. */
function roughnessWords(document: DesignDocument, units: UnitSystem): string {
	const own = ({ roughness, material }: Holder): string | null => {
		const known = material === undefined ? null : findMaterial(material);
		const value = roughness ?? known?.roughness;
		if (value === undefined) return null;
		const figure = `${formatRoughness(value, units)} ${unitOf('roughness', units)}`;
		return roughness === undefined && known ? `${figure}, ${lowered(known.name)}` : figure;
	};
	const general = own(document) ?? own({ material: 'galvanized-steel' }) ?? '';
	const used = [...new Set(document.rows.map((row) => own(row) ?? general))];
	return used.join('; ');
}

function flexibleWords(document: DesignDocument): string {
	const flexible = document.rows.flatMap((row) => row.flexible ?? []);
	if (flexible.length === 0) return 'none';
	const shares = flexible.flatMap(({ factor, compression }) => (factor === undefined ? (compression ?? []) : []));
	if (shares.length === flexible.length) {
		const pressed = [...new Set(shares)].map((share) => `${formatHumidity(share, 'SI')} %`);
		return `compressed by ${pressed.join(', ')}, on the rate of stretched duct`;
	}
	const byDefault = flexible.some(({ factor }) => factor === undefined) ? ' (the program’s default)' : '';
	const factors = flexible.map(({ factor }) => factor ?? 4);
	const [least, most] = [Math.min(...factors), Math.max(...factors)].map((factor) => String(Number(factor.toFixed(2))));
	return `${least === most ? least : `${least} to ${most}`} × the rigid rate${byDefault}`;
}

/** The class, what leaks, and its share; margins are never in the figures. */
function leakageWords({ leakage }: DesignDocument, { leakage: sum }: Solution, units: UnitSystem): string {
	if (!leakage || !sum) return 'none included';
	const named = leakage.cl === undefined ? `class ${leakage.class ?? ''}` : `CL ${leakage.cl}`;
	const flow = `${formatFlow(sum.flow, units)} ${unitOf('flow', units)}`;
	return `${named}: ${flow}, ${(100 * sum.share).toFixed(1)} % of the fan’s; no margin`;
}

const lowered = (name: string) => name.charAt(0).toLowerCase() + name.slice(1);
