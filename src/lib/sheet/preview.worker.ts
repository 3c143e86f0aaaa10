/// <reference lib="webworker" />
import { applyEntry } from './apply';
import type { Entry } from './entry';
import type { FromWorker, ToWorker } from './preview';
import { EMPTY_SHEET, valueOf, type Sheet } from './sheet';
import { solveSheet, type SolvedSheet } from './solve-sheet';

/** The worker's own copy of the sheet: entries are small, the sheet is not. */
let sheet: Sheet = EMPTY_SHEET;

self.onmessage = ({ data }: MessageEvent<ToWorker>) => {
	const begun = performance.now();
	if (data.kind === 'sheet') sheet = data.sheet;
	if (data.kind === 'entry') sheet = applyEntry(sheet, data.entry);
	if (data.kind !== 'what-if' && !data.solve) return;
	const solved = data.kind === 'what-if' ? tried(data.entry) : solveSheet(sheet);
	const answer: FromWorker = {
		kind: data.kind === 'what-if' ? 'what-if' : 'solved',
		turn: data.turn,
		// The screen reads figures, not the document they came from.
		solved: { ...solved, document: null },
		took: performance.now() - begun
	};
	self.postMessage(answer);
};

/** What an entry would come to, cut down to what the echo shows: copying a whole solution takes longer than solving. */
function tried(entry: Entry): SolvedSheet {
	const after = applyEntry(sheet, entry);
	const solved = solveSheet(after);
	if (!solved.solution) return solved;
	const touched = rowsOf(entry);
	const tags = after.rows.flatMap((row) => (touched.has(row.id) ? (valueOf(row, 'tag') ?? []) : []));
	const rows = Object.fromEntries(
		tags.flatMap((tag) => (solved.solution?.rows[tag] ? [[tag, solved.solution.rows[tag]]] : []))
	);
	return { ...solved, solution: { ...solved.solution, rows, paths: [], flags: [] } };
}

function rowsOf(entry: Entry): Set<string> {
	switch (entry.kind) {
		case 'set':
			return new Set(entry.row === null ? [] : [entry.row]);
		case 'insert':
			return new Set(entry.rows.map(({ id }) => id));
		case 'batch':
			return new Set(entry.entries.flatMap((one) => [...rowsOf(one)]));
		default:
			return new Set();
	}
}
