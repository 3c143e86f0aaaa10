import { Piscina } from 'piscina';
import type { Report } from '$lib/report';
import { problem } from '../http/problem';
import { Turns } from './turns';

/** A thread that has printed nothing for so long is let go [ms]. */
const IDLE = 60_000;
/** Reports at once, each of another firm. */
const THREADS = 2;
/** Reports of one firm that may wait. */
const MOST_WAITING = 20;
/** Longest that a report may take to print, its wait not counted [ms]. */
const LONGEST = 300_000;
/** Memory of a thread [MB]: a report that needs more ends its thread, and not the server. */
const MEMORY = 2_048;

const turns = new Turns(THREADS, MOST_WAITING);
let pool: Piscina<Report, Uint8Array> | null = null;

/** Who waits for a report. */
interface Waiting {
	readonly firmId: string;
	/** Aborted when they have gone. */
	readonly signal: AbortSignal;
}

/** The report as a PDF file, printed beside the server's own thread; or why it is not printed now. */
export async function printReport(report: Report, { firmId, signal }: Waiting): Promise<Uint8Array | Response> {
	// Imported when asked for, so that it becomes a file of its own, which the threads can be started on.
	const { FILE, default: print } = await import('./print-worker');
	if (FILE.endsWith('.ts')) return print(report);
	const turn = turns.take(firmId);
	if (!turn) return problem('too-many-requests', 'Many reports of your firm are being printed. Try again in a minute.');
	const giveBack = await turn;
	const longest = AbortSignal.timeout(LONGEST);
	try {
		pool ??= new Piscina<Report, Uint8Array>({
			filename: FILE,
			minThreads: 0,
			maxThreads: THREADS,
			idleTimeout: IDLE,
			resourceLimits: { maxOldGenerationSizeMb: MEMORY }
		});
		return await pool.run(report, { signal: AbortSignal.any([signal, longest]) });
	} catch (cause) {
		if (signal.aborted) return problem('unavailable', 'Nobody waits for this report any more.');
		if (longest.aborted || isOutOfMemory(cause))
			return problem(
				'unavailable',
				'This report is too long to be printed here. Print its parts as systems of their own.'
			);
		throw cause;
	} finally {
		giveBack();
	}
}

const isOutOfMemory = (cause: unknown) =>
	cause instanceof Error && 'code' in cause && cause.code === 'ERR_WORKER_OUT_OF_MEMORY';
