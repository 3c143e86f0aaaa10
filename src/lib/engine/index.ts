/** The only door of the calculation. Design document in, solution out: plain data, SI units. */
export {
	canonicalText,
	DESIGN_FORMAT,
	designJsonSchema,
	LIMITS,
	validateDocument,
	type Criteria,
	type DesignAir,
	type DesignDocument,
	type DesignRow,
	type Equipment,
	type Fitting,
	type FittingEntry,
	type Flag,
	type FlagRule,
	type Flexible,
	type Item,
	type Junction,
	type Outlet,
	type Path,
	type Problem,
	type ProblemCode,
	type RowSize,
	type Service,
	type Side,
	type Solution,
	type SolvedRow,
	type SolveResult,
	type ValidateResult
} from './document';
export { solveDesign, STANDARD_DENSITY } from './network';
export { ENGINE_VERSION } from './version';
export { leakageClasses, type LeakageClass } from './leakage';
export {
	monteCarloOf,
	SPREADS,
	uncertaintyOf,
	type Influence,
	type MonteCarlo,
	type SpreadOptions,
	type Uncertain,
	type Uncertainty
} from './uncertainty';
export {
	checkList,
	checksOf,
	marginLedger,
	NOT_SHOWN,
	type CheckBasis,
	type CheckResult,
	type CheckThreshold,
	type Finding,
	type MarginLedger,
	type MarginLine
} from './checks';
export {
	formulaOf,
	ROW_FIGURES,
	workingOf,
	type FigureName,
	type RowFigure,
	type Working,
	type WorkingStep,
	type WorkingValue
} from './working';
export * from './quantity';
export {
	authorOf,
	catalogue,
	coefficientOf,
	fittingEntry,
	junctionCoefficientOf,
	type CatalogueEntry,
	type CoefficientResult,
	type Drawing,
	type Family,
	type FittingContext,
	type FittingParameter,
	type JunctionContext,
	type Known,
	type Leg,
	type Method,
	type Picture
} from './fitting';
export { airState, type AirState } from './air';
export { findMaterial, frictionFactor, materials, regime, type Material } from './friction';
export { equivalentDiameter, sectionOf, type Section, type Size } from './shape';
export { OutOfRangeError } from './errors';
export { evaluatedTopics, Given, publishedEvaluator, subjectsOfTopic, type Answer, type Evaluators } from './published';
