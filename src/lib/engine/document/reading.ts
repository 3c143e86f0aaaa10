import type { z } from 'zod';
import { fault, isRecord, shown, type Step } from './fault';
import { LIMITS } from './limits';
import { DESIGN_FORMAT, designSchema } from './schema';
import type { Problem, ProblemCode } from './types';

type Issue = z.core.$ZodIssue;

const SIZE_KEYS: readonly Step[] = ['diameter', 'width', 'height'];
const UNITS: Readonly<Record<string, string>> = {
	diameter: 'm',
	width: 'm',
	height: 'm',
	length: 'm',
	rise: 'm',
	roughness: 'm',
	elevation: 'm',
	flexibleLength: 'm',
	flow: 'm3/s',
	atFlow: 'm3/s',
	loss: 'Pa',
	clean: 'Pa',
	final: 'Pa',
	testPressure: 'Pa',
	thickness: 'm',
	standardDensity: 'kg/m3',
	pressure: 'Pa',
	totalPressure: 'Pa',
	frictionRate: 'Pa/m',
	temperature: 'degC',
	density: 'kg/m3',
	viscosity: 'Pa s',
	mainVelocity: 'm/s',
	runOutVelocity: 'm/s'
};
const POINT = 'a pair [flow, loss]';
const KINDS: Readonly<Record<string, string>> = {
	object: 'an object',
	array: 'a list',
	string: 'text',
	number: 'a number',
	int: 'a whole number',
	boolean: 'true or false',
	tuple: 'a pair of numbers'
};

/** What of the document breaks the schema: every key that is missing, of the wrong kind or out of bounds. */
export function schemaProblems(document: unknown): Problem[] {
	const result = designSchema.safeParse(document);
	if (result.success) return [];
	return result.error.issues.flatMap((issue) => problemsOf(issue, [], document));
}

function problemsOf(issue: Issue, base: readonly Step[], document: unknown): Problem[] {
	const path = [...base, ...issue.path.map((step) => (typeof step === 'number' ? step : String(step)))];
	const value = valueAt(document, path);
	// Told already, by the copy.
	if (typeof value === 'number' && !Number.isFinite(value)) return [];
	if (issue.code === 'invalid_union' && issue.errors.length > 0) return ofUnion(issue.errors, path, value, document);
	const [code, message, expected] = described(issue, path, value);
	return [fault(code, path, message, expected)];
}

/** Of two ways to write a thing, the faults of the way that was meant: the one whose first key is there. */
function ofUnion(ways: readonly Issue[][], path: readonly Step[], value: unknown, document: unknown): Problem[] {
	if (value === undefined) return [fault('missing', path, 'is missing', 'an object')];
	if (!isRecord(value)) return [fault('type', path, `is ${shown(value)}`, 'an object')];
	const meant = 'density' in value ? 0 : 'temperature' in value ? 1 : null;
	if (meant === null)
		return [fault('missing', path, 'has neither temperature nor density', 'temperature in degC, or density in kg/m3')];
	return (ways[meant] ?? []).flatMap((issue) => problemsOf(issue, path, document));
}

type Described = readonly [ProblemCode, string, string];

function described(issue: Issue, path: readonly Step[], value: unknown): Described {
	const key = path.at(-1);
	if (path.length === 1 && key === 'format')
		return ['format', value === undefined ? 'is missing' : `is ${shown(value)}`, `"${DESIGN_FORMAT}"`];
	switch (issue.code) {
		case 'invalid_type': {
			const kind = KINDS[issue.expected] ?? issue.expected;
			const expected = key === 'joins' ? 'the tag of a row, or null' : `${kind}${inUnit(key)}`;
			if (value === undefined) return ['missing', 'is missing', expected];
			return ['type', `is ${shown(value)}`, expected];
		}
		case 'invalid_value':
			return ofChoice(value, issue.values.map((one) => JSON.stringify(one)).join(', '));
		case 'invalid_union':
			return ofChoice(value, '"round", "rectangular", "oval"');
		case 'too_small':
			return tooSmall(issue.origin, Number(issue.minimum), path, value);
		case 'too_big':
			return tooBig(issue.origin, Number(issue.maximum), path, value);
		default:
			return ['type', `is ${shown(value)}`, 'a value of the schema'];
	}
}

function ofChoice(value: unknown, choices: string): Described {
	if (value === undefined) return ['missing', 'is missing', `one of ${choices}`];
	return ['unknown-key-value', `is ${shown(value)}`, `one of ${choices}`];
}

function tooSmall(origin: string, minimum: number, path: readonly Step[], value: unknown): Described {
	const key = path.at(-1) ?? '';
	if (origin === 'string') return ['text-length', 'is empty', 'some text'];
	if (origin === 'array') {
		if (key === 'rows') return ['no-rows', 'has no rows', 'at least one row'];
		if (path.includes('points'))
			return ['out-of-range', 'is too short', key === 'points' ? 'at least one point' : POINT];
		return ['fan-curve', 'is too short', key === 'curve' ? 'at least two points' : 'a pair [flow, total pressure]'];
	}
	const expected = `at least ${minimum}${unitOf(key)}`;
	const number = Number(value);
	if (number < 0 && minimum >= 0) return ['negative', `is negative: ${number}`, expected];
	if (number === 0 && SIZE_KEYS.includes(key)) return ['zero-size', 'is zero', expected];
	if (number === 0 && key === 'flow') return ['flow-zero', 'is zero', 'a flow above 0 m3/s'];
	return ['out-of-range', `is ${number}`, expected];
}

function tooBig(origin: string, maximum: number, path: readonly Step[], value: unknown): Described {
	const key = path.at(-1) ?? '';
	if (origin === 'string') return ['text-length', 'is too long', `at most ${maximum} characters`];
	if (origin === 'array') {
		const count = Array.isArray(value) ? value.length : 0;
		if (key === 'rows') return ['too-many-rows', `has ${count} rows`, `at most ${LIMITS.rows} rows`];
		if (path.includes('points') && typeof key === 'number') return ['out-of-range', `has ${count} values`, POINT];
		if (typeof key === 'number') return ['fan-curve', `has ${count} values`, 'a pair [flow, total pressure]'];
		return ['too-many-parts', `has ${count} entries`, `at most ${maximum} entries`];
	}
	return ['out-of-range', `is ${shown(value)}`, `at most ${maximum}${unitOf(key)}`];
}

function unitOf(key: Step): string {
	const unit = Object.hasOwn(UNITS, key) ? UNITS[key] : undefined;
	return unit === undefined ? '' : ` ${unit}`;
}

function inUnit(key: Step | undefined): string {
	const unit = key === undefined ? '' : unitOf(key);
	return unit === '' ? '' : ` in${unit}`;
}

function valueAt(document: unknown, path: readonly Step[]): unknown {
	let value = document;
	for (const step of path) {
		if (typeof value !== 'object' || value === null || !Object.hasOwn(value, step)) return undefined;
		value = (value as Record<Step, unknown>)[step];
	}
	return value;
}
