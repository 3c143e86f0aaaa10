import { Piscina } from 'piscina';
import type { Report } from '$lib/report';

/** A thread that has printed nothing for so long is let go [ms]. */
const IDLE = 60_000;
/** Reports at once; more wait for their turn. */
const THREADS = 2;
/** Reports that may wait; one more is refused. */
const QUEUE = 100;
/** Longest that a report may take to print [ms]. */
const LONGEST = 120_000;

let pool: Piscina<Report, Uint8Array> | null = null;

/** The report as a PDF file, printed beside the server's own thread. */
export async function printReport(report: Report): Promise<Uint8Array> {
	// Imported when asked for, so that it becomes a file of its own, which the threads can be started on.
	const { FILE, default: print } = await import('./print-worker');
	if (FILE.endsWith('.ts')) return print(report);
	pool ??= new Piscina<Report, Uint8Array>({
		filename: FILE,
		minThreads: 0,
		maxThreads: THREADS,
		idleTimeout: IDLE,
		maxQueue: QUEUE
	});
	return pool.run(report, { signal: AbortSignal.timeout(LONGEST) });
}
