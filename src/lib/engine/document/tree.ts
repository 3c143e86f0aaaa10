import { fault, isRecord, rowsOf, shown, textAt } from './fault';
import { LIMITS } from './limits';
import type { Problem } from './types';

const SIDES: readonly string[] = ['supply', 'return', 'exhaust', 'outdoor'];

export interface Tree {
	/** Place of the row that each one joins; -1 where it meets the fan, and where it cannot be told. */
	readonly parents: Int32Array;
	/** What keeps the rows from being trees that start at the fan. */
	readonly problems: readonly Problem[];
}

/** Who joins whom. Reads rows of any kind; odd ones are the schema's business. */
export function readTree(document: unknown): Tree {
	const rows = rowsOf(document);
	const problems: Problem[] = [];
	const first = firstOf(rows, 'tag', problems);
	firstOf(rows, 'id', problems);
	const parents = parentsOf(rows, first, problems);
	const rings = ringProblems(rows, parents, problems);
	outletProblems(rows, parents, problems);
	sideProblems(rows, parents, problems);
	straightProblems(rows, parents, problems);
	if (!rings) depthProblem(parents, problems);
	return { parents, problems };
}

/** Place of the first row that has each tag (or id). */
function firstOf(rows: readonly unknown[], key: 'tag' | 'id', problems: Problem[]): ReadonlyMap<string, number> {
	const first = new Map<string, number>();
	rows.forEach((row, i) => {
		const name = textAt(row, key);
		if (name === null) return;
		const earlier = first.get(name);
		if (earlier === undefined) first.set(name, i);
		else {
			const code = key === 'tag' ? 'duplicate-tag' : 'duplicate-id';
			const message = `${shown(name)} is the ${key} of rows[${earlier}] too`;
			problems.push(fault(code, ['rows', i, key], message, `a ${key} of its own`));
		}
	});
	return first;
}

/** Place of the row each one joins; -1 at the fan, and where it cannot be told. */
function parentsOf(rows: readonly unknown[], first: ReadonlyMap<string, number>, problems: Problem[]): Int32Array {
	const parents = new Int32Array(rows.length).fill(-1);
	rows.forEach((row, i) => {
		const joins = textAt(row, 'joins');
		if (joins === null) return;
		const parent = first.get(joins);
		if (joins !== textAt(row, 'tag') && parent !== undefined) {
			parents[i] = parent;
			return;
		}
		const path = ['rows', i, 'joins'];
		if (parent === undefined)
			problems.push(fault('joins-unknown', path, `no row has the tag ${shown(joins)}`, 'the tag of a row, or null'));
		else problems.push(fault('joins-itself', path, 'joins itself', 'another row, or null'));
	});
	return parents;
}

/** Each ring once, at its row that comes first. */
function ringProblems(rows: readonly unknown[], parents: Int32Array, problems: Problem[]): boolean {
	const seenBy = new Int32Array(rows.length).fill(-1);
	let found = false;
	for (let start = 0; start < rows.length; start += 1) {
		let at = start;
		while (at >= 0 && seenBy[at] === -1) {
			seenBy[at] = start;
			at = parents[at] ?? -1;
		}
		if (at < 0 || seenBy[at] !== start) continue;
		found = true;
		const ring = [at];
		for (let next = parents[at] ?? at; next !== at; next = parents[next] ?? at) ring.push(next);
		const names = ring.slice(0, 8).map((i) => textAt(rows[i], 'tag') ?? '?');
		const message = `the rows ${names.join(', ')}${ring.length > 8 ? ', …' : ''} join in a ring`;
		const place = ring.reduce((a, b) => Math.min(a, b), at);
		problems.push(fault('ring', ['rows', place, 'joins'], message, 'a way to the fan: a row that joins null'));
	}
	return found;
}

function outletProblems(rows: readonly unknown[], parents: Int32Array, problems: Problem[]): void {
	const joined = new Int32Array(rows.length).fill(-1);
	parents.forEach((parent, i) => {
		if (parent >= 0 && joined[parent] === -1) joined[parent] = i;
	});
	rows.forEach((row, i) => {
		if (!isRecord(row)) return;
		const child = joined[i] ?? -1;
		if (child < 0 === (row.outlet !== undefined)) return;
		const path = ['rows', i, 'outlet'];
		if (child < 0)
			problems.push(
				fault('outlet-missing', path, 'is missing: no row joins this one', 'an outlet, or a row that joins it')
			);
		else {
			const message = `stands in the middle: ${shown(textAt(rows[child], 'tag'))} joins this row`;
			problems.push(fault('outlet-in-middle', path, message, 'an outlet only where no row joins'));
		}
	});
}

function sideProblems(rows: readonly unknown[], parents: Int32Array, problems: Problem[]): void {
	rows.forEach((row, i) => {
		const parent = rows[parents[i] ?? -1];
		const side = textAt(row, 'side');
		const other = textAt(parent, 'side');
		if (side === other || side === null || other === null || !SIDES.includes(side) || !SIDES.includes(other)) return;
		if ((side === 'supply') === (other === 'supply')) return;
		const message = `is ${side}, but the row it joins is ${other}`;
		const expected = other === 'supply' ? 'supply' : 'return, exhaust or outdoor';
		problems.push(fault('side-differs', ['rows', i, 'side'], message, expected));
	});
}

/** At a node one stream at most goes straight on. */
function straightProblems(rows: readonly unknown[], parents: Int32Array, problems: Problem[]): void {
	const straight = new Map<number, number>();
	rows.forEach((row, i) => {
		const parent = parents[i] ?? -1;
		const junction = isRecord(row) ? row.junction : null;
		if (parent < 0 || !isRecord(junction) || junction.kind === 'fixed' || junction.leg !== 'straight') return;
		const other = straight.get(parent);
		if (other === undefined) straight.set(parent, i);
		else
			problems.push(
				fault(
					'two-straight',
					['rows', i, 'junction', 'leg'],
					`is straight, and so is ${shown(textAt(rows[other], 'tag'))} at the same node`,
					'one straight leg at a node; the others are branches'
				)
			);
	});
}

/** Paths that would fill the memory: only a comb of thousands of rows one after another has so many. */
function depthProblem(parents: Int32Array, problems: Problem[]): void {
	const depth = new Int32Array(parents.length);
	const joined = new Uint8Array(parents.length);
	const way: number[] = [];
	for (let start = 0; start < parents.length; start += 1) {
		let at = start;
		while (at >= 0 && depth[at] === 0) {
			way.push(at);
			at = parents[at] ?? -1;
		}
		let reached = at < 0 ? 0 : (depth[at] ?? 0);
		for (let next = way.pop(); next !== undefined; next = way.pop()) depth[next] = reached += 1;
		const parent = parents[start] ?? -1;
		if (parent >= 0) joined[parent] = 1;
	}
	let total = 0;
	depth.forEach((rowsOfPath, i) => (total += joined[i] === 1 ? 0 : rowsOfPath));
	if (total <= LIMITS.pathRows) return;
	const message = `the paths have ${total} rows together`;
	problems.push(fault('too-great', ['rows'], message, `at most ${LIMITS.pathRows}: fewer rows one after another`));
}
