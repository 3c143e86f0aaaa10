export { catalogue, fittingEntry } from './catalogue';
export { coefficientOf, junctionCoefficientOf } from './coefficient-of';
export { lossAtDensity, meanFilterLoss, ratedLoss } from './rated-loss';
export { coefficientOnLeg } from './reference-change';
export type {
	CatalogueEntry,
	CoefficientResult,
	Drawing,
	Family,
	FittingContext,
	FittingParameter,
	FittingParameters,
	JunctionContext,
	Known,
	Leg,
	Method,
	Picture
} from './types';
