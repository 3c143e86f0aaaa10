import { LEAKAGE } from './formulas-of-leakage';
import { SHAPE } from './formulas-of-shape';
import type { FormulaGroup } from './formula-note';

const NETWORK: FormulaGroup = {
	id: 'streams',
	title: 'Streams and paths',
	lead: 'A design is a tree of rows with the fan at its root. Each stream keeps its own total pressure where streams split and meet; no pressure is averaged over a junction.',
	formulas: [
		{
			name: 'Flow',
			equation: 'ρQ = Σ ρQ of the rows that join',
			where: 'Q volume flow [m³/s], ρ density of the air in the row [kg/m³]',
			range: 'One density in each row',
			source: 'Conservation of mass'
		},
		{
			name: 'Loss of a row',
			equation: 'Δp = friction + fittings + junction + equipment + outlet − thermal gravity',
			where: 'All in Pa, of total pressure',
			range: 'Design flow above zero',
			source: 'Bernoulli’s equation with losses'
		},
		{
			name: 'Loss of a fitting or junction',
			equation: 'Δp = C ½ρV²,  C₂ = C₁ (V₁ / V₂)²',
			where:
				'C on the velocity pressure of the leg that its source names; brought to another leg so that the loss stays the same',
			range: 'That of the entry',
			source: 'Definition of the loss coefficient'
		},
		{
			name: 'Path, index and spare',
			equation: 'spare = what the index path asks of the fan − what the path asks',
			where:
				'A path asks its loss, and the gauge pressure of its room: added in supply, taken off where air comes from the room',
			range: 'Supply, and the other side, each have their own',
			source: 'Common practice'
		},
		{
			name: 'Equipment and outlets',
			equation: 'Δp = Δp₀ (Q / Q₀)^{n}',
			where: 'Δp₀ loss at the flow Q₀, n exponent entered with it [–]',
			range: 'As the maker states',
			source: 'The maker’s data that were entered'
		},
		{
			name: 'Filters',
			equation: 'Δp₀ = ½ (Δp₀ of the clean one + Δp₀ of the dirty one)',
			where: 'The mean state; a filter counts as clean, mean or dirty, as entered',
			range: 'As the maker states',
			source: 'Common practice'
		},
		{
			name: 'Loss at another density',
			equation: 'Δp = Δp₀ ρ / ρ₀',
			where: 'ρ₀ density for which the maker gives Δp₀ [kg/m³]',
			range: 'One volume flow, exponent 2',
			source: 'Common practice',
			caution: 'Not applied to what is entered: a check says where the density is not that of makers’ data.'
		},
		{
			name: 'Thermal gravity',
			equation: 'Δp = g (ρ₀ − ρ) Δz',
			where: 'ρ₀ density of the surroundings [kg/m³], Δz rise in the direction of flow [m], g = 9.80665 m/s²',
			range: 'Any',
			source: 'Hydrostatics; g as fixed by the CGPM, 1901'
		}
	]
};

const AIR: FormulaGroup = {
	id: 'air',
	title: 'Air',
	lead: 'Density and viscosity are computed from temperature, humidity and elevation, or taken as entered.',
	formulas: [
		{
			name: 'Pressure at elevation',
			equation: 'p = 101 325 (1 − 2.25577 × 10⁻⁵ z)^{5.2559}',
			where: 'z elevation [m], p [Pa]',
			range: '−5000 to 11 000 m',
			source: 'U.S. Standard Atmosphere, 1976, eq. 33a'
		},
		{
			name: 'Density of humid air',
			equation: 'ρ = (p − φpₛ) / (287.042 T) + φpₛ / (461.52 T)',
			where: 'φ relative humidity [–], pₛ saturation pressure [Pa], T temperature [K]',
			range: '−50 to 80 °C, 10 to 200 kPa',
			source: 'Mixture of ideal gases; pₛ by Hyland & Wexler (1983)'
		},
		{
			name: 'Viscosity',
			equation: 'μ = 1.458 × 10⁻⁶ T^{1.5} / (T + 110.4)',
			where: 'T [K], μ [Pa s]',
			range: '−103 to 1627 °C; moisture lowers it by less than 1 % below 40 °C',
			source: 'U.S. Standard Atmosphere, 1976, eq. 51 (Sutherland)'
		}
	]
};

const FRICTION: FormulaGroup = {
	id: 'friction',
	title: 'Friction',
	lead: 'Friction runs on the hydraulic diameter and the mean velocity of the section itself, never on those of an equivalent round duct.',
	formulas: [
		{
			name: 'Friction loss',
			equation: 'Δp = f (L / Dₕ) ½ρV²,  Dₕ = 4A / P',
			where: 'L length [m], A area [m²], P perimeter [m], V mean velocity [m/s]',
			range: 'Round, rectangular and flat oval',
			source: 'Darcy–Weisbach equation'
		},
		{
			name: 'Friction factor, turbulent',
			equation: '1/√f = −2 log₁₀( ε / 3.7Dₕ + 2.51 / (Re √f) )',
			where: 'ε absolute roughness [m], Re = ρVDₕ/μ [–]; solved to rounding',
			range: 'Re above 4000, ε/Dₕ to 0.05',
			source: 'Colebrook (1939)'
		},
		{
			name: 'Friction factor, laminar',
			equation: 'f = 64 / Re in round ducts',
			where: 'Rectangles take the constant of their sides, 57 to 96',
			range: 'Re below 2000',
			source: 'Hagen and Poiseuille; Shah & London (1978)'
		},
		{
			name: 'Between the two',
			equation: 'ln(f Re²) is a cubic in ln Re',
			where: 'Meets both laws with value and slope, and rises all the way',
			range: 'Re 2000 to 4000',
			source: 'No standard; ours, after Fritsch & Carlson (1980)',
			caution: 'Flow of this kind is unsteady. A check says where it occurs.'
		},
		{
			name: 'Flexible duct',
			equation: 'Δp = k R L',
			where:
				'R friction rate of the rigid duct [Pa/m], L length of flexible duct as installed [m], k a factor that the designer gives; 4 if neither it nor a compression is',
			range: 'k is illustrative: it covers moderate compression',
			source: 'Abushakra, Walker & Sherman (2004): about 4 times for moderate, near 10 times for severe compression',
			caution: 'Flexible duct as built differs more than any formula. Look at it before trusting the figure.'
		},
		{
			name: 'Flexible duct, compressed',
			equation: 'k = 1 + 0.58 K e^{−0.00496 D},  K = 100 (1 − L / Lₑ)',
			where: 'L length as installed [m], Lₑ fully stretched [m], D diameter [mm]; on the loss of the stretched duct',
			range: 'D 150 to 400 mm; measured to K 30 %, with care to 45 %',
			source: 'Abushakra, Walker & Sherman (2004) and Culp: handbook form, from memory; the abstract’s magnitudes agree'
		}
	]
};

/** The groups in the order in which a figure comes about. */
export const FORMULA_GROUPS: readonly FormulaGroup[] = [NETWORK, AIR, SHAPE, FRICTION, LEAKAGE];
