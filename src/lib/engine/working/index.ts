export { formulaOf } from './formulas';
export type { Working, WorkingStep, WorkingValue } from './types';
export { ROW_FIGURES, workingOf, type FigureName, type RowFigure } from './working-of';
