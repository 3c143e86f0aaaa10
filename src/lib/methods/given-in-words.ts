import { figureText } from './axis';

const NAMES: Readonly<Record<string, string>> = {
	angle: 'θ',
	included_angle: 'θ',
	closed_angle: 'θ',
	angle_to_wall_deg: 'θ',
	branch_deflection_deg: 'θ',
	A_small_over_A_large: 'A₁/A₂',
	A1_over_A2: 'A₁/A₂',
	A2_over_A1: 'A₂/A₁',
	A2_over_A1_small_over_large: 'A₁/A₂',
	R0_over_D: 'r/D',
	R0_over_W: 'r/W',
	H_over_W_or_round: 'H/W',
	Qb_over_Qc: 'Qb/Qc',
	fd: 'f',
	lambda: 'f',
	eps: 'ε',
	t_C: 't °C',
	rh: 'φ',
	p_Pa: 'p Pa',
	rho: 'ρ',
	mu: 'μ'
};
/** Said by the method already. */
const LEFT_OUT = ['regime', 'fitting', 'As_over_Ac'];

const nameOf = (key: string): string => NAMES[key] ?? key.replaceAll('_over_', '/').replaceAll('_', ' ');

/** The inputs of a published check, as `r/D 1, θ 90°`. */
export function givenInWords(inputs: Readonly<Record<string, unknown>>): string {
	return Object.entries(inputs)
		.filter(([key]) => !LEFT_OUT.includes(key))
		.map(([key, value]) => {
			if (Array.isArray(value)) return `${value.length} ${nameOf(key)}`;
			const text = typeof value === 'number' ? figureText(value) : String(value).replace('>=', '≥ ');
			return `${nameOf(key)} ${text}${NAMES[key] === 'θ' ? '°' : ''}`;
		})
		.join(', ');
}

/** Which figure of a check with several; for one alone its unit, if it has one. */
export function partInWords(part: string, unit: string): string {
	if (part !== '') return part.replaceAll('_', ' ');
	const plain = unit
		.replace(/^-\s*/, '')
		.replace(/^\((.*)\)$/, '$1')
		.replaceAll('_', ' ');
	return plain === '' || plain.includes('Darcy') ? '' : plain;
}
