import { performance } from 'node:perf_hooks';
import { solveDesign, validateDocument } from '$lib/engine';
import { building } from '../../tests/bench/building';
import { benchFriction } from './bench/friction';

const COUNTS = [500, 1_000, 10_000] as const;
const WARM_UP_ROWS = 40_000;
const RUNS = 15;

interface Timing {
	readonly rows: number;
	readonly total_ms: number;
	readonly perRow_us: number;
	readonly validate_ms: number;
}

/**
 * Median times of solving and of validating, in one process after a warm-up, the sizes taken in turn; and how many
 * friction factors a second.
 */
export function bench() {
	const documents = COUNTS.map((rows) => building(rows));
	for (const document of documents)
		for (let done = 0; done < WARM_UP_ROWS; done += document.rows.length) {
			solved(document);
			validated(document);
		}
	const solving = documents.map((): number[] => []);
	const validating = documents.map((): number[] => []);
	for (let run = 0; run < RUNS; run += 1)
		documents.forEach((document, i) => {
			// Small documents several times in one reading, so that all readings are of about the same length.
			const times = Math.max(1, Math.round(10_000 / document.rows.length));
			solving[i]?.push(timeOf(() => solved(document), times));
			validating[i]?.push(timeOf(() => validated(document), times));
		});
	const timings = COUNTS.map((rows, i): Timing => {
		const total_ms = median(solving[i] ?? []);
		const perRow_us = (total_ms * 1000) / rows;
		return {
			rows,
			total_ms: rounded(total_ms),
			perRow_us: rounded(perRow_us),
			validate_ms: rounded(median(validating[i] ?? []))
		};
	});
	const [, thousand, tenThousand] = timings;
	const ratio = (tenThousand?.perRow_us ?? 0) / (thousand?.perRow_us ?? 1);
	return {
		node: process.version,
		runs: RUNS,
		solve: timings,
		perRowAt10000To1000: rounded(ratio),
		friction: benchFriction()
	};
}

function solved(document: Parameters<typeof solveDesign>[0]): void {
	if (!solveDesign(document).ok) throw new Error('the building of the benchmark does not solve');
}

function validated(document: unknown): void {
	if (!validateDocument(document).ok) throw new Error('the building of the benchmark does not validate');
}

/** Of one call [ms]. */
function timeOf(call: () => void, times: number): number {
	const start = performance.now();
	for (let i = 0; i < times; i += 1) call();
	return (performance.now() - start) / times;
}

function median(values: readonly number[]): number {
	const sorted = [...values].sort((a, b) => a - b);
	return sorted[Math.floor(sorted.length / 2)] ?? 0;
}

function rounded(value: number): number {
	return Math.round(value * 1000) / 1000;
}
