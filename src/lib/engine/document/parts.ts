import { catalogue, fittingEntry, type CatalogueEntry } from '../fitting';
import { findMaterial, materials } from '../friction';
import { leakageClasses } from '../leakage';
import { fault, isRecord, rowsOf, shown, textAt, type Step } from './fault';
import { leakageClassOf } from './leakage-class-of';
import type { Problem } from './types';

/** Keys of a fitting that are no parameters of its kind. */
const OWN_KEYS: readonly string[] = ['kind', 'count', 'name', 'toBeConfirmed', 'id', 'note', 'method'];
const JUNCTION_KEYS: readonly string[] = [...OWN_KEYS, 'leg', 'coefficient'];

/** What is wrong with materials, fittings and junctions beyond their schema: keys and parameters of the catalogue. */
export function partProblems(document: unknown): Problem[] {
	const problems: Problem[] = [];
	materialProblem(document, [], problems);
	fanProblems(document, problems);
	leakageProblem(isRecord(document) ? document.leakage : null, ['leakage'], problems);
	methodsProblems(document, problems);
	const air = isRecord(document) ? document.air : null;
	const byDensity = isRecord(air) && air.density !== undefined;
	rowsOf(document).forEach((row, i) => {
		if (!isRecord(row)) return;
		if (byDensity && row.temperature !== undefined)
			problems.push(
				fault(
					'temperature-unknown',
					['rows', i, 'temperature'],
					'cannot be used: the air of the design is given by its density',
					'air by its temperature, humidity and elevation; or no temperature of rows'
				)
			);
		materialProblem(row, ['rows', i], problems);
		if (Array.isArray(row.fittings))
			row.fittings.forEach((one, k) => fittingProblems(one, ['rows', i, 'fittings', k], problems));
		junctionProblems(row.junction, ['rows', i, 'junction'], problems);
		leakageProblem(row.leakage, ['rows', i, 'leakage'], problems);
		liningProblem(row, ['rows', i, 'lining'], problems);
		if (Array.isArray(row.equipment))
			row.equipment.forEach((one, k) => equipmentProblem(one, ['rows', i, 'equipment', k], problems));
	});
	return problems;
}

function materialProblem(holder: unknown, path: readonly Step[], problems: Problem[]): void {
	const material = textAt(holder, 'material');
	if (material === null || findMaterial(material) !== null) return;
	const keys = materials.map((one) => one.key).join(', ');
	problems.push(fault('unknown-material', [...path, 'material'], `is ${shown(material)}`, `one of ${keys}`));
}

/** A class of the list, or an inch-pound figure. */
function leakageProblem(leakage: unknown, path: readonly Step[], problems: Problem[]): void {
	if (!isRecord(leakage)) return;
	const key = textAt(leakage, 'class');
	const known = leakageClasses.map((one) => one.key).join(', ');
	if (key !== null && leakageClassOf(key) === null)
		problems.push(fault('unknown-leakage-class', [...path, 'class'], `is ${shown(key)}`, `one of ${known}`));
	else if (key === null && leakage.cl === undefined)
		problems.push(fault('unknown-leakage-class', path, 'names no class', `class, one of ${known}; or cl`));
}

/** A liner leaves room for the air. */
function liningProblem(row: Readonly<Record<string, unknown>>, path: readonly Step[], problems: Problem[]): void {
	const { lining, size } = row;
	if (!isRecord(lining) || !isRecord(size) || lining.sizeIs !== 'metal' || typeof lining.thickness !== 'number') return;
	const sides = [size.diameter, size.width, size.height].filter((side) => typeof side === 'number');
	const least = Math.min(...sides);
	if (2 * lining.thickness < least * (1 - 1e-6)) return;
	problems.push(
		fault(
			'lining-fills',
			[...path, 'thickness'],
			'leaves no free space in the duct',
			'less than half of the least side'
		)
	);
}

function equipmentProblem(equipment: unknown, path: readonly Step[], problems: Problem[]): void {
	if (!isRecord(equipment)) return;
	const { loss, points, filter } = equipment;
	const given = [loss, points, filter].filter((one) => one !== undefined).length;
	if (given !== 1)
		problems.push(
			fault(
				'loss-missing',
				[...path, 'loss'],
				given === 0 ? 'is missing' : 'stands beside points or a filter',
				'one of loss, points and filter'
			)
		);
	if (Array.isArray(points)) {
		let before: readonly number[] = [0, 0];
		points.forEach((point: unknown, k) => {
			if (!Array.isArray(point) || typeof point[0] !== 'number' || typeof point[1] !== 'number') return;
			const [at, there] = [point[0], point[1]];
			if (at <= (before[0] ?? 0) || there <= 0 || there < (before[1] ?? 0))
				problems.push(
					fault(
						'out-of-range',
						[...path, 'points', k],
						'does not rise',
						'points by rising flow, each of a loss above 0 that does not fall'
					)
				);
			before = [at, there];
		});
	}
	if (
		isRecord(filter) &&
		typeof filter.clean === 'number' &&
		typeof filter.final === 'number' &&
		filter.final < filter.clean
	)
		problems.push(
			fault(
				'out-of-range',
				[...path, 'filter', 'final'],
				`is ${filter.final}`,
				`at least ${filter.clean}, the loss when clean`
			)
		);
}

