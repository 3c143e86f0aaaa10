import { describe, expect, it } from 'vitest';
import type { DesignDocument, DesignRow } from '$lib/engine';
import { reportOf } from './report';
import { inputOf } from './sample-input';

const round = (diameter: number) => ({ shape: 'round', diameter }) as const;
const row = (tag: string, side: DesignRow['side'], more: object = {}): DesignRow =>
	({ tag, joins: null, side, size: round(0.2), length: 3, outlet: { flow: 0.1, loss: 10 }, ...more }) as DesignRow;
const design = (rows: DesignRow[], more: Partial<DesignDocument> = {}): DesignDocument => ({
	...{ format: 'evendraft/design@1', air: { density: 1.2 }, rows },
	...more
});
const report = (...args: Parameters<typeof design>) => reportOf(inputOf(design(...args)));

describe('the report of an exhaust fan with a discharge duct', () => {
	const told = report([row('X1', 'exhaust'), row('X2', 'supply')]);

	it('cautions about combustion air', () =>
		expect(told.cautions.map(({ title }) => title)).toContain('Combustion air'));

	it('calls what leaves the fan its discharge, and lets it end outdoors', () => {
		expect(told.result.cells.map(({ label }) => label)).toContain('Index, discharge');
		expect(told.schedule.rows.find(({ tag }) => tag === 'X2')?.cells.map(({ text }) => text)).toContain('Discharge');
		expect(told.ledger.accounts.find(({ outlet }) => outlet === 'X2')?.lines.at(-1)?.name).toBe('Outdoors');
	});

	it('has neither where rooms are supplied through the same fan', () => {
		const both = report([row('R1', 'return'), row('X1', 'exhaust'), row('S1', 'supply')]);
		expect(both.cautions.map(({ title }) => title)).not.toContain('Combustion air');
		expect(both.result.cells.map(({ label }) => label)).toContain('Index, supply');
	});
});

describe('the parts of a section', () => {
	it('tell two elbows of different radius apart, and what the catalogue warns of', () => {
		const fittings = [
			{ kind: 'round-elbow-smooth', radiusRatio: 1 },
			{ kind: 'round-elbow-smooth', radiusRatio: 0.7, angle: 45 },
			{ kind: 'gradual-expansion', areaRatio: 0.5, angle: 20, leg: 'larger' }
		];
		const { parts, remarks } = report([row('S1', 'supply', { fittings })]);
		const names = parts[0]?.lines.map(({ name }) => name) ?? [];
		expect(names.filter((name) => /r\/D 1, 90°/.test(name))).toHaveLength(1);
		expect(names.filter((name) => /r\/D 0\.7, 45°/.test(name))).toHaveLength(1);
		expect(names.some((name) => name.endsWith('20°, the row is the larger leg'))).toBe(true);
		const remark = parts[0]?.lines.at(3)?.remarks[0];
		expect(remarks.find(({ number }) => number === remark)?.text).toMatch(/length/);
	});

	it('show which losses are a person’s own', () => {
		const equipment = [
			{ name: 'Coil', loss: 20 },
			{ name: 'Filter', loss: 30, atFlow: 0.2 }
		];
		const { parts } = report([row('S1', 'supply', { equipment })]);
		expect(parts[0]?.lines.map(({ part, lossKind }) => [part, lossKind])).toEqual([
			['Duct', 'computed'],
			['Equipment', 'entered'],
			['Equipment', 'computed'],
			['Outlet', 'entered']
		]);
	});

	it('give the hydraulics from which friction was computed', () =>
		expect(report([row('S1', 'supply')]).parts[0]?.lines[0]?.name).toMatch(/^Dh 200 mm, Re 42.?\d00, f 0\.02\d\d$/));
});

describe('the basis of design', () => {
	const basis = (more: Partial<DesignDocument>) =>
		Object.fromEntries(report([row('S1', 'supply')], more).basis.map(({ label, value }) => [label, value]));

	it('names the class of service, or says that nobody has', () => {
		expect(basis({})['Service']).toBe('not named; taken as general');
		expect(basis({ service: 'kitchen-grease' })['Service']).toBe('Kitchen grease exhaust');
	});

	it('names the authors that were chosen in place of the catalogue’s own, and the density of standard flows', () => {
		expect(basis({})).not.toHaveProperty('Methods');
		const bend = { ...row('S1', 'supply'), fittings: [{ kind: 'round-elbow-smooth' }] };
		const chosen = report([bend], { methods: { 'round-elbow-smooth': 'rennels' }, flowBasis: 'standard' }).basis;
		const words = Object.fromEntries(chosen.map(({ label, value }) => [label, value]));
		expect(words['Methods']).toBe('round elbow, smooth radius by Rennels; others by the catalogue’s own');
		expect(words['Flows']).toBe('of outlets as air of 1.20 kg/m³; others actual');
	});

	it('says by how much flexible duct is compressed', () => {
		const flexible = (more: object) => [{ ...row('S1', 'supply'), flexible: { length: 1, ...more } }];
		const words = (more: object) =>
			report(flexible(more), {}).basis.find(({ label }) => label === 'Flexible duct')?.value;
		expect(words({ compression: 0.15 })).toBe('compressed by 15 %, on the rate of stretched duct');
		expect(words({ compression: 0.15, factor: 6 })).toBe('6 × the rigid rate');
		expect(words({})).toContain('the program’s default');
	});

	it('says where the viscosity is assumed', () => expect(basis({})['Viscosity']).toMatch(/of air at 20 °C/));
});

describe('the criteria', () => {
	const criteria = { mainVelocity: 6, aspectRatio: 4, damperAtOutlet: true };

	it('are not said to be met where nothing was to be tested', () =>
		expect(report([row('S1', 'supply')], { criteria }).criteria.map(({ verdict }) => verdict)).toEqual([
			'not applicable',
			'not applicable',
			'not applicable'
		]));

	it('count dampers where one is needed', () => {
		const damped = { fittings: [{ kind: 'fixed', coefficient: 0.2, name: 'Volume damper' }] };
		const rows = [row('S1', 'supply', damped), row('S2', 'supply'), row('O1', 'outdoor')];
		expect(report(rows, { criteria: { damperAtOutlet: true } }).criteria).toMatchObject([
			{ found: '1 of 2', verdict: 'not met' }
		]);
	});
});
