/// <reference lib="webworker" />
import { applyEntry } from './apply';
import type { FromWorker, ToWorker } from './preview';
import { EMPTY_SHEET, type Sheet } from './sheet';
import { solveSheet } from './solve-sheet';

/** The worker's own copy of the sheet: entries are small, the sheet is not. */
let sheet: Sheet = EMPTY_SHEET;

self.onmessage = ({ data }: MessageEvent<ToWorker>) => {
	const begun = performance.now();
	if (data.kind === 'sheet') sheet = data.sheet;
	if (data.kind === 'entry') sheet = applyEntry(sheet, data.entry);
	const solved = solveSheet(data.kind === 'what-if' ? applyEntry(sheet, data.entry) : sheet);
	const answer: FromWorker = {
		kind: data.kind === 'what-if' ? 'what-if' : 'solved',
		turn: data.turn,
		solved,
		took: performance.now() - begun
	};
	self.postMessage(answer);
};
