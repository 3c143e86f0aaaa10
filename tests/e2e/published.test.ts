import { beforeAll, describe, expect, it } from 'vitest';
import type { FirmScope } from '../../src/lib/server/auth/scope';
import { emptyDesign, firm } from '../server/support/designs';
import { worked, type Published } from './support/fixtures';
import { figureOf, RunSheet } from './support/run-sheet';
import { useStage } from './support/stage';

const stage = useStage();
const EMAIL = 'engineer@example.test';
let ours: FirmScope;
beforeAll(async () => {
	ours = await firm(EMAIL);
});

type Units = 'SI' | 'IP';

/**
 * A worked system as a person enters it: the density on the basis of design, the rows pasted. Systems that give a
 * roughness, a viscosity or a density of the surroundings which the sheet has no cell for go through the command line.
 */
interface Entered {
	readonly fixture: string;
	readonly units: Units;
	readonly density: string;
	/** Tag, joins, side, serves, flow, size, length, flexible, material, parts, outlet. */
	readonly rows: readonly (readonly string[])[];
	/** Outlets in the order in which the source names its paths. */
	readonly outlets: readonly string[];
	/** Figures that the screen shows; at least so many are compared. */
	readonly compared: number;
}

const SHORT = 'Galvanised steel, 0.75 m joints';
const hood = (flow: string) => [
	[
		'duct',
		'',
		'exhaust',
		'hood',
		flow,
		'Ø230',
		'13.4',
		'',
		SHORT,
		'entry C1.3, 5x elbow C0.21, damper C1.8, exit C1.05',
		'0'
	]
];

const SYSTEMS: readonly Entered[] = [
	{
		fixture: 'three-terminals',
		units: 'SI',
		density: '1.204',
		rows: [
			['CF', 'BC', '', 'F', '250', 'Ø250', '9', '', '', 'branch C0.41484375, elbow C0.22', '25'],
			['CE', 'BC', '', 'E', '350', 'Ø315', '8', '', '', 'straight way C0.078483502, reducer C0.05, elbow C0.15', '25'],
			['BD', 'AB', '', 'D', '400', 'Ø315', '6', '', '', 'branch C0.4417721, elbow C0.22', '30'],
			['BC', 'AB', '', '', '', 'Ø400', '10', '', '', 'straight way C0.072817778, reducer C0.05', ''],
			['AB', '', '', '', '', 'Ø500', '12', '', '', 'elbow C0.35', '']
		],
		outlets: ['BD', 'CE', 'CF'],
		compared: 17
	},
	{
		fixture: 'plenum-two-paths',
		units: 'IP',
		density: '1.2065273 kg/m3',
		rows: [
			['1-a', '', '', '', '', '10"', '0', '', '', 'entry C0.85, device 0.045 in.wg', ''],
			['a-2', '1-a', '', '', '280 cfm', '9"', '0', '', '', 'device 0.002 in.wg, device 0.04 in.wg', '0'],
			[
				'a-3',
				'1-a',
				'',
				'',
				'120 cfm',
				'6"',
				'0',
				'',
				'',
				'branch C0.6912, elbow C0.37, elbow C0.37, device 0.048 in.wg',
				'0'
			]
		],
		outlets: ['a-2', 'a-3'],
		compared: 9
	},
	{
		fixture: 'blower-both-sides',
		units: 'SI',
		density: '1.2',
		rows: [
			[
				'inlet',
				'',
				'outdoor',
				'',
				'0.8 m3/s',
				'Ø300',
				'0',
				'',
				'',
				'entry C4, elbow C1.066666667, transition C0.64',
				'0'
			],
			['discharge', '', 'supply', '', '0.8 m3/s', '400x200', '0', '', '', 'exit C10, elbow C3.6', '0']
		],
		outlets: [],
		compared: 3
	},
	{ fixture: 'hood-exhaust', units: 'SI', density: '1.184', rows: hood('650 cfm'), outlets: [], compared: 1 },
	{ fixture: 'hood-exhaust-600', units: 'SI', density: '1.184', rows: hood('600 cfm'), outlets: [], compared: 2 },
	{
		fixture: 'straight-duct-si',
		units: 'SI',
		density: '1.204',
		// Not the one of 1.42 m3/s, whose roughness is that of no material in the list.
		rows: (
			[
				['0.03', '125', ''],
				['0.1', '200', ''],
				['0.2', '250', ''],
				['0.5', '355', ''],
				['1.0', '500', ''],
				['2.0', '630', SHORT],
				['8.0', '1000', 'Plastic (PVC)']
			] as const
		).map(([flow, size, material]) => [
			`${flow} m3/s`,
			'',
			'',
			'',
			`${flow} m3/s`,
			`Ø${size}`,
			'1',
			'',
			material,
			'',
			'0'
		]),
		outlets: [],
		compared: 14
	}
];

