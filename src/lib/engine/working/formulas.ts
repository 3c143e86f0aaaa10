import { airAtTemperature, airState, velocityPressure } from '../air';
import {
	coefficientOf,
	filterLoss,
	junctionCoefficientOf,
	lossFromPoints,
	ratedLoss,
	type FilterState,
	type JunctionContext,
	type Leg,
	type LossPoint
} from '../fitting';
import { darcyWeisbach, flexibleStretchFactor, frictionFactor, reynoldsNumber } from '../friction';
import { sectionOf, type Size } from '../shape';

/** Values of a step by their symbols; texts of a catalogue's step are JSON. */
export type Inputs = Readonly<Record<string, number | string>>;

export interface Formula {
	readonly expression: string;
	readonly source: string;
	readonly compute: (values: Inputs) => number;
}

const n = (values: Inputs, symbol: string): number => {
	const value = values[symbol];
	if (typeof value !== 'number') throw new Error(`${symbol} is no number of this step`);
	return value;
};
const optional = (values: Inputs, symbol: string): number | undefined =>
	typeof values[symbol] === 'number' ? values[symbol] : undefined;
const text = (values: Inputs, symbol: string): string => String(values[symbol]);

function sizeOf(values: Inputs): Size {
	if ('D' in values) return { shape: 'round', diameter: n(values, 'D') };
	const shape = values.shape === 'oval' ? 'oval' : 'rectangular';
	return { shape, width: n(values, 'W'), height: n(values, 'H') };
}

/** In the order of their symbols: a + b + c …, as the engine adds them. */
const sumOf = (values: Inputs): number => Object.values(values).reduce<number>((sum, value) => sum + Number(value), 0);

const condition = (values: Inputs) => ({
	temperature: n(values, 't'),
	relativeHumidity: optional(values, 'φ'),
	elevation: optional(values, 'z'),
	pressure: optional(values, 'p')
});

function contextOf(values: Inputs): JunctionContext {
	return {
		direction: values.direction === 'converging' ? 'converging' : 'diverging',
		leg: text(values, 'leg') as Leg,
		flowRatio: n(values, 'q'),
		branchFlowRatio: n(values, 'qb'),
		areaRatio: n(values, 'a'),
		branchAreaRatio: n(values, 'ab'),
		straightAreaRatio: optional(values, 'as') ?? null,
		branches: n(values, 'branches'),
		commonSize: JSON.parse(text(values, 'common size')) as Size,
		size: JSON.parse(text(values, 'size')) as Size
	};
}

const CONTINUITY = 'Conservation of mass';
const DEFINITION = 'Definition';
const ENERGY = 'Total pressure along one stream';

