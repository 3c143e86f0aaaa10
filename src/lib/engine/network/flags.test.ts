import { describe, expect, it } from 'vitest';
import { solutionOf } from '../../../../tests/engine/any-design';
import type { Flag } from '../document/types';

type Json = Record<string, unknown>;

const main: Json = { tag: 'M', joins: null, side: 'supply', size: { shape: 'round', diameter: 0.3 }, length: 10 };
const end: Json = {
	tag: 'E',
	joins: 'M',
	side: 'supply',
	size: { shape: 'round', diameter: 0.2 },
	length: 5,
	junction: { kind: 'fixed', coefficient: 0.2 },
	outlet: { flow: 0.1, loss: 20 }
};

const FILTER = { clean: 40, final: 120, state: 'mean' };

function flagsOf(keysOfMain: Json, keysOfEnd: Json = {}, keys: Json = {}, others: Json[] = []): readonly Flag[] {
	const rows = [{ ...main, ...keysOfMain }, { ...end, ...keysOfEnd }, ...others];
	return solutionOf({ format: 'evendraft/design@1', air: { density: 1.2 }, ...keys, rows }).flags;
}

const brief = (flags: readonly Flag[]) => flags.map((flag) => `${flag.rule} ${flag.row}`);

describe('flags', () => {
	it('are none for a sound small design', () => expect(flagsOf({})).toEqual([]));

	// Velocities: M 1.415 m/s, E 3.183 m/s.
	it.each<[string, Json, Json, Json]>([
		// 0.003 m³/s: in M of 0.05 m 1.528 m/s and Re 5 060, in E of 0.1 m 0.382 m/s and Re 2 530.
		[
			'reynolds-transition E',
			{ size: { shape: 'round', diameter: 0.05 } },
			{ size: { shape: 'round', diameter: 0.1 }, outlet: { flow: 0.003 } },
			{}
		],
		// 24x12 typed in a metric design, 0.1 m³/s: 347 m/s.
		['velocity-plausible E', {}, { size: { shape: 'rectangular', width: 0.024, height: 0.012 } }, {}],
		// 0.1 m³/s in 1.2 m²: 0.083 m/s.
		['velocity-plausible M', { size: { shape: 'rectangular', width: 1.2, height: 1 } }, {}, {}],
		// 0.1 m³/s in Ø 70 mm: 26 m/s; f about 0.024 gives 139 Pa/m.
		['friction-rate-plausible E', {}, { size: { shape: 'round', diameter: 0.07 } }, {}],
		['no-junction-loss E', {}, { junction: undefined }, {}],
		['velocity-main M', {}, {}, { criteria: { mainVelocity: 1.4 } }],
		['velocity-run-out E', {}, {}, { criteria: { runOutVelocity: 3.1 } }],
		['friction-rate E', {}, {}, { criteria: { frictionRate: 0.3 } }],
		['flexible-length E', {}, { flexible: { length: 2, factor: 3 } }, { criteria: { flexibleLength: 1.5 } }],
		['aspect-ratio M', { size: { shape: 'rectangular', width: 0.9, height: 0.2 } }, {}, {}],
		['aspect-ratio M', { size: { shape: 'oval', width: 0.2, height: 0.5 } }, {}, { criteria: { aspectRatio: 2 } }],
		['coefficient-range E', {}, { roughness: 0.02 }, {}],
		['coefficient-range M', { fittings: [{ kind: 'rectangular-elbow-smooth' }] }, {}, {}],
		['to-be-confirmed M', { equipment: [{ name: 'Coil', loss: 5, toBeConfirmed: true }] }, {}, {}],
		['service-caution null', {}, {}, { service: 'kitchen-grease' }],
		['service-caution E', {}, { serves: 'Kitchen hood' }, {}],
		['fire-damper-caution M', { equipment: [{ name: 'Fire damper FD-01', loss: 6 }] }, {}, {}],
		['negative-loss M', { length: 0, fittings: [{ kind: 'fixed', coefficient: -0.4 }] }, {}, {}],
		['rise-exceeds-length M', { rise: -11 }, {}, {}],
		['flexible-default E', {}, { flexible: { length: 2 } }, {}],
		['damper-open-assumed E', {}, { fittings: [{ kind: 'damper-butterfly' }] }, {}],
		['damper-open-assumed E', {}, { fittings: [{ kind: 'damper-gate' }] }, {}],
		['fire-damper-caution M', { fittings: [{ kind: 'damper-fire-curtain' }] }, {}, {}],
		['to-be-confirmed E', {}, { junction: { kind: 'fixed', coefficient: 0.2, toBeConfirmed: true } }, {}],
		['to-be-confirmed E', {}, { outlet: { flow: 0.1, loss: 20, toBeConfirmed: true } }, {}],
		['key-not-read E', {}, { junction: { kind: 'fixed', coefficient: 0.2, angle: 45 } }, {}],
		['key-not-read M', { equipment: [{ name: 'Filter', filter: { ...FILTER, colour: 'G4' } }] }, {}, {}],
		['key-not-read M', { leakage: { cl: 0, testPressure: 500 } }, {}, {}],
		['junction-at-fan M', { junction: { kind: 'tee', leg: 'branch' } }, {}, {}],
		['end-counted-twice E', {}, { fittings: [{ kind: 'exit-plain' }] }, {}],
		['end-counted-twice E', {}, { fittings: [{ kind: 'entry-flush' }], outlet: { flow: 0.1 } }, {}],
		['negative-duty null', {}, { outlet: { flow: 0.1, loss: 0, pressure: -80 } }, {}],
		['losses-as-entered null', {}, {}, { air: { density: 1 } }],
		['service-caution null', {}, {}, { title: 'Kitchen extract EF-2' }],
		['service-caution E', {}, { serves: 'Labs 1 to 4' }, {}],
		['service-caution E', {}, { serves: 'Isolation room' }, {}],
		['service-caution M', { equipment: [{ name: 'Grease filter', loss: 40 }] }, {}, {}],
		['fire-damper-caution M', { equipment: [{ name: 'FSD-2', loss: 6 }] }, {}, {}],
		['fire-damper-caution M', { equipment: [{ name: 'FD01', loss: 6 }] }, {}, {}],
		['key-not-read M', { lenght: 3 }, {}, {}],
		['key-not-read null', {}, {}, { air: { density: 1.2, temperature: 20 } }]
	])('%s', (expected, keysOfMain, keysOfEnd, keys) => {
		expect(brief(flagsOf(keysOfMain, keysOfEnd, keys))).toEqual([expected]);
	});

	it('read every parameter of a junction of the catalogue', () =>
		expect(brief(flagsOf({}, { junction: { kind: 'wye', leg: 'branch', angle: 45 } }))).not.toContain(
			'key-not-read E'
		));

	it('do not take a fire damper of the catalogue for one that balances, nor for one that stands at a setting', () => {
		const fire = { fittings: [{ kind: 'damper-fire-curtain' }] };
		const other: Json = { ...end, tag: 'F', fittings: [{ kind: 'damper-butterfly', angle: 10 }] };
		expect(brief(flagsOf({}, fire, { criteria: { damperAtOutlet: true } }, [other]))).toEqual([
			'fire-damper-caution E',
			'damper-missing E'
		]);
	});

	it('do not say that an end is counted twice where the outlet loses nothing', () =>
		expect(flagsOf({}, { fittings: [{ kind: 'exit-plain' }], outlet: { flow: 0.1, loss: 0 } })).toEqual([]));

	it('leave a fast duct to the limits of the design where it has them', () => {
		const fast = { size: { shape: 'round', diameter: 0.05 } };
		expect(brief(flagsOf({}, fast, { criteria: { runOutVelocity: 60 } }))).toEqual([]);
		expect(brief(flagsOf({}, fast, { criteria: { runOutVelocity: 40 } }))).toEqual(['velocity-run-out E']);
		expect(brief(flagsOf({}, fast, { criteria: { mainVelocity: 60 } }))).toEqual(['velocity-plausible E']);
	});

	it('say of an odd velocity that it is judged by common practice', () => {
		const [flag] = flagsOf({}, { size: { shape: 'round', diameter: 0.05 } });
		expect(flag).toMatchObject({ severity: 'caution', threshold: 30, message: expect.stringMatching(/right unit\?/) });
		expect(flag?.basis).toContain('common practice');
		expect(flag?.value).toBeCloseTo(0.1 / (Math.PI * 0.025 ** 2), 9);
	});

	it('carry the value and its threshold', () => {
		const [flag] = flagsOf({}, {}, { criteria: { runOutVelocity: 3.1 } });
		expect(flag?.value).toBeCloseTo(0.1 / (0.01 * Math.PI), 9);
		expect(flag).toMatchObject({ threshold: 3.1, severity: 'caution', basis: 'criteria of the design' });
	});

	it.each([
		['a butterfly damper of the catalogue', { fittings: [{ kind: 'damper-butterfly', angle: 10 }] }],
		['a damper by its name', { fittings: [{ kind: 'fixed', coefficient: 0.2, name: 'VCD open' }] }],
		['a damper among the equipment', { equipment: [{ name: 'Volume damper', loss: 4 }] }]
	])('take %s for the damper of a run-out', (_name, keys) =>
		expect(brief(flagsOf({}, keys, { criteria: { damperAtOutlet: true } }))).toEqual([])
	);

	const damped: Json = { ...end, tag: 'F', fittings: [{ kind: 'damper-butterfly', angle: 10 }] };
	const dampers = { criteria: { damperAtOutlet: true } };

	it('ask for a damper at an outlet that another is balanced against', () =>
		expect(brief(flagsOf({}, {}, dampers, [damped]))).toEqual(['damper-missing E']));

	it('ask for none where the side has no other outlet', () => expect(flagsOf({}, {}, dampers)).toEqual([]));

	it.each(['Fire damper', 'Backdraught damper'])('do not take a %s for one that balances', (name) => {
		const closer = { equipment: [{ name, loss: 4 }] };
		expect(brief(flagsOf({}, closer, dampers, [damped]))).toContain('damper-missing E');
	});

	it('leave out the hint of a kitchen once the service is named', () =>
		expect(flagsOf({}, { serves: 'Kitchen hood' }, { service: 'general' })).toEqual([]));

	it('tell when the two sides of the fan differ by more than 0.5 %', () => {
		const inlet = (flow: number) => ({ ...main, tag: 'R', side: 'return', outlet: { flow, loss: 10 } });
		const flagsAt = (flow: number) =>
			solutionOf({ format: 'evendraft/design@1', air: { density: 1.2 }, rows: [main, end, inlet(flow)] }).flags;
		expect(brief(flagsAt(0.1004))).toEqual([]);
		expect(brief(flagsAt(0.101))).toEqual(['fan-flows-differ null']);
	});

	it('tell that a static loss at an inlet is taken like one at an outlet', () => {
		const inlet = { ...main, tag: 'R', side: 'exhaust', outlet: { flow: 0.1, loss: 10, lossIs: 'static' } };
		const { flags } = solutionOf({ format: 'evendraft/design@1', air: { density: 1.2 }, rows: [inlet] });
		expect(brief(flags)).toEqual(['static-loss-at-inlet R']);
	});
});