/** Half of the last place that the screen shows, SI. */
const HALF_STEP = {
	SI: { velocity: 0.005, pressure: 0.05, rate: 0.005 },
	IP: { velocity: 0.5 * 0.00508, pressure: 0.0005 * 249.08891, rate: 0.0005 * 8.1722 }
};
const SI_OF = {
	SI: { velocity: 1, pressure: 1, rate: 1 },
	IP: { velocity: 0.00508, pressure: 249.08891, rate: 8.1722 }
};
type Measure = keyof (typeof HALF_STEP)['SI'];

const CELLS: Readonly<Record<string, readonly [key: string, measure: Measure]>> = {
	velocity: ['velocity', 'velocity'],
	frictionLoss: ['duct', 'pressure'],
	frictionRate: ['rate', 'rate'],
	loss: ['total', 'pressure']
};

/** The figure on the screen that a published one speaks of; null where the screen shows none. */
async function onScreen(
	sheet: RunSheet,
	{ of }: Published,
	{ outlets }: Entered
): Promise<{ text: string; measure: Measure } | null> {
	const [what, which, name = ''] = of;
	if (what === 'rows') {
		const [key, measure] = CELLS[String(name)] ?? [];
		if (!key || !measure || of.length > 3 || !(await sheet.row(String(which)).count())) return null;
		return { text: await sheet.text(String(which), key), measure };
	}
	if (what === 'paths') {
		const cells = sheet.page
			.getByRole('row')
			.filter({ has: sheet.page.getByRole('button', { name: outlets[Number(which)] ?? '', exact: true }) })
			.getByRole('cell');
		const text = (await cells.nth(name === 'loss' ? 1 : 2).innerText()).trim();
		return { text: text === 'index' ? '0' : text, measure: 'pressure' };
	}
	if (which === 'totalPressure')
		return { text: (await sheet.duty.locator('b').first().innerText()).trim(), measure: 'pressure' };
	return null;
}

describe('a worked system that is entered through the screen', () => {
	it.each(SYSTEMS.map((system) => ({ ...system, source: worked(system.fixture).source })))(
		'$fixture agrees with its source within the stated tolerance: $source',
		async (system) => {
			const designId = await emptyDesign(ours, system.fixture);
			const page = await stage.pageOf(EMAIL);
			await page.goto(`/designs/${designId}/basis`);
			await page.waitForLoadState('networkidle');
			await page
				.getByLabel('Density, if given')
				.fill(system.density.includes(' ') ? system.density : `${system.density} kg/m3`);
			await page.getByRole('button', { name: 'Save the basis' }).click();
			await page.getByText('Saved', { exact: true }).waitFor();

			const sheet = new RunSheet(page);
			await sheet.open(designId);
			await page.getByText('Columns', { exact: true }).click();
			await page.getByLabel('Material').check();
			await page.getByText('Columns', { exact: true }).click();
			if (system.units === 'IP') await page.getByRole('button', { name: 'IP', exact: true }).click();
			await sheet.grid.focus();
			await page.keyboard.press('Control+Home');
			await sheet.paste(system.rows.map((row) => row.join('\t')).join('\n'));
			await sheet.saved();
			expect(await page.getByRole('button', { name: /to mend$/ }).count()).toBe(0);

			let compared = 0;
			for (const figure of worked(system.fixture).published) {
				const shown = await onScreen(sheet, figure, system);
				if (!shown) continue;
				const value = figureOf(shown.text) * SI_OF[system.units][shown.measure];
				const { relative = 0, absolute = 0 } = figure.tolerance;
				const printed = figure.printed * figure.si_per_unit;
				const tolerance = Math.max(absolute * figure.si_per_unit, relative * Math.abs(printed));
				const allowed = tolerance + HALF_STEP[system.units][shown.measure] + 1e-9;
				const words = `${figure.of.join(' ')}: the screen shows ${shown.text}, the source has ${figure.printed} ${figure.unit}`;
				expect(Math.abs(value - printed), words).toBeLessThanOrEqual(allowed);
				compared += 1;
			}
			expect(compared).toBe(system.compared);
		}
	);
});
