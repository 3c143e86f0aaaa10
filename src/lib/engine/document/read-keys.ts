import {
	criteriaSchema,
	designSchema,
	equipmentSchema,
	filterSchema,
	fanSchema,
	fittingSchema,
	flexibleSchema,
	junctionSchema,
	leakageSchema,
	liningSchema,
	outletSchema,
	rowLeakageSchema,
	rowSchema
} from './schema';

const keysOf = (schema: { readonly shape: object }): ReadonlySet<string> => new Set(Object.keys(schema.shape));

/** The keys that are read, by the part of the document they stand in. */
export const readKeys = {
	design: keysOf(designSchema),
	air: new Set(['temperature', 'relativeHumidity', 'elevation', 'pressure']),
	airByDensity: new Set(['density', 'viscosity']),
	criteria: keysOf(criteriaSchema),
	fan: keysOf(fanSchema),
	row: keysOf(rowSchema),
	round: new Set(['shape', 'diameter']),
	sides: new Set(['shape', 'width', 'height']),
	flexible: keysOf(flexibleSchema),
	junction: keysOf(junctionSchema),
	leakage: keysOf(leakageSchema),
	rowLeakage: keysOf(rowLeakageSchema),
	lining: keysOf(liningSchema),
	fitting: keysOf(fittingSchema),
	equipment: keysOf(equipmentSchema),
	filter: keysOf(filterSchema),
	outlet: keysOf(outletSchema)
} as const;
