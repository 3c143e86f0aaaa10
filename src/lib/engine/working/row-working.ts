import type { DesignDocument, DesignRow, Equipment, Item, Solution, SolvedRow } from '../document/types';
import { DEFAULT_MATERIAL, findMaterial } from '../friction';
import { STANDARD_DENSITY } from '../network';
import { linedSize, type Size } from '../shape';
import { entered, settled, standing, type Chain, type Input, type Ref } from './chain';

/** All that the working of a design looks into. */
export interface Ground {
	readonly document: DesignDocument;
	readonly solution: Solution;
	readonly rows: ReadonlyMap<string, DesignRow>;
	/** Tags of the rows that join each one, in the order in which the engine adds them. */
	readonly joining: ReadonlyMap<string, readonly string[]>;
}

/** The work of one row, figure by figure: each asks for those it rests on. */
export class RowWorking {
	constructor(
		private readonly ground: Ground,
		private readonly chain: Chain,
		private readonly row: DesignRow,
		private readonly solved: SolvedRow
	) {}

	private of(name: string): string {
		return `${name} of ${this.row.tag}`;
	}
	private other(tag: string): RowWorking {
		const [row, solved] = [this.ground.rows.get(tag), this.ground.solution.rows[tag]];
		if (!row || !solved) throw new Error(`no row ${tag}`);
		return new RowWorking(this.ground, this.chain, row, solved);
	}

	private condition(): Record<string, Input> {
		const { air } = this.ground.document;
		if ('density' in air) throw new Error('the air is given by its density');
		return {
			t: entered('Temperature of the air', air.temperature, '°C'),
			...(air.relativeHumidity !== undefined && { φ: entered('Relative humidity', air.relativeHumidity) }),
			...(air.elevation !== undefined && { z: entered('Elevation', air.elevation, 'm') }),
			...(air.pressure !== undefined && { p: entered('Pressure of the air', air.pressure, 'Pa') })
		};
	}

	density(): Ref {
		const { air } = this.ground.document;
		const { temperature } = this.solved;
		const unit = 'kg/m³';
		if ('density' in air)
			return this.chain.work(
				'given-density',
				{ symbol: 'ρ', name: 'Density of the air', unit },
				{
					ρ: entered('Density of the air', air.density, unit)
				}
			);
		if (temperature === undefined)
			return this.chain.work('density', { symbol: 'ρ', name: 'Density of the air', unit }, this.condition());
		return this.chain.work(
			'density-at',
			{ symbol: 'ρ', name: `Density at ${temperature} °C`, unit },
			{
				...this.condition(),
				't₁': entered('Temperature of the row', temperature, '°C')
			}
		);
	}

	viscosity(): Ref {
		const { air } = this.ground.document;
		const { temperature } = this.solved;
		const unit = 'Pa·s';
		if ('density' in air)
			return this.chain.work(
				'given-viscosity',
				{ symbol: 'μ', name: 'Viscosity of the air', unit },
				{
					ρ: this.density(),
					...(air.viscosity !== undefined && { μ: entered('Viscosity', air.viscosity, unit) })
				}
			);
		if (temperature === undefined)
			return this.chain.work('viscosity', { symbol: 'μ', name: 'Viscosity of the air', unit }, this.condition());
		return this.chain.work(
			'viscosity-at',
			{ symbol: 'μ', name: `Viscosity at ${temperature} °C`, unit },
			{
				...this.condition(),
				't₁': entered('Temperature of the row', temperature, '°C')
			}
		);
	}

	private size(): Record<string, Input> {
		const size = this.clearSize();
		if (size.shape === 'round') return { D: entered('Diameter', size.diameter, 'm') };
		return {
			shape: entered('Shape', size.shape),
			W: entered('Width', size.width, 'm'),
			H: entered('Height', size.height, 'm')
		};
	}
	/** The size that the air has: a liner takes some of the metal's. */
	private clearSize(): Size {
		const { size, lining } = this.row;
		return lining ? linedSize(size, lining.thickness, lining.sizeIs) : size;
	}
	area(): Ref {
		return this.chain.work('area', { symbol: 'A', name: this.of('Area'), unit: 'm²' }, this.size());
	}
	hydraulicDiameter(): Ref {
		const result = { symbol: 'Dh', name: this.of('Hydraulic diameter'), unit: 'm' };
		return this.chain.work('hydraulic-diameter', result, this.size());
	}

