import { findDefinition, findJunction } from './catalogue';
import type { Note, Definition, ParameterValues } from './definition';
import { readParameters } from './parameters';
import type { Size } from '../shape';
import type { CatalogueEntry, CoefficientResult, FittingContext, FittingParameters, JunctionContext } from './types';

/** Below this Reynolds number no source of the catalogue was measured. */
const TURBULENT = 4_000;

/**
 * Coefficient of a fitting of the catalogue, on the velocity pressure of the row it sits in.
 *
 * @param kind key of the catalogue
 * @param parameters those of the entry [-, °]; a missing one takes its default, one beyond its limits the limit, with a note
 * @param context the row: size [m], Reynolds number [-], velocity [m/s], relative roughness [-], friction factor [-]
 * @returns coefficient [-] with method, source and what lies outside the range
 * @throws {Error} when the catalogue has no such key
 * @source That of the entry
 * @check fixtures/published/elbows.json
 */
export function coefficientOf(kind: string, parameters: FittingParameters, context: FittingContext): CoefficientResult {
	const definition = findDefinition(kind);
	if (!definition) throw new Error(`the catalogue has no fitting ${kind}`);
	return resultOf(definition, parameters, context, context.reynolds);
}

/**
 * Coefficient of one stream of a junction, on the velocity pressure of the common leg. Negative where the other stream
 * gives more than this one loses.
 *
 * @param kind key of the catalogue, of an entry whose place is a junction
 * @param parameters those of the entry [-, °]; flows and areas are not among them
 * @param context the node as this stream sees it
 * @returns coefficient on the common leg [-] with method, source and what lies outside the range
 * @throws {Error} when the catalogue has no such junction
 * @source That of the entry
 * @check fixtures/published/junctions-diverging.json
 */
export function junctionCoefficientOf(
	kind: string,
	parameters: FittingParameters,
	context: JunctionContext
): CoefficientResult {
	const definition = findJunction(kind);
	if (!definition) throw new Error(`the catalogue has no junction ${kind}`);
	return resultOf(definition, parameters, context, Infinity);
}

/** What was said of the coefficient in hand; one for all, as a network asks for many thousand. */
const outside: string[] = [];
const within: string[] = [];
const note: Note = (text, isWithin = false) => {
	const list = isWithin ? within : outside;
	if (!list.includes(text)) list.push(text);
};

/** By the method that the parameters name, or the entry's own. */
function resultOf<Context extends { readonly size: Size }>(
	{ entry, coefficient: standard, rivals }: Definition<Context>,
	parameters: FittingParameters,
	context: Context,
	reynolds: number
): CoefficientResult {
	outside.length = within.length = 0;
	const rival = entry.rivals === undefined ? undefined : rivalOf(entry, parameters.method);
	const values = readParameters(entry, parameters, note);
	const coefficient = ((rival && rivals?.[rival.key]) ?? standard)(values, context, note);
	if (!entry.shapes.includes(context.size.shape)) outside.unshift(`the source is not for ${context.size.shape} ducts`);
	if (reynolds < TURBULENT) outside.push(turbulentNote(reynolds, outside));
	const { method, source, known, uncertainty } = rival ?? entry;
	return {
		coefficient: coefficient === 0 ? 0 : coefficient, // never -0
		methodKey: rival?.key ?? entry.standardMethod ?? null,
		method,
		source,
		known,
		uncertainty,
		parameters: parametersAsUsed(entry, values, parameters),
		inRange: outside.length === 0,
		rangeNote: outside.length + within.length === 0 ? null : [...outside, ...within].join('; ')
	};
}

const rivalOf = ({ rivals }: CatalogueEntry, method: unknown) =>
	method === undefined ? undefined : rivals?.find(({ key }) => key === method);

type UsedParameters = CoefficientResult['parameters'];
const standing = new Map<CatalogueEntry, UsedParameters>();

function parametersAsUsed(entry: CatalogueEntry, values: ParameterValues, given: FittingParameters): UsedParameters {
	// Most fittings are as they stand in the catalogue: these share one list of the defaults.
	for (const { name } of entry.parameters) if (Object.hasOwn(given, name)) return listOf(entry, values);
	let list = standing.get(entry);
	if (list === undefined) standing.set(entry, (list = Object.freeze(listOf(entry, values))));
	return list;
}

function listOf(entry: CatalogueEntry, values: ParameterValues): UsedParameters {
	const used: Record<string, number | string> = {};
	for (const { name, options, default: standard } of entry.parameters) {
		if (options === undefined) used[name] = values.number(name);
		else used[name] = typeof standard === 'number' ? Number(values.choice(name)) : values.choice(name);
	}
	return used;
}

/** The Reynolds number is told once: a note on the range of a formula may have told it already. */
function turbulentNote(reynolds: number, notes: readonly string[]): string {
	const isTold = notes.some((text) => text.startsWith('Reynolds number'));
	return `the source is for turbulent flow${isTold ? '' : `; Re is ${Math.floor(reynolds)}`}`;
}
