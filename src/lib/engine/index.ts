/** The only door of the calculation. Design document in, solution out: plain data, SI units. */
export { DESIGN_FORMAT, designJsonSchema } from './document/schema';
export { LIMITS } from './document/limits';
export type {
	Criteria,
	DesignAir,
	DesignDocument,
	DesignRow,
	Equipment,
	Fitting,
	FittingEntry,
	Flag,
	FlagRule,
	Flexible,
	Item,
	Junction,
	Outlet,
	Path,
	Problem,
	ProblemCode,
	RowSize,
	Service,
	Side,
	Solution,
	SolvedRow,
	SolveResult,
	ValidateResult
} from './document/types';
export { ENGINE_VERSION } from './version';