function junctionProblems(junction: unknown, path: readonly Step[], problems: Problem[]): void {
	const kind = textAt(junction, 'kind');
	if (kind === null || !isRecord(junction)) return;
	if (kind === 'fixed') {
		if (junction.coefficient === undefined)
			problems.push(fault('parameter-missing', [...path, 'coefficient'], 'is missing', 'a number'));
		return;
	}
	const entry = fittingEntry(kind);
	if (entry?.place !== 'junction') {
		const keys = catalogue.flatMap((one) => (one.place === 'junction' ? one.key : [])).join(', ');
		problems.push(fault('unknown-fitting', [...path, 'kind'], `is ${shown(kind)}`, `"fixed" or one of ${keys}`));
		return;
	}
	methodProblem(entry, junction.method, [...path, 'method'], problems);
	for (const [key, value] of Object.entries(junction))
		if (!JUNCTION_KEYS.includes(key)) parameterProblem(entry, key, value, [...path, key], problems);
}

/** A method must be one that the entry has. */
function methodProblem(entry: CatalogueEntry, method: unknown, path: readonly Step[], problems: Problem[]): void {
	if (typeof method !== 'string') return;
	const known = [entry.standardMethod ?? [], ...(entry.rivals ?? []).map(({ key }) => key)].flat();
	if (known.includes(method)) return;
	const expected = known.length ? `one of ${known.join(', ')}` : `no method: ${entry.key} has one alone`;
	problems.push(fault('unknown-method', path, `is ${shown(method)}`, expected));
}

function methodsProblems(document: unknown, problems: Problem[]): void {
	const methods = isRecord(document) ? document.methods : null;
	if (!isRecord(methods)) return;
	for (const [key, method] of Object.entries(methods)) {
		const entry = fittingEntry(key);
		if (entry) methodProblem(entry, method, ['methods', key], problems);
		else
			problems.push(fault('unknown-fitting', ['methods', key], 'is no key of the catalogue', 'a key of the catalogue'));
	}
}

function fittingProblems(fitting: unknown, path: readonly Step[], problems: Problem[]): void {
	const kind = textAt(fitting, 'kind');
	if (kind === null || kind === '' || !isRecord(fitting)) return;
	if (kind === 'fixed') {
		if (fitting.coefficient === undefined)
			problems.push(fault('parameter-missing', [...path, 'coefficient'], 'is missing', 'a number'));
		return;
	}
	const entry = fittingEntry(kind);
	// A junction sees other legs than its own row: it has its own place in a row.
	if (entry === null || entry.place === 'junction') {
		problems.push(
			fault('unknown-fitting', [...path, 'kind'], `is ${shown(kind)}`, '"fixed" or a key of the catalogue of fittings')
		);
		return;
	}
	methodProblem(entry, fitting.method, [...path, 'method'], problems);
	for (const [key, value] of Object.entries(fitting))
		if (!OWN_KEYS.includes(key)) parameterProblem(entry, key, value, [...path, key], problems);
}

function parameterProblem(
	entry: CatalogueEntry,
	key: string,
	value: unknown,
	path: readonly Step[],
	problems: Problem[]
): void {
	const parameter = entry.parameters.find((one) => one.name === key);
	if (parameter === undefined) {
		const names = entry.parameters.map((one) => one.name).join(', ') || 'no parameters';
		problems.push(fault('parameter-unknown', path, `is no parameter of ${entry.key}`, names));
		return;
	}
	if (parameter.options !== undefined) {
		if (parameter.options.some((one) => one === value)) return;
		const options = parameter.options.map((one) => JSON.stringify(one)).join(', ');
		problems.push(fault('parameter-range', path, `is ${shown(value)}`, `one of ${options}`));
		return;
	}
	if (typeof value !== 'number') {
		problems.push(fault('type', path, `is ${shown(value)}`, 'a number'));
		return;
	}
	const { min, max, unit } = parameter;
	if (!Number.isFinite(value) || (value >= (min ?? value) && value <= (max ?? value))) return;
	const expected = `a number from ${min} to ${max} ${unit}`.trim();
	problems.push(fault('parameter-range', path, `is ${value}`, expected));
}

function fanProblems(document: unknown, problems: Problem[]): void {
	const fan = isRecord(document) ? document.fan : null;
	const curve = isRecord(fan) ? fan.curve : null;
	if (!Array.isArray(curve)) return;
	let before = -1;
	curve.forEach((point: unknown, i) => {
		const flow: unknown = Array.isArray(point) ? point[0] : null;
		if (typeof flow !== 'number') return;
		if (flow <= before)
			problems.push(
				fault('fan-curve', ['fan', 'curve', i, 0], `is ${flow}`, `more than ${before} m3/s, the point before`)
			);
		before = flow;
	});
}
