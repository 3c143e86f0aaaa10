/** What the page's own thread did for each committed edit, read from the browser's trace. */

/** @typedef {{ name: string, pid: number, tid: number, ts: number, dur?: number, args?: any }} TraceEvent */

/** Starts a trace; the answer ends it and gives its events. @param {import('playwright-core').CDPSession} session */
export async function startTrace(session) {
	const events = /** @type {TraceEvent[]} */ ([]);
	session.on('Tracing.dataCollected', ({ value }) => events.push(.../** @type {any} */ (value)));
	const includedCategories = ['toplevel', 'devtools.timeline', 'cc', 'benchmark'];
	await session.send('Tracing.start', { transferMode: 'ReportEvents', traceConfig: { includedCategories } });
	return async () => {
		const complete = new Promise((resolve) => session.once('Tracing.tracingComplete', resolve));
		await session.send('Tracing.end');
		await complete;
		return events;
	};
}

/**
 * For each key that ended its edit: the task of the key, in which the page computes and writes the figures, and the
 * first frame after it, from style to painted layers [ms].
 *
 * @param {TraceEvent[]} events
 */
export function editsOf(events) {
	const keys = events.filter(({ name, args }) => name === 'EventDispatch' && args?.data?.type === 'keydown');
	const [any] = keys;
	if (!any) throw new Error('the trace has no key');
	const thread = events
		.filter(({ pid, tid, dur }) => pid === any.pid && tid === any.tid && dur !== undefined)
		.sort((a, b) => a.ts - b.ts);
	const tasks = thread.filter(({ name }) => name === 'ThreadControllerImpl::RunTask' || name === 'RunTask');
	const frames = thread.filter(({ name }) => name === 'ProxyMain::BeginMainFrame');
	const sum = (/** @type {string} */ name, /** @type {number} */ from, /** @type {number} */ to) =>
		thread
			.filter((one) => one.name === name && one.ts >= from && one.ts < to)
			.reduce((all, { dur = 0 }) => all + dur, 0);
	return keys.flatMap((key) => {
		const task = tasks.find(({ ts, dur = 0 }) => ts <= key.ts && ts + dur >= key.ts);
		const end = task ? task.ts + (task.dur ?? 0) : 0;
		const frame = frames.find(({ ts }) => ts >= end);
		if (!task || !frame) return [];
		const last = frame.ts + (frame.dur ?? 0);
		return {
			at: key.ts,
			computing: (end - key.ts) / 1e3,
			painting: (frame.dur ?? 0) / 1e3,
			style: (sum('UpdateLayoutTree', frame.ts, last) + sum('Layout', frame.ts, last)) / 1e3,
			toPaintedLayers: (last - key.ts) / 1e3
		};
	});
}
