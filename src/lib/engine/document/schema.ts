import { z } from 'zod';
import { STRETCH } from '../friction';
import { LIMITS } from './limits';

/**
 * The design document `evendraft/design@1`: source of truth of the published JSON Schema.
 * SI units; angles in degrees, temperatures in degrees Celsius, relative humidity from 0 to 1.
 */
export const DESIGN_FORMAT = 'evendraft/design@1';

/** Keys of other versions are kept and noted by the solution, but are no part of the types. */
function open<S extends z.ZodRawShape>(shape: S): z.ZodObject<S> {
	return z.looseObject(shape) as unknown as z.ZodObject<S>;
}
const between = (range: { readonly min: number; readonly max: number }, about: string) =>
	z.number().min(range.min).max(range.max).describe(about);
const upTo = (max: number, about: string) => z.number().min(0).max(max).describe(about);
const either = (max: number, about: string) => z.number().min(-max).max(max).describe(about);
const text = z.string().max(LIMITS.text);
const tag = z.string().min(1).max(LIMITS.tag);
const count = z.int().min(1).max(LIMITS.count).describe('how many of it');
const toBeConfirmed = z.boolean().describe('the value is not settled yet');
const coefficient = either(LIMITS.coefficient, "coefficient on the row's own velocity pressure");
const method = z.string().min(1).describe('key of one of the methods of the kind, by its author');
const exponent = upTo(LIMITS.exponent, 'loss grows with flow to this power; 2 if absent');
const dimension = between(LIMITS.size, 'm, inside');
const roughness = upTo(LIMITS.roughness, 'absolute roughness, m');
const material = z.string().describe('a key of the catalogue of materials');

export const sizeSchema = z.discriminatedUnion('shape', [
	open({ shape: z.literal('round'), diameter: dimension }),
	open({ shape: z.literal('rectangular'), width: dimension, height: dimension }),
	open({ shape: z.literal('oval'), width: dimension, height: dimension })
]);

const stateByTemperature = open({
	temperature: between(LIMITS.temperature, 'degC'),
	relativeHumidity: upTo(1, '0 to 1; 0 if absent').optional(),
	elevation: between(LIMITS.elevation, 'm above sea level; 0 if absent').optional(),
	pressure: between(LIMITS.pressure, 'absolute, Pa; overrides the elevation').optional()
});
const stateByDensity = open({
	density: between(LIMITS.density, 'kg/m3'),
	viscosity: between(LIMITS.viscosity, 'dynamic, Pa s').optional()
});
export const airSchema = z.union([stateByDensity, stateByTemperature]);

const flow = between(LIMITS.flow, 'm3/s');

export const fanSchema = open({
	totalPressure: upTo(LIMITS.loss, 'Pa').optional(),
	curve: z
		.array(z.tuple([upTo(LIMITS.flow.max, 'm3/s'), either(LIMITS.loss, 'Pa')]))
		.min(2)
		.max(LIMITS.parts)
		.describe('[flow, total pressure], flow rising')
		.optional()
});

/** `fixed` carries its own coefficient; any other kind is a key of the catalogue, with its parameters beside it. */
export const fittingSchema = open({
	kind: z.string().min(1).describe("'fixed', or a key of the catalogue; its parameters stand beside it"),
	coefficient: coefficient.optional(),
	method: method.optional(),
	count: count.optional(),
	name: text.optional(),
	toBeConfirmed: toBeConfirmed.optional()
});

/**
 * Where the row joins another one: `fixed` carries its own coefficient on the row's velocity pressure; any other kind is
 * a junction of the catalogue, whose flows and areas are those of the rows.
 */
export const junctionSchema = open({
	kind: z.string().min(1).describe("'fixed', or a key of the catalogue whose place is a junction"),
	coefficient: coefficient.optional(),
	leg: z.enum(['straight', 'branch']).describe("which stream the row is; 'branch' if absent").optional(),
	method: method.optional(),
	name: text.optional(),
	toBeConfirmed: toBeConfirmed.optional()
});

/** A filter by its losses; they go with the flow itself, exponent 1, where none is named. */
export const filterSchema = open({
	clean: upTo(LIMITS.loss, 'Pa at atFlow'),
	final: upTo(LIMITS.loss, 'Pa at atFlow, at which it is changed'),
	state: z.enum(['clean', 'mean', 'dirty'])
});

export const equipmentSchema = open({
	name: text,
	loss: upTo(LIMITS.loss, 'total-pressure loss at atFlow, Pa; points or filter may stand in its place').optional(),
	points: z
		.array(z.tuple([flow, upTo(LIMITS.loss, 'Pa')]))
		.min(1)
		.max(LIMITS.parts)
		.describe("a maker's points, [flow, loss]")
		.optional(),
	filter: filterSchema.optional(),
	atFlow: flow.describe('m3/s; the design flow of the row if absent').optional(),
	exponent: exponent.optional(),
	toBeConfirmed: toBeConfirmed.optional()
});

export const outletSchema = open({
	name: text.optional(),
	flow,
	loss: upTo(LIMITS.loss, 'Pa at the flow; absent: an open end of one velocity pressure').optional(),
	exponent: exponent.optional(),
	lossIs: z.enum(['total', 'static']).describe("'total' if absent").optional(),
	pressure: either(LIMITS.loss, 'gauge pressure of the room, Pa; 0 if absent').optional(),
	toBeConfirmed: toBeConfirmed.optional()
});

