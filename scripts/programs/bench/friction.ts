import { performance } from 'node:perf_hooks';
import { frictionFactor, type FrictionSpec } from '../../../src/lib/engine/friction';

const POINTS = 4_096;
const TURNS = 50;
const WARM_UP = 20;
const READINGS = 41;

/** Evenly spread fractions that repeat nothing (multiples of the golden section). */
const spread = (i: number, seed: number): number => (i * 0.6180339887498949 + seed * 0.7548776662466927) % 1;

function points(fromRe: number, toRe: number): FrictionSpec[] {
	return Array.from({ length: POINTS }, (_, i) => ({
		reynolds: fromRe * (toRe / fromRe) ** spread(i, 0),
		relativeRoughness: 1e-7 * (0.05 / 1e-7) ** spread(i * i, 1)
	}));
}

/** All points once; the sum keeps the work from being left out. */
function sumOf(specs: readonly FrictionSpec[]): number {
	let sum = 0;
	for (const spec of specs) sum += frictionFactor(spec);
	return sum;
}

function factorsPerSecond(specs: readonly FrictionSpec[]) {
	for (let i = 0; i < WARM_UP * TURNS; i += 1) sumOf(specs);
	const seconds = Array.from({ length: READINGS }, () => {
		const start = performance.now();
		let sum = 0;
		for (let turn = 0; turn < TURNS; turn += 1) sum += sumOf(specs);
		if (!(sum > 0)) throw new Error('the friction factors of the benchmark are not positive');
		return (performance.now() - start) / 1000;
	}).sort((a, b) => a - b);
	const rate = (time: number): number => Math.round((TURNS * specs.length) / time);
	return { median: rate(seconds[Math.floor(READINGS / 2)] ?? 0), best: rate(seconds[0] ?? 0) };
}

/** Exact friction factors a second on one core, each by a call of its own, as the network makes them. */
export function benchFriction() {
	return {
		factorsPerSecond: {
			turbulent: factorsPerSecond(points(4_001, 1e8)),
			transition: factorsPerSecond(points(2_000, 4_000)),
			everyRegime: factorsPerSecond(points(100, 1e8))
		}
	};
}
