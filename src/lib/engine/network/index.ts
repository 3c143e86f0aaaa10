export { STANDARD_DENSITY } from './flows';
export { solveDesign } from './solve';
