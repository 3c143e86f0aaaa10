export { authorOf } from './author';
export { catalogue, fittingEntry } from './catalogue';
export { coefficientOf, junctionCoefficientOf } from './coefficient-of';
export { lossFromPoints, powerLawFit, type CurveLoss, type LossPoint, type PowerLaw } from './equipment-loss';
export { filterLoss, type Filter, type FilterState } from './filter-loss';
export { lossAtDensity, meanFilterLoss, ratedLoss } from './rated-loss';
export { coefficientOnLeg } from './reference-change';
export { effectiveDuctLength } from './system-effect';
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
