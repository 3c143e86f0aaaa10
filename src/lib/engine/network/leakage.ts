import { leakageClassOf } from '../document/leakage-class-of';
import type { DesignDocument, DesignRow, LeakageSum, Problem, RowSize } from '../document/types';
import { allowableLeakage, leakageFlow, type Tightness } from '../leakage';
import { sectionOf } from '../shape';
import type { Network } from './network';
import { nextGuess, type Trial } from './next-guess';
import { outsideProblem, workPass, type Pass, type PassGround } from './pass';
import type { RowLoss } from './row-loss';

/** Rounds in which flows and pressures are worked in turn; a usual system settles in some ten, the oddest in some seventy. */
const MOST_ROUNDS = 300;
/** From this round on only half of each change is taken: leakage that swings to and fro comes to rest. */
const HALVED_FROM = 30;
/** Change of the leakage, of the fan's flow, below which it is settled. */
const SETTLED = 1e-13;

/** A row from which air leaks. */
interface Leaking {
	readonly place: number;
	readonly tightness: Tightness;
	/** Surface of the duct [m2]. */
	readonly surface: number;
}

/** A pass whose leakage suits its pressures. */
export interface Settled {
	readonly pass: Pass;
	/** Of each row [m3/s]; null without leakage. */
	readonly leaks: Float64Array | null;
	readonly sum: LeakageSum | null;
	readonly isSettled: boolean;
}

/**
 * Works flows and leakage in turn until they suit each other: the leakage of a row goes with the mean static pressure in
 * it, and the flows with the leakage.
 *
 *   q = c A |ps|^0.65, ps = (pt1 + pt2)/2 - pv, A = P (L + L_flexible)
 *   pt1 and pt2 inside the duct: behind the loss of its junction and before that of its outlet
 *
 * @param ground rows, air and settings
 * @param document leakage classes of the design and of its rows; surfaces in [m2], pressures in [Pa]
 * @returns the last round with its leakage [m3/s], or what is wrong with the rows
 * @source Law of the leakage classes, EN 1507 and EN 12237; iterated by substitution, sped by Irons and Tuck (1969)
 * @check fixtures/published/leakage.json
 */
export function settle(ground: PassGround, document: DesignDocument): Settled | readonly Problem[] {
	const leaking = leakingRows(ground.network, document);
	if (leaking.length === 0) {
		const pass = workPass(ground, null);
		return isProblems(pass) ? pass : { pass, leaks: null, sum: null, isSettled: true };
	}
	const places = leaking.map(({ place }) => place);
	let leaks: Float64Array = new Float64Array(ground.network.rows.length);
	let before: Trial | null = null;
	for (let rounds = 1; ; rounds += 1) {
		const pass = workPass(ground, leaks);
		if (isProblems(pass)) return pass;
		const next = new Float64Array(leaks.length);
		for (const { place, tightness, surface } of leaking) {
			const row = pass.rowLosses[place];
			try {
				next[place] = row ? leakageFlow(tightness, surface, ductPressure(row)) : 0;
			} catch (error) {
				return [outsideProblem(error, ['rows', place, 'leakage'])];
			}
		}
		const through = pass.flows.fanEnd.reduce((most, flow) => Math.max(most, flow), 0);
		const change = next.reduce((most, leak, at) => Math.max(most, Math.abs(leak - (leaks[at] ?? 0))), 0);
		const isSettled = change <= SETTLED * through;
		if (isSettled || rounds === MOST_ROUNDS)
			return { pass, leaks, sum: sumOf(leaks, leaking, document, rounds), isSettled };
		const last: Trial = { guess: leaks, found: next };
		leaks = rounds < HALVED_FROM ? nextGuess(places, last, before) : halved(last);
		before = last;
	}
}

const halved = ({ guess, found }: Trial): Float64Array => found.map((leak, at) => (leak + (guess[at] ?? 0)) / 2);

/** Mean static pressure inside the duct [Pa]: the loss of an outlet is still before the air, that of a junction behind it. */
export function ductPressure({
	side,
	totalPressure: [near, far],
	junctionLoss,
	outletLoss,
	velocityPressure
}: RowLoss) {
	const inner = side === 'supply' ? outletLoss - junctionLoss : junctionLoss - outletLoss;
	return (near + far + inner) / 2 - velocityPressure;
}

const isProblems = (found: Pass | readonly Problem[]): found is readonly Problem[] => Array.isArray(found);

/** In the order of the tree, so that sums run alike for any order of rows. */
function leakingRows({ order }: Network, document: DesignDocument): readonly Leaking[] {
	if (document.leakage === undefined && document.rows.every((row) => row.leakage === undefined)) return [];
	return [...order].flatMap((place) => {
		const row = document.rows[place];
		const named = row?.leakage ?? document.leakage;
		if (!row || !named) return [];
		const tightness = named.cl !== undefined ? { CL: named.cl } : leakageClassOf(named.class ?? '');
		if (!tightness) return [];
		const surface = sectionOf(metalSize(row)).perimeter * (row.length + (row.flexible?.length ?? 0));
		return [{ place, tightness, surface }];
	});
}

/** A liner lies inside the metal, and it is the metal that leaks. */
function metalSize({ size, lining }: DesignRow): RowSize {
	if (lining === undefined || lining.sizeIs === 'metal') return size;
	const both = 2 * lining.thickness;
	if (size.shape === 'round') return { ...size, diameter: size.diameter + both };
	return { ...size, width: size.width + both, height: size.height + both };
}

/** The fan's flow is put in by `solveDesign`, which knows both sides. */
function sumOf(leaks: Float64Array, leaking: readonly Leaking[], document: DesignDocument, rounds: number): LeakageSum {
	const testPressure = document.leakage?.testPressure ?? null;
	return {
		flow: leaking.reduce((sum, { place }) => sum + (leaks[place] ?? 0), 0),
		share: 0,
		surface: leaking.reduce((sum, one) => sum + one.surface, 0),
		allowable:
			testPressure === null
				? null
				: leaking.reduce((sum, one) => sum + allowableLeakage(one.tightness, one.surface, testPressure), 0),
		testPressure,
		rounds
	};
}