	/** Flow that the losses of the row go with: that of both ends, or their mean where air leaks. */
	flow(): Ref {
		const result = { symbol: 'Q', name: this.of('Flow'), unit: 'm³/s' };
		if (this.solved.leakage === undefined) return this.farFlow(result);
		return this.chain.work('mean-flow', result, { 'Q₂': this.farFlow(), 'Q₁': this.fanFlow() });
	}

	/** Flow at the outlet, or where rows join. */
	private farFlow(result = { symbol: 'Q₂', name: this.of('Flow at the far end'), unit: 'm³/s' }): Ref {
		const { outlet, tag } = this.row;
		const { flowBasis, standardDensity = STANDARD_DENSITY } = this.ground.document;
		if (outlet && flowBasis === 'standard')
			return this.chain.work('standard-flow', result, {
				Qₛ: entered('Flow of the outlet, standard', outlet.flow, 'm³/s'),
				ρₛ: standing('Standard density', standardDensity, 'kg/m³'),
				ρ: this.density()
			});
		if (outlet) return this.chain.work('given-flow', result, { Q: entered('Flow of the outlet', outlet.flow, 'm³/s') });
		const flows = (this.ground.joining.get(tag) ?? []).map((one) => this.flowInto(this.other(one), one));
		return this.chain.work('sum-flows', result, numbered('Q', flows));
	}

	/** Flow where the row joins another, or meets the fan. */
	private fanFlow(): Ref {
		const { leakage } = this.solved;
		if (leakage === undefined) return this.flow();
		return this.chain.work(
			'flow-at-fan-end',
			{ symbol: 'Q₁', name: this.of('Flow at the fan end'), unit: 'm³/s' },
			{ 'Q₂': this.farFlow(), q: settled(this.of('Leakage'), leakage, 'm³/s') }
		);
	}

	/** The flow of a row that joins this one, at the density of this one. */
	private flowInto(joining: RowWorking, tag: string): Ref {
		const flow = joining.fanFlow();
		if (this.isUniform()) return flow;
		return this.chain.work(
			'flow-at-density',
			{
				...{ symbol: 'Q', name: `Flow of ${tag} in ${this.row.tag}`, unit: 'm³/s' }
			},
			{ 'Q₁': flow, 'ρ₁': joining.density(), ρ: this.density() }
		);
	}
	private isUniform(): boolean {
		// As the engine sees it: rows of one temperature hold one air, whoever names it.
		const [first, ...others] = Object.values(this.ground.solution.rows);
		return others.every(({ temperature }) => temperature === first?.temperature);
	}

