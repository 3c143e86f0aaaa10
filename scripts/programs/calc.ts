import { readFileSync } from 'node:fs';
import { designJsonSchema, solveDesign, validateDocument, type Problem } from '$lib/engine';
import { csvOf } from './calc/solution-csv';
import { whereJsonBreaks } from './calc/json-fault';
import { write } from './calc/write';

const USAGE = 'usage: npm run --silent calc -- FILE [--csv] [--installed] | --schema   (FILE - is standard input)';
const FLAGS: readonly string[] = ['--csv', '--installed', '--schema'];

/** Status of a document, or a command, that cannot be used. */
const BAD = 2;
/** Status of what this version does not do. */
const NOT_HERE = 3;

/**
 * The command line of the calculation.
 *
 * @param words what stands after the command
 * @returns exit status: 0 solved, 2 bad document or command, 3 not in this version
 */
export function calc(words: readonly string[]): number {
	const unknown = words.find((word) => word.startsWith('-') && word !== '-' && !FLAGS.includes(word));
	if (unknown !== undefined) return refuse(`${unknown}: no such flag; ${USAGE}`);
	if (words.includes('--schema')) {
		write(1, `${JSON.stringify(designJsonSchema(), null, 2)}\n`);
		return 0;
	}
	const files = words.filter((word) => !FLAGS.includes(word));
	const [file] = files;
	if (file === undefined || files.length > 1) return refuse(`${files.length} files named, not one; ${USAGE}`);
	if (words.includes('--installed')) {
		write(2, '--installed: flows as installed are not in this version; without it the design flows are solved\n');
		return NOT_HERE;
	}
	const text = textOf(file);
	if (text === null)
		return refuse(`${file === '-' ? 'standard input' : file}: cannot be read; expected a design document`);
	const json = jsonOf(text);
	if (!json.ok) return refuse(`${file === '-' ? 'standard input' : file}: ${json.fault}`);

	const validated = validateDocument(json.value);
	if (!validated.ok) return refuseAll(validated.problems);
	const solved = solveDesign(validated.document);
	if (!solved.ok) return refuseAll(solved.problems);
	const csv = words.includes('--csv');
	write(1, csv ? csvOf(solved.solution) : `${JSON.stringify(solved.solution, null, 2)}\n`);
	return 0;
}

function textOf(file: string): string | null {
	try {
		return readFileSync(file === '-' ? 0 : file, 'utf8');
	} catch {
		return null; // absent, a folder, or not ours to read: the same to whoever named it
	}
}

type Json = { readonly ok: true; readonly value: unknown } | { readonly ok: false; readonly fault: string };

function jsonOf(text: string): Json {
	// A byte order mark is no fault of whoever saved the file.
	const json = text.startsWith('\uFEFF') ? text.slice(1) : text;
	try {
		return { ok: true, value: JSON.parse(json) };
	} catch {
		return { ok: false, fault: `is not JSON: ${whereJsonBreaks(json)}` };
	}
}

function refuse(line: string): number {
	write(2, `${line}\n`);
	return BAD;
}

/** One line for each fault: JSON path, what is wrong, what was expected. */
function refuseAll(problems: readonly Problem[]): number {
	const lines = problems.map(({ path, message, expected }) => `${path}: ${message}; expected ${expected}`);
	return refuse(lines.map((line) => line.replace(/\s*[\r\n]+\s*/g, ' ')).join('\n'));
}
