// Published checks of elbows.
import { frictionFactor } from '../friction';
import { bendAspectFactorIdelchik, bendIdelchik, bendReynoldsFactorIdelchik } from '../fitting/bend-idelchik';
import { bendMiller } from '../fitting/bend-miller';
import { bendIto1960, bendRennels2012, mitreRennels2012 } from '../fitting/bend-rivals';
import {
	mitreReynoldsFactorSmacna,
	rectangularElbowSmacna,
	roundElbowSmacna,
	segmentedElbowSmacna
} from '../fitting/elbow-tables';
import { mitreAspectFactorIdelchik, mitreIdelchik } from '../fitting/mitre-idelchik';
import { rectangularMitreSmacna, roundMitreSmacna } from '../fitting/mitre-tables';
import { splitterVanes } from '../fitting/splitter-vanes';
import type { Evaluators, Given } from './given';

const angle = (given: Given) => given.number('angle');
const aspect = (given: Given) => (given.has('H_over_W') ? given.number('H_over_W') : 1);

export const elbowChecks: Evaluators = {
	'fitting.elbow-round-smooth': (given) => roundElbowSmacna(given.number('r_over_D'), angle(given)),
	'fitting.elbow-round-gored': (given) =>
		segmentedElbowSmacna(given.number('pieces'), given.number('r_over_D'), angle(given)),
	'fitting.elbow-round-mitred': (given) => {
		// Most checks say '>=1.4e5', where the factor is 1.
		const Re = given.has('Re') && !given.isText('Re') ? given.number('Re') : 1.4e5;
		return roundMitreSmacna(angle(given)) * mitreReynoldsFactorSmacna(Re);
	},
	'fitting.elbow-rect-mitred': (given) => rectangularMitreSmacna(angle(given), aspect(given)),
	'fitting.elbow-rect-smooth': (given) => rectangularElbowSmacna(given.number('r_over_W'), aspect(given)),
	'fitting.elbow-splitter-geometry': (given) => {
		const { curveRatio, radii } = splitterVanes(given.number('vanes'), given.number('throat_R'), given.number('W'));
		return { CR: curveRatio, vane_radii: radii };
	},
	'fitting.elbow-round-smooth.idelchik': (given) => bendIdelchik(angle(given), given.number('R0_over_D')),
	'fitting.elbow-mitred.idelchik': (given) => mitreIdelchik(angle(given)) * mitreAspectFactorIdelchik(aspect(given)),
	'fitting.elbow-rect-smooth.idelchik': (given) =>
		bendIdelchik(angle(given), given.number('R0_over_W')) * bendAspectFactorIdelchik(aspect(given)),
	'fitting.elbow-Re-factor.idelchik': (given) =>
		bendReynoldsFactorIdelchik(given.number('R0_over_D'), given.number('Re')),
	'fitting.elbow-round-smooth.rennels': (given) =>
		bendRennels2012(angle(given), given.number('r_over_D'), given.number('fd')),
	'fitting.elbow-round-smooth.ito': (given) => bendIto1960(given.number('r_over_D'), given.number('Re'), angle(given)),
	'fitting.elbow-round-smooth.miller': (given) => {
		const Re = given.number('Re');
		const factor = (eps: number) => frictionFactor({ reynolds: Re, relativeRoughness: eps / given.number('D') });
		return bendMiller(given.number('r_over_D'), angle(given), Re, factor(given.number('eps')), factor(0));
	},
	'fitting.elbow-round-mitred.rennels': (given) => mitreRennels2012(angle(given))
};
