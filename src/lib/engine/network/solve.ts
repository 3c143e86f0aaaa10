import type { DesignDocument, DesignRow, Problem, Solution, SolvedRow, SolveResult } from '../document/types';
import { locate } from '../document/fault';
import { ENGINE_VERSION } from '../version';
import { fanDuty, totalsOf } from './fan-duty';
import { flagsOf } from './flags';
import { ductPressure, settle } from './leakage';
import { massBalanceOf } from './mass-balance';
import { buildNetwork, type Network } from './network';
import { outsideProblem } from './pass';
import { isUniform, rowAirs, type RowAir } from './row-airs';
import type { RowLoss } from './row-loss';
import { settingsOf, type Settings } from './settings';

/**
 * Total pressure of every stream at the design flows, and what the fan must give.
 * Reads its argument and writes nothing. Every number of a solution is finite.
 *
 * @param document a design document that validates, SI units
 * @returns the solution, or all problems: rows that form no trees, formulas asked outside their range
 */
export function solveDesign(document: DesignDocument): SolveResult {
	const built = buildNetwork(document);
	if (!built.ok) return built;
	const { network } = built;
	const settings = settingsOrProblem(document);
	if ('code' in settings) return { ok: false, problems: [settings] };
	const airs = airsOrProblem(network, document, settings);
	if ('code' in airs) return { ok: false, problems: locate([airs], document) };
	const uniform = isUniform(airs);

	const settled = settle({ network, settings, airs, uniform }, document);
	if (!('pass' in settled)) return { ok: false, problems: locate([...settled], document) };
	const { pass, leaks, isSettled } = settled;
	const { flows, masses, rowLosses, notes } = pass;
	const { paths, required, index } = pass.paths;
	if (leaks)
		rowLosses.forEach((row, place) => {
			row.leakage = leaks[place] ?? 0;
			row.flowEnds = [flows.fanEnd[place] ?? 0, flows.farEnd[place] ?? 0];
			row.leakagePressure = ductPressure(row);
		});

	const totals = totalsOf(network, flows.fanEnd);
	// By mass where the densities differ; by volume, with not a bit of difference, where they do not.
	const balance = uniform ? totals : totalsOf(network, masses.leg);
	const fan = fanDuty(network, rowLosses, required, totals);
	const leakage = settled.sum && { ...settled.sum, share: settled.sum.flow / fan.flow };
	const flags = flagsOf(document, network, {
		...{ losses: rowLosses, notes, totals: balance, duty: fan.totalPressure },
		...{ density: settings.air.density, airs, isSettled }
	});
	return {
		ok: true,
		solution: {
			format: 'evendraft/solution@1',
			engineVersion: ENGINE_VERSION,
			mode: 'design',
			air: { density: settings.air.density, viscosity: settings.air.viscosity },
			rows: byTag(network.rows, rowLosses),
			paths,
			index,
			fan,
			totals,
			massBalance: massBalanceOf(network, masses, leaks, airs),
			leakage,
			flags
		}
	};
}

function settingsOrProblem(document: DesignDocument): Settings | Problem {
	try {
		return settingsOf(document);
	} catch (error) {
		return outsideProblem(error, ['air']);
	}
}

function airsOrProblem(network: Network, document: DesignDocument, settings: Settings): readonly RowAir[] | Problem {
	try {
		return rowAirs(network, document, settings.air);
	} catch (error) {
		return outsideProblem(error, ['rows']);
	}
}

/** Rows by their tags, `__proto__` being a tag like any other. */
function byTag(rows: readonly DesignRow[], rowLosses: readonly RowLoss[]): Solution['rows'] {
	const result: Record<string, SolvedRow> = {};
	rowLosses.forEach((value, place) => {
		const tag = rows[place]?.tag ?? '';
		if (tag !== '__proto__') result[tag] = value;
		else Object.defineProperty(result, tag, { value, enumerable: true, configurable: true, writable: true });
	});
	return result;
}
