import { spawnSync } from 'node:child_process';
import { mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { whereJsonBreaks } from '../../../scripts/programs/calc/json-fault';
import { solutionOf } from '../../../tests/engine/any-design';
import { checksOf, marginLedger, type DesignDocument } from '.';

const root = fileURLToPath(new URL('../../..', import.meta.url));
const networks = join(root, 'fixtures', 'networks');
const folder = mkdtempSync(join(tmpdir(), 'calc-'));
const hood = join(networks, 'hood-exhaust.json');

function calc(words: readonly string[], input = '') {
	const { status, stdout, stderr } = spawnSync(process.execPath, [join(root, 'scripts', 'calc.mjs'), ...words], {
		input,
		encoding: 'utf8',
		cwd: folder,
		maxBuffer: 1 << 28
	});
	return { status, stdout, stderr };
}

function fileOf(name: string, text: string): string {
	const file = join(folder, name);
	writeFileSync(file, text);
	return file;
}

// The first call may build the program.
beforeAll(() => void calc(['--schema']), 60_000);
afterAll(() => rmSync(folder, { recursive: true }));

describe('the calc command', () => {
	it.each(readdirSync(networks))('solves %s as the engine does', (name) => {
		const file = join(networks, name);
		const { status, stdout, stderr } = calc([file]);
		expect([status, stderr]).toEqual([0, '']);
		expect(JSON.parse(stdout)).toEqual(solutionOf(JSON.parse(readFileSync(file, 'utf8'))));
	});

	it('reads standard input, with a byte order mark or without', () => {
		const text = readFileSync(hood, 'utf8');
		const { stdout } = calc([hood]);
		expect(calc(['-'], text)).toEqual({ status: 0, stdout, stderr: '' });
		expect(calc(['-'], `\uFEFF${text}`).stdout).toBe(stdout);
	});

	it('prints the checks with the margins', () => {
		const { status, stdout, stderr } = calc([hood, '--checks']);
		expect([status, stderr]).toEqual([0, '']);
		const { checks, margins } = JSON.parse(stdout) as { checks: { key: string; outcome: string }[]; margins: object };
		const document = JSON.parse(readFileSync(hood, 'utf8')) as DesignDocument;
		expect({ checks, margins }).toEqual({
			checks: checksOf(document, solutionOf(document)),
			margins: marginLedger(document, solutionOf(document))
		});
	});

	it('prints the uncertainty of duty and paths', () => {
		const { status, stdout, stderr } = calc([hood, '--uncertainty']);
		expect([status, stderr]).toEqual([0, '']);
		const { firstOrder, drawn } = JSON.parse(stdout) as Record<string, { fan: Record<string, number> }>;
		expect(firstOrder?.fan.plusMinus).toBeGreaterThan(0);
		expect((drawn?.fan.deviation ?? NaN) / (firstOrder?.fan.plusMinus ?? NaN)).toBeCloseTo(1, 1);
	});

	it('prints the working of figures, and names one that is not worked', () => {
		const { fan, paths } = solutionOf(JSON.parse(readFileSync(hood, 'utf8')));
		const outlet = paths[0]?.outlet ?? '';
		const { status, stdout, stderr } = calc([hood, '--working=fan.totalPressure', `--working=rows.${outlet}.velocity`]);
		expect([status, stderr]).toEqual([0, '']);
		const [duty, velocity] = JSON.parse(stdout) as { figure: string; value: number; steps: object[] }[];
		expect(duty?.value).toBe(fan.totalPressure);
		expect(duty?.steps.length).toBeGreaterThan(8);
		expect(velocity?.figure).toBe(`rows.${outlet}.velocity`);
		expect(calc([hood, '--working=fan.colour'])).toMatchObject({ status: 2, stdout: '' });
	});

	it('prints one line for each row as CSV, units in the header', () => {
		const { status, stdout, stderr } = calc([join(networks, 'three-terminals.json'), '--csv']);
		expect([status, stderr]).toEqual([0, '']);
		const lines = stdout.split('\r\n');
		expect(lines).toHaveLength(7);
		const header = lines[0]?.split(',') ?? [];
		expect(header.slice(0, 3)).toEqual(['tag', 'side', 'flow_m3/s']);
		expect(lines[1]?.split(',')[header.indexOf('flow_m3/s')]).toBe('1');
		expect(Number(lines[1]?.split(',')[header.indexOf('frictionLoss_Pa')])).toBeCloseTo(6.5139, 2);
	});

	it('prints the JSON Schema of the document', () => {
		const { status, stdout } = calc(['--schema']);
		const schema = JSON.parse(stdout);
		expect(status).toBe(0);
		expect(schema.$schema).toBe('https://json-schema.org/draft/2020-12/schema');
		expect(schema.properties.rows.items.properties.side.enum).toEqual(['supply', 'return', 'exhaust', 'outdoor']);
		expect(schema.required).toEqual(['format', 'air', 'rows']);
	});

	it('says that flows as installed are not in this version', () => {
		const { status, stdout, stderr } = calc([hood, '--installed']);
		expect([status, stdout]).toEqual([3, '']);
		expect(stderr).toMatch(/^--installed: .*not in this version.*\n$/);
	});
});

describe('the calc command refuses, with status 2 and nothing on standard output', () => {
	function refusal(words: readonly string[], input = ''): string[] {
		const { status, stdout, stderr } = calc(words, input);
		expect([status, stdout]).toEqual([2, '']);
		return stderr.trimEnd().split('\n');
	}

	it('a bad document, by one line for each fault: path, what is wrong, what was expected', () => {
		const row = { tag: 'S1', joins: 'S9', side: 'supply', size: { shape: 'round', diameter: 0 }, length: -1 };
		const document = { format: 'evendraft/design@1', air: { temperature: 20 }, rows: [row] };
		expect(refusal([fileOf('bad.json', JSON.stringify(document))])).toEqual([
			'rows[0].size.diameter: is zero; expected at least 0.001 m',
			'rows[0].length: is negative: -1; expected at least 0 m',
			'rows[0].joins: no row has the tag "S9"; expected the tag of a row, or null',
			'rows[0].outlet: is missing: no row joins this one; expected an outlet, or a row that joins it'
		]);
	});

	it('a file that is not there', () => expect(refusal(['nothing.json'])[0]).toMatch(/^nothing\.json: cannot be read/));
	it('a folder', () => expect(refusal([folder])).toHaveLength(1));
	it('a wrong flag', () => expect(refusal([hood, '--instaled'])[0]).toMatch(/^--instaled: no such flag/));
	it('no file', () => expect(refusal([])[0]).toMatch(/usage/));
	it('two files', () => expect(refusal([hood, hood])[0]).toMatch(/usage/));

	it('what is not JSON, by line and column', () =>
		expect(refusal(['-'], '{"a": 1,\n "b": [1, 2,]}')).toEqual([
			'standard input: is not JSON: expected a value at line 2, column 13'
		]));
});

describe('where JSON breaks', () => {
	it.each([
		['{"a": 1,\n "b": [1, 2,]}', 'a value at line 2, column 13'],
		['{"a": 1\n "b": 2}', 'a comma or } at line 2, column 2'],
		['{a: 1}', 'a key in double quotes at line 1, column 2'],
		['{"a": 1,}', 'a key in double quotes at line 1, column 9'],
		['{"a" 1}', 'a colon at line 1, column 6'],
		['[1, 2', 'a comma or ] at line 1, column 6'],
		['{} {}', 'the end at line 1, column 4'],
		['', 'a value at line 1, column 1'],
		['[01]', 'a value at line 1, column 2'],
		['[NaN]', 'a value at line 1, column 2'],
		['["a\nb"]', 'a value at line 1, column 2']
	])('in %j', (text, expected) => {
		expect(() => JSON.parse(text)).toThrow(SyntaxError);
		expect(whereJsonBreaks(text)).toBe(`expected ${expected}`);
	});

	it('is never found before the end of what is JSON', () => {
		fc.assert(
			fc.property(fc.json(), (text) => {
				expect(whereJsonBreaks(`${text} ]`)).toMatch(/^expected the end at /);
			})
		);
	});
});