const FORMULAS = {
	density: {
		expression: 'ρ = (p − pw)/(287.042 T) + pw/(461.52 T), pw = φ ps(t), p of the elevation z where not given',
		source: 'Ideal-gas mixture; saturation by Hyland and Wexler (1983), standard atmosphere',
		compute: (v) => airState(condition(v)).density
	},
	viscosity: {
		expression: 'μ = 1.458·10⁻⁶ T^1.5/(T + 110.4)',
		source: 'Sutherland, as in the U.S. Standard Atmosphere (1976)',
		compute: (v) => airState(condition(v)).viscosity
	},
	'density-at': {
		expression: 'ρ = (p − pw)/(287.042 T) + pw/(461.52 T), pw = min(φ ps(t), ps(t₁))',
		source: 'Ideal-gas mixture; saturation by Hyland and Wexler (1983)',
		compute: (v) => airAtTemperature(condition(v), n(v, 't₁')).density
	},
	'viscosity-at': {
		expression: 'μ = 1.458·10⁻⁶ T^1.5/(T + 110.4)',
		source: 'Sutherland, as in the U.S. Standard Atmosphere (1976)',
		compute: (v) => airAtTemperature(condition(v), n(v, 't₁')).viscosity
	},
	'given-density': { expression: 'ρ as entered', source: 'Entered', compute: (v) => n(v, 'ρ') },
	'given-viscosity': {
		expression: 'μ as entered, or that of 20 °C',
		source: 'Entered; Sutherland',
		compute: (v) => airState({ density: n(v, 'ρ'), viscosity: optional(v, 'μ') }).viscosity
	},
	area: {
		expression: 'A = πD²/4; W H; oval πa²/4 + a(b − a), a the lesser side',
		source: 'Plane geometry',
		compute: (v) => sectionOf(sizeOf(v)).area
	},
	'hydraulic-diameter': {
		expression: 'Dh = 4A/P',
		source: DEFINITION,
		compute: (v) => sectionOf(sizeOf(v)).hydraulicDiameter
	},
	'laminar-constant': {
		expression: 'f Re of laminar flow: 64 round; by the ratio of the sides, rectangular',
		source: 'Hagen and Poiseuille; Shah and London (1978)',
		compute: (v) => sectionOf(sizeOf(v)).laminar
	},
	'sum-flows': { expression: 'Q = sum of the flows that join', source: CONTINUITY, compute: sumOf },
	'given-flow': { expression: 'Q as entered', source: 'Entered', compute: (v) => n(v, 'Q') },
	'standard-flow': {
		expression: 'Q = Qₛ ρₛ/ρ',
		source: `${CONTINUITY}; Qₛ of air of the standard density`,
		compute: (v) => (n(v, 'Qₛ') * n(v, 'ρₛ')) / n(v, 'ρ')
	},
	'flow-at-density': {
		expression: 'Q = Q₁ ρ₁/ρ',
		source: CONTINUITY,
		compute: (v) => (n(v, 'Q₁') * n(v, 'ρ₁')) / n(v, 'ρ')
	},
	velocity: { expression: 'V = Q/A', source: CONTINUITY, compute: (v) => n(v, 'Q') / n(v, 'A') },
	'velocity-pressure': {
		expression: 'pv = ρV²/2',
		source: DEFINITION,
		compute: (v) => velocityPressure(n(v, 'ρ'), n(v, 'V'))
	},
	reynolds: {
		expression: 'Re = ρ V Dh/μ',
		source: DEFINITION,
		compute: (v) => reynoldsNumber(n(v, 'ρ'), n(v, 'V'), n(v, 'Dh'), n(v, 'μ'))
	},
	'relative-roughness': { expression: 'ε/Dh', source: DEFINITION, compute: (v) => n(v, 'ε') / n(v, 'Dh') },
	'friction-factor': {
		expression: '1/√f = −2 log₁₀(ε/3.7Dh + 2.51/(Re √f)), Re > 4000; f = c/Re, Re < 2000; a rising blend between',
		source: 'Colebrook (1939) and White; Hagen and Poiseuille',
		compute: (v) => frictionFactor({ reynolds: n(v, 'Re'), relativeRoughness: n(v, 'ε/Dh'), laminar: n(v, 'c') })
	},
	'friction-rate': {
		expression: 'R = f/Dh · ρV²/2',
		source: 'Darcy–Weisbach',
		compute: (v) => darcyWeisbach(n(v, 'f'), 1, n(v, 'Dh'), n(v, 'ρ'), n(v, 'V'))
	},
	'friction-loss': { expression: 'Δp = R L', source: 'Darcy–Weisbach', compute: (v) => n(v, 'R') * n(v, 'L') },
	'flexible-loss': {
		expression: 'Δp = k R L, k times the friction rate of rigid duct, or of the same duct stretched',
		source: 'Entered, the program’s default, or by its compression',
		compute: (v) => n(v, 'k') * n(v, 'R') * n(v, 'L')
	},
	coefficient: {
		expression: 'C by the entry of the catalogue',
		source: 'That of the entry',
		compute: (v) =>
			coefficientOf(text(v, 'kind'), JSON.parse(text(v, 'parameters')) as Record<string, unknown>, {
				size: JSON.parse(text(v, 'size')) as Size,
				reynolds: n(v, 'Re'),
				velocity: n(v, 'V'),
				relativeRoughness: n(v, 'ε/Dh'),
				frictionFactor: n(v, 'f')
			}).coefficient
	},
	'junction-coefficient': {
		expression: 'C on the velocity pressure of the common leg, by the entry of the catalogue',
		source: 'That of the entry',
		compute: (v) =>
			junctionCoefficientOf(text(v, 'kind'), JSON.parse(text(v, 'parameters')) as Record<string, unknown>, contextOf(v))
				.coefficient
	},
	ratio: { expression: 'part/whole', source: DEFINITION, compute: (v) => n(v, 'part') / n(v, 'whole') },
	'loss-of-coefficient': {
		expression: 'Δp = C n pv',
		source: 'Definition of the coefficient',
		compute: (v) => n(v, 'C') * n(v, 'n') * n(v, 'pv') + 0
	},
	'loss-of-junction': {
		expression: 'Δp = C pv',
		source: 'Definition of the coefficient',
		compute: (v) => n(v, 'C') * n(v, 'pv') + 0
	},
	'points-loss': {
		expression: 'ln Δp straight against ln Q between the points of the maker',
		source: 'Power law between measured points: common practice',
		compute: (v) => lossFromPoints(JSON.parse(text(v, 'points')) as LossPoint[], n(v, 'Q')).loss
	},
	'filter-loss': {
		expression: 'Δp = Δpᵣ (Q/Qᵣ)ⁿ, Δpᵣ of the state: clean, their mean, or final',
		source: 'Common practice',
		compute: (v) =>
			filterLoss(
				{
					clean: n(v, 'clean'),
					final: n(v, 'final'),
					state: text(v, 'state') as FilterState,
					atFlow: n(v, 'Qᵣ'),
					exponent: n(v, 'n')
				},
				n(v, 'Q')
			)
	},
	'flexible-stretch': {
		expression: 'k = 1 + 0.58 K e^(−0.00496 D), K the compression in %, D in mm',
		source: 'Abushakra, Walker & Sherman (2004), from memory',
		compute: (v) => flexibleStretchFactor(n(v, 'D'), n(v, 'compression')).factor
	},
	'flow-at-fan-end': {
		expression: 'Q₁ = Q₂ + q, q what leaks from the row',
		source: CONTINUITY,
		compute: (v) => n(v, 'Q₂') + n(v, 'q')
	},
	'mean-flow': {
		expression: 'Q = (Q₂ + Q₁)/2',
		source: 'Leakage spread evenly along the row',
		compute: (v) => (n(v, 'Q₂') + n(v, 'Q₁')) / 2
	},
	'rated-loss': {
		expression: 'Δp = Δpᵣ (Q/Qᵣ)ⁿ',
		source: 'Power law of a maker’s point: common practice',
		compute: (v) => ratedLoss(n(v, 'Δpᵣ'), n(v, 'Qᵣ'), n(v, 'Q'), n(v, 'n'))
	},
	'outlet-total': { expression: 'Δp as entered', source: 'Entered', compute: (v) => n(v, 'Δp') },
	'outlet-static': {
		expression: 'Δp = Δps + pv',
		source: 'Total = static + velocity pressure',
		compute: (v) => n(v, 'Δps') + n(v, 'pv')
	},
	'open-end': { expression: 'Δp = pv', source: 'An open end loses one velocity pressure', compute: (v) => n(v, 'pv') },
	'thermal-gravity': {
		expression: 'Δp = g (ρₛ − ρ) Δz, Δz the rise in the direction of flow',
		source: 'Hydrostatics; g 9.806 65 m/s²',
		compute: (v) => 9.80665 * (n(v, 'ρₛ') - n(v, 'ρ')) * n(v, 'Δz') + 0
	},
	'sum-losses': { expression: 'sum', source: ENERGY, compute: sumOf },
	'row-loss': {
		expression: 'Δp = duct + flexible + fittings + junction + equipment + outlet − thermal gravity',
		source: ENERGY,
		compute: (v) =>
			n(v, 'duct') +
			n(v, 'flexible') +
			n(v, 'fittings') +
			n(v, 'junction') +
			n(v, 'equipment') +
			n(v, 'outlet') -
			n(v, 'gravity') +
			0
	},
	requirement: {
		expression: 'the path’s loss, plus the pressure of the room it supplies, or less that of the room it draws from',
		source: ENERGY,
		compute: (v) => n(v, 'Δp') + (v.side === 'supply' ? n(v, 'room') : -n(v, 'room'))
	},
	difference: { expression: 'a − b', source: DEFINITION, compute: (v) => n(v, 'a') - n(v, 'b') + 0 },
	duty: {
		expression: 'p = requirement of the supply index + requirement of the other side’s index',
		source: 'Energy that the fan gives to both streams',
		compute: (v) => n(v, 'supply') + n(v, 'other')
	}
} as const satisfies Record<string, Formula>;

export type FormulaKey = keyof typeof FORMULAS;

/** The formula of a step. */
export function formulaOf(key: string): Formula {
	const found: Formula | undefined = Object.hasOwn(FORMULAS, key) ? FORMULAS[key as FormulaKey] : undefined;
	if (!found) throw new Error(`there is no formula ${key}`);
	return found;
}