export const flexibleSchema = open({
	length: upTo(LIMITS.length, 'm'),
	factor: upTo(100, "times the row's own rigid friction rate; 4 if absent").optional(),
	compression: upTo(
		STRETCH.max,
		'what is missing of the stretched length, as a fraction; in place of the factor, on the rate of stretched duct'
	).optional()
});

/** How tight the ductwork is: a class by its letter or number, or an inch-pound class by its figure. */
const tightness = {
	class: z.string().describe("a leakage class by key or name, as 'C' or 'ATC 3'").optional(),
	cl: upTo(1_000, 'cfm by 100 square feet at 1 in. wg; goes before a class; 0 for no leakage').optional()
};
export const rowLeakageSchema = open(tightness);
export const leakageSchema = open({
	...tightness,
	testPressure: upTo(10_000, 'Pa, for the allowable leakage').optional()
});

/** A liner inside the duct, and what the size of the row means. */
export const liningSchema = open({
	thickness: upTo(1, 'm'),
	sizeIs: z.enum(['clear', 'metal']).describe('the free space inside the liner, or the inside of the metal')
});

export const rowSchema = open({
	id: tag.describe('travels to problems').optional(),
	tag,
	joins: tag.nullable().describe("the row on the fan's side; null where the row meets the fan"),
	side: z.enum(['supply', 'return', 'exhaust', 'outdoor']),
	serves: text.optional(),
	size: sizeSchema,
	length: upTo(LIMITS.length, 'centre line, m'),
	temperature: between(
		LIMITS.temperature,
		'degC, of the air in the row; that of the row it joins if absent'
	).optional(),
	rise: either(LIMITS.rise, 'elevation of the far end less that of the fan end, m').optional(),
	roughness: roughness.optional(),
	material: material.optional(),
	flexible: flexibleSchema.optional(),
	lining: liningSchema.optional(),
	leakage: rowLeakageSchema.optional(),
	pressureClass: either(
		LIMITS.loss,
		'static pressure that the ductwork is built for, Pa; negative for suction'
	).optional(),
	junction: junctionSchema.optional(),
	fittings: z.array(fittingSchema).max(LIMITS.parts).optional(),
	equipment: z.array(equipmentSchema).max(LIMITS.parts).optional(),
	outlet: outletSchema.optional()
});

export const criteriaSchema = open({
	mainVelocity: upTo(1_000, 'm/s, most in rows that others join').optional(),
	runOutVelocity: upTo(1_000, 'm/s, most in rows with an outlet').optional(),
	frictionRate: upTo(LIMITS.loss, 'Pa/m, most').optional(),
	flexibleLength: upTo(LIMITS.length, 'm, most').optional(),
	damperAtOutlet: z.boolean().describe('every row with an outlet has a damper').optional(),
	aspectRatio: z.number().min(1).max(1_000).describe('longer side to shorter, most').optional()
});

/** A check with a threshold of its own, or left out with a reason. */
const checkSchema = open({
	threshold: z.number().describe('in the SI unit that the check names').optional(),
	off: open({ reason: text.describe('without one the check is made') })
		.describe('left out')
		.optional()
});

/** A finding that a person has looked at and lets stand. */
const overrideSchema = open({
	check: tag,
	row: tag.nullable().describe('null: all that the check finds'),
	reason: text.describe('without one the override does not count'),
	by: text.describe('who decided it'),
	at: text.describe('date')
});

/** An allowance on the duty, by its name. */
const marginSchema = open({
	name: text,
	of: z.enum(['flow', 'pressure']).describe('flow of the fan, or fan total pressure'),
	fraction: z.number().min(-0.9).max(10).describe('of it, as 0.05').optional(),
	pressure: either(LIMITS.loss, 'total pressure, Pa; of a margin on pressure').optional(),
	reason: text.optional()
});

/** What stands on the sheet beside the figures. */
const recordSchema = open({
	codes: text.describe('codes and their editions').optional(),
	noiseCriterion: text.describe('of the rooms, as NC 35').optional(),
	tolerance: text.describe('within which the balanced flows are accepted').optional(),
	originator: text.describe('who made the calculation').optional(),
	checker: text.describe('who checked it').optional()
});

export const designSchema = open({
	format: z.literal(DESIGN_FORMAT),
	title: text.optional(),
	air: airSchema,
	leakage: leakageSchema.describe('of the rows that name none of their own').optional(),
	flowBasis: z
		.enum(['actual', 'standard'])
		.describe("'actual' if absent; 'standard': flows of outlets are those of air of the standard density")
		.optional(),
	standardDensity: between(LIMITS.density, 'kg/m3, of standard flows; 1.204 if absent').optional(),
	surroundings: airSchema.describe('for thermal gravity; the same air if absent').optional(),
	fan: fanSchema.optional(),
	roughness: roughness.optional(),
	material: material.optional(),
	criteria: criteriaSchema.optional(),
	checks: z.record(z.string(), checkSchema).describe('by the keys of the checks').optional(),
	overrides: z.array(overrideSchema).max(LIMITS.rows).optional(),
	margins: z.array(marginSchema).max(LIMITS.parts).optional(),
	record: recordSchema.optional(),
	methods: z
		.record(z.string(), z.string())
		.describe('for keys of the catalogue, the method that counts where a fitting names none')
		.optional(),
	service: z
		.enum(['general', 'kitchen-grease', 'laboratory', 'hazardous', 'smoke-control'])
		.describe("'general' if absent")
		.optional(),
	rows: z.array(rowSchema).min(1).max(LIMITS.rows)
});

/** JSON Schema (2020-12) of the design document, generated from the above. */
export function designJsonSchema(): object {
	return z.toJSONSchema(designSchema);
}
