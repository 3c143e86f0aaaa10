export { solveDesign } from './solve';
