import { readFileSync } from 'node:fs';
import {
	checksOf,
	designJsonSchema,
	marginLedger,
	monteCarloOf,
	ROW_FIGURES,
	solveDesign,
	uncertaintyOf,
	validateDocument,
	workingOf,
	type DesignDocument,
	type Problem,
	type Solution
} from '$lib/engine';
import { csvOf } from './calc/solution-csv';
import { whereJsonBreaks } from './calc/json-fault';
import { write } from './calc/write';

const USAGE =
	'usage: npm run --silent calc -- FILE [--csv | --checks | --uncertainty | --working=FIGURE] [--installed] | --schema   (FILE - is standard input)';
const FLAGS: readonly string[] = ['--csv', '--checks', '--installed', '--schema', '--uncertainty'];
const WORKING = /^--working=(.+)$/;

/** Of the draws: any number, and always the same. */
const SEED = 1;

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
	const isFlag = (word: string) => FLAGS.includes(word) || WORKING.test(word);
	const unknown = words.find((word) => word.startsWith('-') && word !== '-' && !isFlag(word));
	if (unknown !== undefined) return refuse(`${unknown}: no such flag; ${USAGE}`);
	if (words.includes('--schema')) {
		write(1, `${JSON.stringify(designJsonSchema(), null, 2)}\n`);
		return 0;
	}
	const files = words.filter((word) => !isFlag(word));
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
	const { document } = validated;
	const { solution } = solved;
	const wanted = words.flatMap((word) => WORKING.exec(word)?.[1] ?? []);
	if (wanted.length > 0) {
		const workings = wanted.map((name) => [name, workingNamed(document, solution, name)] as const);
		const lacking = workings.find(([, working]) => working === null);
		if (lacking) return refuse(`${lacking[0]}: the solution has no such figure that is worked`);
		write(
			1,
			`${JSON.stringify(
				workings.map(([, working]) => working),
				null,
				2
			)}\n`
		);
	} else if (words.includes('--checks')) {
		const checks = { checks: checksOf(document, solution), margins: marginLedger(document, solution) };
		write(1, `${JSON.stringify(checks, null, 2)}\n`);
	} else if (words.includes('--uncertainty')) {
		const firstOrder = uncertaintyOf(document, solution);
		const drawn = monteCarloOf(document, solution, { seed: SEED });
		write(1, `${JSON.stringify({ firstOrder, drawn }, null, 2)}\n`);
	} else write(1, words.includes('--csv') ? csvOf(solution) : `${JSON.stringify(solution, null, 2)}\n`);
	return 0;
}

/** `rows.S05.loss`, `paths.S05.spare` or `fan.totalPressure`; a tag may hold points. */
function workingNamed(document: DesignDocument, solution: Solution, name: string) {
	const [, holder = '', tag = '', figure = ''] = /^(rows|paths|fan)\.(?:(.+)\.)?(\w+)$/.exec(name) ?? [];
	if (holder === 'fan') {
		const fan = (['totalPressure', 'supplyPressure', 'returnPressure'] as const).find((one) => one === figure);
		return fan ? workingOf(document, solution, { fan }) : null;
	}
	if (holder === 'paths')
		return figure === 'loss' || figure === 'spare' ? workingOf(document, solution, { path: tag, figure }) : null;
	const ofRow = ROW_FIGURES.find((one) => one === figure);
	return ofRow ? workingOf(document, solution, { row: tag, figure: ofRow }) : null;
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
