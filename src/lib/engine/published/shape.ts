// Published checks of sections.
import { equivalentDiameter, laminarRectangle, sectionOf } from '../shape';
import type { Evaluators } from './given';

const INCH = 0.0254;

export const shapeChecks: Evaluators = {
	'geometry.rect-equivalent': (given) => {
		const width = given.number('a_in') * INCH;
		return equivalentDiameter({ shape: 'rectangular', width, height: given.number('b_in') * INCH }) / INCH;
	},
	'geometry.flat-oval': (given) => {
		const height = given.number('minor_mm') / 1000;
		const size = { shape: 'oval', width: given.number('major_mm') / 1000, height } as const;
		const { area, perimeter, hydraulicDiameter } = sectionOf(size);
		return {
			A_mm2: area * 1e6,
			P_mm: perimeter * 1000,
			De_mm: equivalentDiameter(size) * 1000,
			Dh_mm: hydraulicDiameter * 1000
		};
	},
	'friction.rect-laminar': (given) => laminarRectangle(1, given.number('aspect_b_over_a'))
};