	velocity(): Ref {
		const result = { symbol: 'V', name: this.of('Velocity'), unit: 'm/s' };
		return this.chain.work('velocity', result, { Q: this.flow(), A: this.area() });
	}
	velocityPressure(): Ref {
		const result = { symbol: 'pv', name: this.of('Velocity pressure'), unit: 'Pa' };
		return this.chain.work('velocity-pressure', result, { ρ: this.density(), V: this.velocity() });
	}
	/** Where other rows join: at the flow of the far end. */
	private nodeVelocityPressure(): Ref {
		if (this.solved.leakage === undefined) return this.velocityPressure();
		const V = this.chain.work(
			'velocity',
			{ symbol: 'V', name: this.of('Velocity at the far end'), unit: 'm/s' },
			{ Q: this.farFlow(), A: this.area() }
		);
		const result = { symbol: 'pv', name: this.of('Velocity pressure at the far end'), unit: 'Pa' };
		return this.chain.work('velocity-pressure', result, { ρ: this.density(), V });
	}
	reynolds(): Ref {
		return this.chain.work(
			'reynolds',
			{ symbol: 'Re', name: this.of('Reynolds number'), unit: '' },
			{
				...{ ρ: this.density(), V: this.velocity(), Dh: this.hydraulicDiameter(), μ: this.viscosity() }
			}
		);
	}
	private roughness(): Input {
		const { document } = this.ground;
		if (this.row.roughness !== undefined) return entered('Roughness', this.row.roughness, 'm');
		const ofRow = this.row.material && findMaterial(this.row.material);
		if (ofRow) return entered(`Roughness of ${ofRow.name}`, ofRow.roughness, 'm');
		if (document.roughness !== undefined) return entered('Roughness', document.roughness, 'm');
		const general = findMaterial(document.material ?? DEFAULT_MATERIAL);
		const value = general?.roughness ?? 0;
		return document.material === undefined
			? standing(`Roughness of ${general?.name ?? ''}`, value, 'm')
			: entered(`Roughness of ${general?.name ?? ''}`, value, 'm');
	}
	relativeRoughness(): Ref {
		const result = { symbol: 'ε/Dh', name: this.of('Relative roughness'), unit: '' };
		return this.chain.work('relative-roughness', result, { ε: this.roughness(), Dh: this.hydraulicDiameter() });
	}
	frictionFactor(): Ref {
		const laminar = { symbol: 'c', name: this.of('Laminar constant'), unit: '' };
		return this.chain.work(
			'friction-factor',
			{ symbol: 'f', name: this.of('Friction factor'), unit: '' },
			{
				Re: this.reynolds(),
				'ε/Dh': this.relativeRoughness(),
				c: this.chain.work('laminar-constant', laminar, this.size())
			}
		);
	}
	frictionRate(): Ref {
		return this.chain.work(
			'friction-rate',
			{ symbol: 'R', name: this.of('Friction rate'), unit: 'Pa/m' },
			{
				...{ f: this.frictionFactor(), Dh: this.hydraulicDiameter(), ρ: this.density(), V: this.velocity() }
			}
		);
	}
	frictionLoss(): Ref {
		return this.chain.work(
			'friction-loss',
			{ symbol: 'Δp', name: this.of('Friction loss'), unit: 'Pa' },
			{
				R: this.frictionRate(),
				L: entered('Length', this.row.length, 'm')
			}
		);
	}
	flexibleLoss(): Ref {
		const result = { symbol: 'Δp', name: this.of('Loss of flexible duct'), unit: 'Pa' };
		const { flexible } = this.row;
		if (!flexible) return this.nothing(result.name);
		const { factor, compression } = flexible;
		const isStretched = factor === undefined && compression !== undefined;
		const k = isStretched
			? this.chain.work(
					'flexible-stretch',
					{ symbol: 'k', name: this.of('Factor of the flexible duct'), unit: '' },
					{ D: this.hydraulicDiameter(), compression: entered('Compression', compression) }
				)
			: factor === undefined
				? standing('Times the rigid rate', 4)
				: entered('Times the rigid rate', factor);
		return this.chain.work('flexible-loss', result, {
			k,
			R: isStretched ? this.stretchedRate() : this.frictionRate(),
			L: entered('Length of flexible duct', flexible.length, 'm')
		});
	}

	/** Of flexible duct that is fully stretched, in the section of the row. */
	private stretchedRate(): Ref {
		const material = findMaterial('flexible-extended');
		const ε = standing(`Roughness of ${material?.name ?? ''}`, material?.roughness ?? 0, 'm');
		const ratio = { symbol: 'ε/Dh', name: this.of('Relative roughness of the stretched duct'), unit: '' };
		const factor = { symbol: 'f', name: this.of('Friction factor of the stretched duct'), unit: '' };
		const rate = { symbol: 'R', name: this.of('Friction rate of the stretched duct'), unit: 'Pa/m' };
		const f = this.chain.work('friction-factor', factor, {
			Re: this.reynolds(),
			'ε/Dh': this.chain.work('relative-roughness', ratio, { ε, Dh: this.hydraulicDiameter() }),
			c: standing('Laminar constant, round', 64)
		});
		const [Dh, ρ, V] = [this.hydraulicDiameter(), this.density(), this.velocity()];
		return this.chain.work('friction-rate', rate, { f, Dh, ρ, V });
	}

	private items(part: Item['part']): readonly Item[] {
		return this.solved.items.filter((item) => item.part === part);
	}
	private nothing(name: string): Ref {
		return this.chain.work('sum-losses', { symbol: 'Δp', name, unit: 'Pa' }, {});
	}

	fittingLoss(): Ref {
		const losses = (this.row.fittings ?? []).map((fitting, at) => {
			const item = this.items('fitting')[at];
			const count = fitting.count ?? 1;
			const name = `${item?.name ?? fitting.kind} (${at + 1}) in ${this.row.tag}`;
			const { kind, coefficient = 0 } = fitting;
			const C: Input =
				kind === 'fixed'
					? entered('Coefficient', coefficient)
					: this.chain.work(
							'coefficient',
							{ symbol: 'C', name: `Coefficient of ${name}`, unit: '' },
							{
								kind: entered('Fitting', kind),
								parameters: entered('Parameters', JSON.stringify(withMethod(fitting, this.ground.document.methods))),
								size: entered('Size', JSON.stringify(this.clearSize())),
								...{
									Re: this.reynolds(),
									V: this.velocity(),
									'ε/Dh': this.relativeRoughness(),
									f: this.frictionFactor()
								}
							},
							{
								source: item?.source ?? '',
								range: item?.catalogue?.rangeNote ?? null,
								expression: item?.catalogue?.method ?? ''
							}
						);
			return this.chain.work(
				'loss-of-coefficient',
				{ symbol: 'Δp', name: `Loss of ${name}`, unit: 'Pa' },
				{
					...{ C, n: entered('How many', count), pv: this.velocityPressure() }
				}
			);
		});
		return this.chain.work(
			'sum-losses',
			{ symbol: 'Δp', name: this.of('Loss of fittings'), unit: 'Pa' },
			numbered('Δp', losses)
		);
	}

