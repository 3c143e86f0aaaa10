import { findDefinition } from './catalogue';
import { readParameters } from './parameters';
import type { CoefficientResult, FittingContext, FittingParameters } from './types';

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
	const { entry } = definition;
	const notes: string[] = [];
	const note = (text: string) => void (notes.includes(text) || notes.push(text));
	if (!entry.shapes.includes(context.size.shape)) note(`the source is not for ${context.size.shape} ducts`);
	const values = readParameters(entry, parameters, note);
	const coefficient = definition.coefficient(values, context, note);
	if (context.reynolds < TURBULENT) note(turbulentNote(context.reynolds, notes));
	return {
		coefficient: coefficient === 0 ? 0 : coefficient, // never -0
		method: entry.method,
		source: entry.source,
		parameters: Object.fromEntries(
			entry.parameters.map(({ name, options, default: standard }) => [
				name,
				options === undefined
					? values.number(name)
					: typeof standard === 'number'
						? Number(values.choice(name))
						: values.choice(name)
			])
		),
		inRange: notes.length === 0,
		rangeNote: notes.length === 0 ? null : notes.join('; ')
	};
}

/** The Reynolds number is told once: a note on the range of a formula may have told it already. */
function turbulentNote(reynolds: number, notes: readonly string[]): string {
	const isTold = notes.some((text) => text.startsWith('Reynolds number'));
	return `the source is for turbulent flow${isTold ? '' : `; Re is ${Math.floor(reynolds)}`}`;
}
