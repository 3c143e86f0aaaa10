import { PI } from '../arithmetic';
import { LAMINAR_ROUND, laminarRectangle } from './laminar-constant';
import type { Size } from './size';

export interface Section {
	/** Free area [m2] */
	readonly area: number;
	/** Wetted perimeter [m] */
	readonly perimeter: number;
	/** 4 A / P [m] */
	readonly hydraulicDiameter: number;
	/** f Re of laminar flow on the hydraulic diameter [-] */
	readonly laminar: number;
}

function sectionFrom(area: number, perimeter: number, laminar: number): Section {
	return { area, perimeter, hydraulicDiameter: (4 * area) / perimeter, laminar };
}

function ovalSection(width: number, height: number): Section {
	const a = Math.min(width, height);
	const b = Math.max(width, height);
	// No published laminar value is carried for a flat oval; that of a circle stands in.
	return sectionFrom((PI * a * a) / 4 + a * (b - a), PI * a + 2 * (b - a), LAMINAR_ROUND);
}

/**
 * Area, perimeter and hydraulic diameter of a section.
 *
 *   round        A = pi D^2/4              P = pi D
 *   rectangular  A = a b                   P = 2 (a + b)
 *   flat oval    A = pi a^2/4 + a (b - a)  P = pi a + 2 (b - a), a the lesser side
 *   Dh = 4 A/P
 *
 * @param size inner sides or diameter [m], positive
 * @returns area [m2], perimeter [m], hydraulic diameter [m] and f Re of laminar flow [-]
 * @source Plane geometry; flat oval after Heyt & Diaz, Pressure drop in flat-oval spiral air duct (1975)
 * @check fixtures/published/shape.json
 */
export function sectionOf(size: Size): Section {
	if (size.shape === 'rectangular') {
		const { width, height } = size;
		return sectionFrom(width * height, 2 * (width + height), laminarRectangle(width, height));
	}
	if (size.shape === 'oval') return ovalSection(size.width, size.height);
	const D = size.diameter;
	return { area: (PI * D * D) / 4, perimeter: PI * D, hydraulicDiameter: D, laminar: LAMINAR_ROUND };
}
