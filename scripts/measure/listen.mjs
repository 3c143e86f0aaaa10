/**
 * Runs in the page before its own scripts. Notes for each committed edit whether the first frame after the key has the
 * new figures, and how long the browser says that it took from the key to the picture.
 */
export function listen() {
	const edits = /** @type {{ key: number, isInFirstFrame: boolean, toPicture?: number }[]} */ ([]);
	/** The loss of the row that is being edited. */
	const loss = () => {
		const row = document.querySelector('[role="grid"]')?.getAttribute('aria-activedescendant')?.split('-')[1];
		const cell = document.querySelector(`[data-row="${row}"][data-key="total"]`);
		return () => cell?.textContent ?? '';
	};
	/** Fulfilled when so many edits were painted and the server has the last one. */
	const settled = async (/** @type {number} */ count) => {
		const state = document.querySelector('[data-testid="state"]');
		const done = () => edits.length >= count && state?.getAttribute('data-state') === 'saved';
		while (!done()) await new Promise((resolve) => setTimeout(resolve, 50));
	};
	Object.assign(globalThis, { edits, settled });

	addEventListener(
		'keydown',
		({ key, timeStamp }) => {
			if (key !== 'Enter') return;
			const now = loss();
			const before = now();
			// Called at the end of the frame's work on the page, before it is painted.
			requestAnimationFrame(() => edits.push({ key: timeStamp, isInFirstFrame: now() !== before }));
		},
		true
	);

	// The browser's own account, in steps of 8 ms: from the key to the moment the picture was handed to the screen.
	new PerformanceObserver((list) => {
		for (const { name, startTime, duration } of list.getEntries()) {
			const edit = name === 'keydown' ? edits.find(({ key }) => key === startTime) : undefined;
			if (edit) edit.toPicture = duration;
		}
	}).observe(/** @type {PerformanceObserverInit} */ ({ type: 'event', durationThreshold: 16, buffered: true }));
}