	junctionLoss(): Ref {
		const result = { symbol: 'Δp', name: this.of('Loss of the junction'), unit: 'Pa' };
		const { junction, joins } = this.row;
		const [item] = this.items('junction');
		if (!junction || !item) return this.nothing(result.name);
		if (!item.reference || joins === null)
			return this.chain.work('loss-of-junction', result, {
				C: entered('Coefficient', item.coefficient ?? 0),
				pv: this.velocityPressure()
			});
		const common = this.other(joins);
		return this.chain.work('loss-of-junction', result, {
			C: this.junctionCoefficient(common, item),
			pv: common.nodeVelocityPressure()
		});
	}

	private junctionCoefficient(common: RowWorking, item: Item): Ref {
		const { row, ground } = this;
		const siblings = (ground.joining.get(common.row.tag) ?? []).map((tag) => this.other(tag));
		const legOf = (one: RowWorking) => one.row.junction?.leg ?? 'branch';
		const branches = siblings.filter((one) => legOf(one) === 'branch');
		const straight = siblings.find((one) => legOf(one) === 'straight');
		const massOf = (one: RowWorking) => (one.solved.flowEnds?.[0] ?? one.solved.flow) * one.solved.density;
		const whole = (common.solved.flowEnds?.[1] ?? common.solved.flow) * common.solved.density;
		const greatest = branches.reduce<RowWorking | null>(
			(most, one) => (most === null || massOf(one) >= massOf(most) ? one : most),
			null
		);
		const ratio = (name: string, part: number, of: number, unit: string) =>
			this.chain.work(
				'ratio',
				{ symbol: 'q', name: `${name} of ${row.tag}`, unit: '' },
				{
					part: entered(`${name}, this leg`, part, unit),
					whole: entered(`${name}, common leg`, of, unit)
				}
			);
		const q = ratio('Flow ratio', massOf(this), whole, 'kg/s');
		const a = ratio('Area ratio', this.area().value, common.area().value, 'm²');
		const isBranch = legOf(this) === 'branch';
		// Added in the order of the tree, as the engine does.
		const all = [...branches].reverse().reduce((sum, one) => sum + massOf(one), 0);
		return this.chain.work(
			'junction-coefficient',
			{ symbol: 'C', name: `Coefficient of the junction of ${row.tag}`, unit: '' },
			{
				kind: entered('Junction', row.junction?.kind ?? ''),
				parameters: entered(
					'Parameters',
					JSON.stringify(withMethod(row.junction ?? { kind: '' }, ground.document.methods))
				),
				direction: entered('Direction', row.side === 'supply' ? 'diverging' : 'converging'),
				leg: entered('This stream', legOf(this)),
				...{ q, a },
				qb: isBranch ? q : ratio('Flow ratio of the branches', all, whole, 'kg/s'),
				ab: isBranch
					? a
					: greatest
						? ratio('Area ratio of the branch', greatest.area().value, common.area().value, 'm²')
						: standing('Area ratio without a branch', 1),
				...(straight && {
					as: ratio('Area ratio of the straight leg', straight.area().value, common.area().value, 'm²')
				}),
				branches: entered('Branches at the node', branches.length),
				'common size': entered('Size of the common leg', JSON.stringify(common.clearSize())),
				size: entered('Size', JSON.stringify(this.clearSize()))
			},
			{ source: item.source ?? '', range: item.catalogue?.rangeNote ?? null, expression: item.catalogue?.method ?? '' }
		);
	}

	equipmentLoss(): Ref {
		const losses = (this.row.equipment ?? []).map((one, at) => this.lossOfEquipment(one, at));
		const result = { symbol: 'Δp', name: this.of('Loss of equipment'), unit: 'Pa' };
		return this.chain.work('sum-losses', result, numbered('Δp', losses));
	}

