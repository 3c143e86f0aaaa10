export {
	equivalentDiameter,
	equivalentOvalHeytDiaz1975,
	equivalentRectangleHuebscher1948
} from './equivalent-diameter';
export { LAMINAR_ROUND, laminarRectangle } from './laminar-constant';
export { linedSize, type LinedBasis } from './lined-size';
export { sectionOf, type Section } from './section';
export type { Shape, Size } from './size';
