import { LIMITS } from './limits';
import { fault, type Step } from './fault';
import type { Problem } from './types';

/**
 * A copy of plain JSON data, made without recursion. Whatever is no JSON (a function, a ring of objects, NaN) becomes
 * a problem, so that all later steps may read freely. Keys with the value undefined are left out, -0 becomes 0.
 */
export interface PlainCopy {
	/** null when the input could not be read to its end */
	readonly value: unknown;
	readonly whole: boolean;
	readonly problems: readonly Problem[];
}

type Holder = unknown[] | Record<string, unknown>;
/** An object or a list that is still to be copied, and the way to it. */
interface Visit {
	readonly from: object;
	readonly to: Holder;
	readonly within: Visit | null;
	readonly step: Step;
	readonly depth: number;
}

export function plainCopy(input: unknown): PlainCopy {
	try {
		return copyOf(input);
	} catch {
		// A getter or a proxy of the caller's threw.
		return broken(fault('unreadable', [], 'the document cannot be read as plain data', 'plain JSON'));
	}
}

function copyOf(input: unknown): PlainCopy {
	const problems: Problem[] = [];
	const waiting: Visit[] = [];
	let values = 0;

	function place(value: unknown, within: Visit | null, step: Step): unknown {
		values += 1;
		if (value === null || typeof value === 'string' || typeof value === 'boolean') return value;
		if (typeof value === 'number') {
			if (!Number.isFinite(value))
				problems.push(fault('not-finite', pathTo(within, step), `is ${value}`, 'a finite number'));
			return value === 0 ? 0 : value;
		}
		if (typeof value !== 'object') {
			problems.push(fault('type', pathTo(within, step), `is a ${typeof value}`, 'plain JSON'));
			return null;
		}
		const to: Holder = Array.isArray(value) ? [] : {};
		waiting.push({ from: value, to, within, step, depth: (within?.depth ?? -1) + 1 });
		return to;
	}

	const value = place(input, null, '');
	for (let visit = waiting.pop(); visit !== undefined; visit = waiting.pop()) {
		const { from, to, depth } = visit;
		if (depth >= LIMITS.depth) {
			const path = pathTo(visit.within, visit.step);
			return broken(fault('too-deep', path, 'is nested too deeply', `at most ${LIMITS.depth} levels`));
		}
		if (Array.isArray(from)) {
			if (values + from.length > LIMITS.values) return tooLarge();
			for (let i = 0; i < from.length; i += 1) (to as unknown[]).push(place(from[i] ?? null, visit, i));
		} else {
			const keys = Object.keys(from);
			if (values + keys.length > LIMITS.values) return tooLarge();
			for (const key of keys) {
				const inner = (from as Record<string, unknown>)[key];
				if (inner === undefined) continue;
				if (key === '__proto__') {
					const path = pathTo(visit.within, visit.step);
					problems.push(fault('type', path, 'has a key named __proto__', 'no such key'));
				} else (to as Record<string, unknown>)[key] = place(inner, visit, key);
			}
		}
	}
	return { value, whole: true, problems };
}

/** The steps from the document to a value; the document itself has none. */
function pathTo(within: Visit | null, step: Step): Step[] {
	if (within === null) return [];
	const path = [step];
	for (let visit = within; visit.within !== null; visit = visit.within) path.push(visit.step);
	return path.reverse();
}

function tooLarge(): PlainCopy {
	return broken(fault('too-large', [], 'the document is too large', `at most ${LIMITS.values} values`));
}

function broken(problem: Problem): PlainCopy {
	return { value: null, whole: false, problems: [problem] };
}
