export { SPREADS, type SpreadName, type SpreadOptions } from './spreads';
export type { Influence, MonteCarlo, Sampled, SpreadInput, Uncertain, UncertainPath, Uncertainty } from './types';
export { monteCarloOf, uncertaintyOf } from './uncertainty-of';
