/**
 * Runs in the page before its own scripts. Notes for each committed edit the key, the work that it made on the page's own
 * thread, the answer of the worker, the work of showing it, and the frame in which it was painted.
 */
export function listen() {
	/** After what the present task has left to do. @param {() => void} then */
	const afterTask = (then) => {
		const { port1, port2 } = new MessageChannel();
		port1.onmessage = then;
		port2.postMessage(0);
	};
	const edits = /** @type {Record<string, number>[]} */ ([]);
	/** @type {Record<string, number> | null} */
	let now = null;
	/** Fulfilled when so many edits were painted and the server has the last one; without asking again and again. */
	const settled = async (/** @type {number} */ count) => {
		const state = document.querySelector('[data-testid="state"]');
		const done = () => edits.length >= count && state?.getAttribute('data-state') === 'saved';
		while (!done()) await new Promise((resolve) => setTimeout(resolve, 50));
	};
	Object.assign(globalThis, { edits, settled });

	addEventListener(
		'keydown',
		(event) => {
			if (event.key !== 'Enter') return;
			const begun = performance.now();
			const edit = { key: event.timeStamp };
			now = edit;
			afterTask(() => Object.assign(edit, { keyWork: performance.now() - begun }));
		},
		true
	);

	globalThis.Worker = class extends Worker {
		constructor(/** @type {string | URL} */ url, /** @type {WorkerOptions | undefined} */ options) {
			super(url, options);
			this.addEventListener('message', ({ data }) => {
				const edit = now;
				if (!edit || data.kind !== 'solved') return;
				now = null;
				const heard = performance.now();
				Object.assign(edit, { engine: data.took, answered: heard - Number(edit.key) });
				afterTask(() => Object.assign(edit, { showWork: performance.now() - heard }));
				requestAnimationFrame(() => {
					afterTask(() => Object.assign(edit, { painted: performance.now() - Number(edit.key) }));
					requestAnimationFrame(() => {
						Object.assign(edit, { secondFrame: performance.now() - Number(edit.key) });
						edits.push(edit);
					});
				});
			});
		}
	};
}
