import { performance } from 'node:perf_hooks';
import { solveDesign, validateDocument, type DesignDocument } from '$lib/engine';
import { building } from '../../tests/bench/building';
import { benchFriction } from './bench/friction';

const COUNTS = [100, 1_000, 10_000] as const;
/** Rows of one reading, whatever the size of a design. */
const ROWS = 10_000;
const WARM_UP = 6;
const RUNS = 21;

interface Timing {
	readonly rows: number;
	/** One design [ms]. */
	readonly total_ms: number;
	readonly perRow_us: number;
	/** The same where one design is solved again and again, as while typing: it stays in the processor's cache. */
	readonly again_perRow_us: number;
	readonly validate_ms: number;
}

interface Sized {
	readonly rows: number;
	/** Designs of their own, together as large as the largest, so that none finds the caches warmer than another. */
	readonly documents: readonly DesignDocument[];
	readonly solving: number[];
	readonly again: number[];
	readonly validating: number[];
}

/** Median times in one process after a warm-up, the sizes taken in turn; and how many friction factors a second. */
export function bench() {
	const sizes = COUNTS.map((rows): Sized => {
		const documents = Array.from({ length: ROWS / rows }, () => building(rows));
		return { rows, documents, solving: [], again: [], validating: [] };
	});
	for (let run = -WARM_UP; run < RUNS; run += 1)
		for (const { documents, solving, again } of sizes) {
			const [same] = documents;
			const each = timeOf(() => documents.forEach(solved));
			const repeated = timeOf(() => documents.forEach(() => same && solved(same)));
			if (run < 0) continue;
			solving.push(each);
			again.push(repeated);
		}
	for (let run = -WARM_UP; run < RUNS; run += 1)
		for (const { documents, validating } of sizes) {
			const took = timeOf(() => documents.forEach(validated));
			if (run >= 0) validating.push(took);
		}
	const timings = sizes.map(({ rows, documents, solving, again, validating }): Timing => {
		const perRow = (times: number[]) => rounded((median(times) * 1000) / ROWS);
		return {
			rows,
			total_ms: rounded(median(solving) / documents.length),
			perRow_us: perRow(solving),
			again_perRow_us: perRow(again),
			validate_ms: rounded(median(validating) / documents.length)
		};
	});
	const [hundred, thousand, tenThousand] = timings;
	const ratio = (key: 'perRow_us' | 'again_perRow_us', to?: Timing) =>
		rounded((tenThousand?.[key] ?? 0) / (to?.[key] ?? 1));
	return {
		node: process.version,
		options: process.execArgv,
		runs: RUNS,
		solve: timings,
		perRowAt10000To1000: ratio('perRow_us', thousand),
		perRowAt10000To100: ratio('perRow_us', hundred),
		again: { perRowAt10000To1000: ratio('again_perRow_us', thousand) },
		friction: benchFriction()
	};
}

function solved(document: DesignDocument): void {
	if (!solveDesign(document).ok) throw new Error('the building of the benchmark does not solve');
}

function validated(document: unknown): void {
	if (!validateDocument(document).ok) throw new Error('the building of the benchmark does not validate');
}

/** [ms] */
function timeOf(call: () => void): number {
	const start = performance.now();
	call();
	return performance.now() - start;
}

function median(values: readonly number[]): number {
	const sorted = [...values].sort((a, b) => a - b);
	return sorted[Math.floor(sorted.length / 2)] ?? 0;
}

function rounded(value: number): number {
	return Math.round(value * 1000) / 1000;
}