	private lossOfEquipment(one: Equipment, at: number): Ref {
		const result = { symbol: 'Δp', name: `Loss of ${one.name} (${at + 1}) in ${this.row.tag}`, unit: 'Pa' };
		const Q = this.flow();
		const atFlow = one.atFlow === undefined ? Q : entered('At the flow', one.atFlow, 'm³/s');
		const exponent = (standard: number) =>
			one.exponent === undefined ? standing('Exponent', standard) : entered('Exponent', one.exponent);
		if (one.points)
			return this.chain.work('points-loss', result, {
				points: entered('Points of the maker, m³/s and Pa', JSON.stringify(one.points)),
				Q
			});
		if (one.filter)
			return this.chain.work('filter-loss', result, {
				clean: entered('Loss when clean', one.filter.clean, 'Pa'),
				final: entered('Loss when it is changed', one.filter.final, 'Pa'),
				state: entered('State', one.filter.state),
				...{ Qᵣ: atFlow, Q, n: exponent(1) }
			});
		return this.chain.work('rated-loss', result, {
			Δpᵣ: entered('Loss as stated', one.loss ?? 0, 'Pa'),
			...{ Qᵣ: atFlow, Q, n: exponent(2) }
		});
	}

	outletLoss(): Ref {
		const result = { symbol: 'Δp', name: this.of('Loss of the outlet'), unit: 'Pa' };
		const { outlet } = this.row;
		if (!outlet) return this.nothing(result.name);
		if (outlet.loss === undefined) return this.chain.work('open-end', result, { pv: this.velocityPressure() });
		if (outlet.lossIs !== 'static')
			return this.chain.work('outlet-total', result, { Δp: entered('Total-pressure loss', outlet.loss, 'Pa') });
		return this.chain.work('outlet-static', result, {
			Δps: entered('Static-pressure loss', outlet.loss, 'Pa'),
			pv: this.velocityPressure()
		});
	}

	thermalGravity(): Ref {
		const result = { symbol: 'Δp', name: this.of('Thermal gravity'), unit: 'Pa' };
		const { rise = 0, side } = this.row;
		return this.chain.work('thermal-gravity', result, {
			ρₛ: this.surroundings(),
			ρ: this.density(),
			Δz: entered('Rise in the direction of flow', side === 'supply' ? rise : -rise, 'm')
		});
	}
	private surroundings(): Input {
		const { surroundings, air } = this.ground.document;
		if (surroundings === undefined) return this.designDensity(air, 'Density of the air');
		return this.designDensity(surroundings, 'Density of the surroundings');
	}
	private designDensity(air: DesignDocument['air'], name: string): Ref {
		const result = { symbol: 'ρ', name, unit: 'kg/m³' };
		if ('density' in air) return this.chain.work('given-density', result, { ρ: entered(name, air.density, 'kg/m³') });
		return this.chain.work('density', result, {
			t: entered('Temperature', air.temperature, '°C'),
			...(air.relativeHumidity !== undefined && { φ: entered('Relative humidity', air.relativeHumidity) }),
			...(air.elevation !== undefined && { z: entered('Elevation', air.elevation, 'm') }),
			...(air.pressure !== undefined && { p: entered('Pressure', air.pressure, 'Pa') })
		});
	}

	loss(): Ref {
		return this.chain.work(
			'row-loss',
			{ symbol: 'Δp', name: this.of('Loss'), unit: 'Pa' },
			{
				duct: this.frictionLoss(),
				flexible: this.flexibleLoss(),
				fittings: this.fittingLoss(),
				junction: this.junctionLoss(),
				equipment: this.equipmentLoss(),
				outlet: this.outletLoss(),
				gravity: this.thermalGravity()
			}
		);
	}
}

function numbered(symbol: string, refs: readonly Input[]): Record<string, Input> {
	return Object.fromEntries(refs.map((ref, at) => [`${symbol} ${at + 1}`, ref]));
}

/** Parameters with the method that the design has chosen, as the engine asks with. */
function withMethod<F extends { readonly kind: string; readonly method?: string | undefined }>(
	fitting: F,
	methods: DesignDocument['methods']
): F {
	const chosen = methods && Object.hasOwn(methods, fitting.kind) ? methods[fitting.kind] : undefined;
	return fitting.method === undefined && chosen !== undefined ? { ...fitting, method: chosen } : fitting;
}
