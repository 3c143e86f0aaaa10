import {
	authorOf,
	fittingEntry,
	sentence,
	type CatalogueEntry,
	type FittingParameter,
	type Junction,
	type RowSize
} from '$lib/engine';
import { methodsOf } from './authors';
import { placedKind } from './by-place';
import { parameterWords } from './describe-part';
import { ofPlane } from './of-plane';
import type {
	DocumentEquipment,
	DocumentFitting,
	DocumentParts,
	PartFitting,
	PartProblem,
	Parts,
	RowPlace
} from './parts';

type Suited =
	{ readonly ok: true; readonly fitting: DocumentFitting } | { readonly ok: false; readonly problem: PartProblem };

/**
 * The parts of a cell as the design document holds them. Kinds of elbows depend on the row's shape, transitions on the
 * size of the row that is joined; a part that does not suit is left out and named among the problems.
 *
 * @param size free size of the row
 * @param place null where nothing else is known of the row
 */
export function fittingsFor(parts: Parts, size: RowSize, place: RowPlace | null = null): DocumentParts {
	const problems: PartProblem[] = [];
	const fittings: DocumentFitting[] = [];
	const ofJunction = parts.junction !== null && parts.junction.kind !== 'fixed';
	for (const part of parts.fittings) {
		const found: Suited =
			part.kind === 'fixed' ? { ok: true, fitting: fixed(part) } : fromCatalogue(part, size, place, ofJunction);
		if (found.ok) fittings.push(found.fitting);
		else problems.push(found.problem);
	}
	const equipment: DocumentEquipment[] = parts.equipment.map(({ name, loss, exponent, toBeConfirmed }) => ({
		name,
		loss,
		exponent,
		...(toBeConfirmed ? { toBeConfirmed } : {})
	}));
	return { junction: parts.junction && junctionFor(parts.junction, problems), fittings, equipment, problems };
}

/** With a coefficient as typed; without one from the catalogue, with flows and areas of the rows that meet. */
function junctionFor(part: PartFitting, problems: PartProblem[]): Junction | null {
	if (part.kind === 'fixed') return junctionOf(part);
	const entry = fittingEntry(part.kind);
	if (!entry) return null;
	const { leg, ...parameters } = part.parameters;
	const found = withParameters(part, entry, parameters);
	if (found.ok) return { ...found.fitting, leg: leg === 'straight' ? 'straight' : 'branch' };
	problems.push(found.problem);
	return null;
}

function junctionOf(part: PartFitting): Junction {
	const { coefficient, name, toBeConfirmed } = fixed(part);
	return { kind: 'fixed', coefficient, name, ...(toBeConfirmed ? { toBeConfirmed } : {}) };
}

/** What was typed beside the coefficient goes into the name: the coefficient alone is computed with. */
function fixed(part: PartFitting): DocumentFitting {
	const name = [part.name, ...parameterWords(part.parameters)].join(', ');
	return { kind: 'fixed', coefficient: part.coefficient ?? 0, ...common(part), name };
}

function common(part: PartFitting) {
	return {
		name: part.name,
		...(part.count > 1 ? { count: part.count } : {}),
		...(part.toBeConfirmed ? { toBeConfirmed: true } : {})
	};
}

function fromCatalogue(typed: PartFitting, size: RowSize, place: RowPlace | null, ofJunction: boolean): Suited {
	const placed = placedKind(typed, size, place, ofJunction);
	if (!placed.ok) return problem(typed, `${typed.name}: ${placed.message}`, placed.expected);
	const part = { ...typed, kind: placed.kind };
	const entry = entryFor(part, size);
	return entry === null ? unsuited(part, size) : withParameters(part, entry, ofPlane(placed.parameters, entry, size));
}

/** The fitting with what was typed for it, each figure within the range of the entry. */
function withParameters(part: PartFitting, entry: CatalogueEntry, typed: PartFitting['parameters']): Suited {
	const parameters: Record<string, number | string> = {};
	const { method } = part;
	if (method !== undefined && !methodsOf(entry).includes(method))
		return problem(part, `${part.name} has no method by ${authorOf(method)}`, authorsOf(entry));
	for (const [name, value] of Object.entries(typed)) {
		const known = entry.parameters.find((parameter) => parameter.name === name);
		if (known === undefined) {
			// A vaned elbow is always one of 90°: saying so is no fault.
			if (name === 'angle' && value === 90) continue;
			return problem(part, `${entry.name} has no ${parameterWords({ [name]: value })[0]}`, takes(entry));
		}
		const fault = faultOf(known, value);
		if (fault !== null)
			return problem(part, `${part.name}: ${known.label.toLowerCase()} ${value} ${fault}`, takes(entry));
		parameters[name] = value;
	}
	const by = method === undefined ? {} : { method };
	return { ok: true, fitting: { kind: entry.key, ...common(part), ...by, ...parameters } };
}

/** The entry for the row's shape: by its own key, by the shape's, or the first damper that suits. */
function entryFor(part: PartFitting, size: RowSize): CatalogueEntry | null {
	const shapes = size.shape === 'round' ? ['round'] : size.shape === 'oval' ? ['oval', 'rectangular'] : ['rectangular'];
	const ofShape = shapes.map((shape) => `${shape}-${part.kind}`);
	const bare = part.kind.replace(/^(round|rectangular|oval)-/, '');
	const keys =
		part.kind === 'damper'
			? ['damper-butterfly', 'damper-opposed-blades', 'damper-parallel-blades']
			: part.kind === 'offset'
				? ['offset-round', 'offset-rectangular']
				: [part.kind, ...ofShape, ...shapes.map((shape) => `${shape}-${bare}`)];
	for (const key of keys) {
		const entry = fittingEntry(key);
		if (entry?.shapes.includes(size.shape)) return entry;
	}
	return null;
}

function unsuited(part: PartFitting, size: RowSize): Suited {
	const others = ['round', 'rectangular', 'oval'].filter((shape) =>
		[part.kind, `${shape}-${part.kind}`].some((key) =>
			fittingEntry(key)?.shapes.some((known) => known === shape && known !== size.shape)
		)
	);
	const message =
		others.length > 0
			? `${part.name} is made for ${others.join(' and ')} duct; this row is ${size.shape}`
			: `${part.name} is not in the catalogue`;
	return problem(part, message, 'another part, or its coefficient, such as C0.23');
}

function faultOf(parameter: FittingParameter, value: number | string): string | null {
	if (parameter.options !== undefined) {
		return parameter.options.includes(value) ? null : 'is none of the choices';
	}
	if (typeof value !== 'number') return 'is not a figure';
	return value < parameter.min || value > parameter.max ? 'is outside the catalogue’s range' : null;
}

function authorsOf(entry: CatalogueEntry): string {
	const authors = methodsOf(entry).map((key) => `by ${authorOf(key).replace(',', '')}`);
	return authors.length ? authors.join('; ') : 'no author: the catalogue has one method for it';
}

function takes(entry: CatalogueEntry): string {
	const names = entry.parameters.map(
		({ label, options, min, max }) => `${label} ${options?.join(', ') ?? `${min} to ${max}`}`
	);
	return names.length === 0
		? 'no figures, or its coefficient, such as C0.23'
		: `${names.join('; ')}, or C, such as C0.23`;
}

function problem(part: PartFitting, message: string, expected: string): Suited {
	return { ok: false, problem: { part: part.name, message: sentence(message), expected } };
}
