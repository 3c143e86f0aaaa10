import { ESLint } from 'eslint';
import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import ts from 'typescript';
import { describe, expect, it } from 'vitest';
import { importsOf, ringsOf, resolved, sourceFiles, specifiersOf } from './imports';

const FILES = sourceFiles('src');
const isTest = (file: string) => file.endsWith('.test.ts');
const PRODUCT = FILES.filter((file) => !isTest(file));
const IMPORTS = importsOf(PRODUCT);

/** The room of a file: `engine`, `sheet` … of src/lib, or `routes`. */
const roomOf = (file: string) =>
	/^src\/lib\/([^/]+)\//.exec(file)?.[1] ?? (file.startsWith('src/') ? 'routes' : 'outside');

/** Which rooms a room may know, beside itself. */
const MAY_KNOW: Readonly<Record<string, readonly string[]>> = {
	engine: [],
	sheet: ['engine'],
	report: ['engine'],
	drawing: ['engine'],
	methods: ['engine'],
	schemas: ['engine', 'sheet'],
	components: ['engine', 'sheet', 'schemas', 'report', 'drawing', 'methods'],
	server: ['engine', 'sheet', 'schemas', 'report', 'drawing'],
	routes: ['engine', 'sheet', 'schemas', 'report', 'drawing', 'methods', 'components', 'server']
};

describe('ESLint', { timeout: 30_000 }, () => {
	const eslint = new ESLint();

	it('skips no file of src, and has the boundaries on each that is no test', async () => {
		expect(PRODUCT.length).toBeGreaterThan(200);
		for (const file of FILES) {
			expect([file, await eslint.isPathIgnored(file)]).toEqual([file, false]);
			const { rules } = (await eslint.calculateConfigForFile(file)) as { rules: Record<string, [number, unknown?]> };
			const [severity, options] = rules['no-restricted-imports'] ?? [0];
			expect([file, severity]).toEqual([file, isTest(file) ? 0 : 2]);
			if (!isTest(file)) expect([file, JSON.stringify(options)]).toEqual([file, expect.stringMatching(/tests|itself/)]);
		}
	});

	it('skips none of the files that it is asked for by its command', async () => {
		const others = ['tests/boundaries/layout.test.ts', 'scripts/start.mjs', 'vite.config.ts', 'eslint.config.js'];
		for (const file of others) expect([file, await eslint.isPathIgnored(file)]).toEqual([file, false]);
		expect(await eslint.isPathIgnored('build/index.js')).toBe(true);
	});
});

describe('the rooms of src', () => {
	it('know only those below them, types included', () => {
		const crossing = IMPORTS.map(({ from, to }) => ({ from, to, rooms: [roomOf(from), roomOf(to)] as const }))
			.filter(({ rooms: [one, other] }) => one !== other && !MAY_KNOW[one]?.includes(other))
			.map(({ from, to }) => `${from} imports ${to}`);
		expect(crossing).toEqual([]);
		expect(IMPORTS.length).toBeGreaterThan(500);
	});

	it('enter the engine by its door alone', () => {
		const inside = IMPORTS.filter(
			({ from, to }) => roomOf(to) === 'engine' && roomOf(from) !== 'engine' && to !== 'src/lib/engine/index.ts'
		);
		expect(inside).toEqual([]);
	});

	it('have no ring of files, types included', () => expect(ringsOf(IMPORTS)).toEqual([]));

	it('lead nowhere that is not there', () => {
		const lost = PRODUCT.flatMap((from) =>
			specifiersOf(from, ts.sys.readFile(from) ?? '')
				.filter(({ specifier }) => specifier.startsWith('.') || specifier.startsWith('$lib/'))
				.filter(({ specifier }) => !/(\.css|\.json|\?\w+|\/\$types(\.js)?)$/.test(specifier))
				.filter(({ specifier }) => resolved(from, specifier) === null)
				.map(({ specifier }) => `${from}: ${specifier}`)
		);
		expect(lost).toEqual([]);
	});

	it('keep packages of the browser, of the server and of tests where they belong', () => {
		const packages = PRODUCT.flatMap((from) =>
			specifiersOf(from, ts.sys.readFile(from) ?? '')
				.filter(({ specifier }) => !/^[.$]/.test(specifier))
				.map(({ specifier }) => ({ from, specifier }))
		);
		const wrong = packages.filter(({ from, specifier }) => {
			if (/^(vitest|fast-check|playwright|eslint)/.test(specifier)) return true;
			if (/^(node:|drizzle-orm|postgres|pdfmake|nodemailer|pino|@node-rs)/.test(specifier))
				return roomOf(from) !== 'server' && !/server\.ts$/.test(from);
			return false;
		});
		expect(wrong).toEqual([]);
		expect(packages.length).toBeGreaterThan(100);
	});
});

describe('the walk over imports', () => {
	it.each([
		['x.ts', `import a from './a';`, ['./a']],
		['x.ts', `import './a';\nexport { b } from './b';\nexport * from '$lib/c';`, ['./a', './b', '$lib/c']],
		['x.ts', `import type { A } from './a';\nimport { type B } from './b';`, ['./a (type)', './b (type)']],
		['x.ts', `import { type A, b } from './a';\nexport type { C } from './c';`, ['./a', './c (type)']],
		['x.ts', `const a = await import('./a');\nnew Worker(new URL('./w.ts', import.meta.url));`, ['./a', './w.ts']],
		['x.ts', `// import './no';\nconst text = "import './no'";`, []],
		[
			'X.svelte',
			`<script module lang="ts">import './a';</script>\n<script lang="ts">import B from './B.svelte';</script>\n<p>import './no'</p>`,
			['./a', './B.svelte']
		]
	])('reads %s: %s', (file, text, found) =>
		expect(specifiersOf(file, text).map((one) => one.specifier + (one.typeOnly ? ' (type)' : ''))).toEqual(found)
	);

	it.each<[string, [string, string][], string[][]]>([
		[
			'no ring',
			[
				['a', 'b'],
				['b', 'c'],
				['a', 'c']
			],
			[]
		],
		['a file that imports itself', [['a', 'a']], [['a']]],
		[
			'two that import each other',
			[
				['a', 'b'],
				['b', 'a']
			],
			[['a', 'b']]
		],
		[
			'a long way round',
			[
				['a', 'b'],
				['b', 'c'],
				['c', 'd'],
				['d', 'b']
			],
			[['b', 'c', 'd']]
		],
		[
			'two rings',
			[
				['a', 'b'],
				['b', 'a'],
				['b', 'c'],
				['c', 'd'],
				['d', 'c']
			],
			[
				['c', 'd'],
				['a', 'b']
			]
		]
	])('finds %s', (_what, edges, rings) => expect(ringsOf(edges.map(([from, to]) => ({ from, to })))).toEqual(rings));

	it('finds the files that imports mean', () => {
		expect(resolved('src/lib/sheet/parts/index.ts', '../sheet')).toBe('src/lib/sheet/sheet.ts');
		expect(resolved('src/lib/sheet/sheet.ts', '$lib/engine')).toBe('src/lib/engine/index.ts');
		expect(resolved('src/lib/sheet/keyboard.ts', './run-grid.svelte')).toBe('src/lib/sheet/run-grid.svelte.ts');
		expect(resolved('src/lib/sheet/sheet.ts', 'zod')).toBeNull();
	});
});

describe('the engine’s own tsconfig', { timeout: 30_000 }, () => {
	const { config } = ts.readConfigFile('src/lib/engine/tsconfig.json', ts.sys.readFile);
	const { fileNames, options } = ts.parseJsonConfigFileContent(config, ts.sys, 'src/lib/engine');

	it('knows neither the browser nor Node', () => {
		expect([options.types, options.lib]).toEqual([[], ['lib.es2023.d.ts']]);
		const probe = 'src/lib/engine/probe.ts';
		const host = ts.createCompilerHost(options);
		const read = host.getSourceFile;
		host.getSourceFile = (name, version, ...rest) =>
			name.endsWith(probe)
				? ts.createSourceFile(name, 'export const x = [document, process, fetch, Date, Math];', version)
				: read(name, version, ...rest);
		const found = ts.createProgram([probe], { ...options, noEmit: true }, host).getSemanticDiagnostics();
		const words = found.map(({ messageText }) => /'(\w+)'/.exec(ts.flattenDiagnosticMessageText(messageText, ''))?.[1]);
		expect(words).toEqual(['document', 'process', 'fetch']);
	});

	it('covers every file of the engine but its tests', () => {
		const covered = fileNames.map((name) => name.slice(name.indexOf('src/lib/engine'))).sort();
		expect(covered).toEqual(sourceFiles('src/lib/engine').filter((file) => !isTest(file)));
	});
});

describe('names of files and folders', () => {
	const NAMELESS = /(^|[-.])(utils?|helpers?|commons?|managers?|stores?|misc|shared|lib)$/i;
	const stemOf = (name: string) => name.replace(/(\.(test|svelte|server|worker|pin|d))*\.(ts|mjs|js|svelte)$/, '');
	const namesIn = (folder: string): string[] =>
		readdirSync(folder, { withFileTypes: true }).flatMap((entry) => [
			entry.name,
			...(entry.isDirectory() ? namesIn(join(folder, entry.name)) : [])
		]);

	it.each(['src', 'scripts', 'tests'])('of %s say what is in them', (folder) => {
		const names = namesIn(folder);
		expect(names.length).toBeGreaterThan(5);
		expect(names.filter((name) => name !== 'lib' && NAMELESS.test(stemOf(name)))).toEqual([]);
	});

	it.each(['utils.ts', 'date-utils.ts', 'helpers', 'sheet-helper.svelte.ts', 'common.mjs', 'Manager.svelte', 'stores'])(
		'such as %s say nothing',
		(name) => expect(NAMELESS.test(stemOf(name))).toBe(true)
	);

	it('of components are in capitals, of all else in small letters', () => {
		const odd = FILES.filter((file) => !file.includes('/routes/')).filter((file) => {
			const name = file.slice(file.lastIndexOf('/') + 1);
			return file.endsWith('.svelte')
				? !/^[A-Z][A-Za-z]*\.svelte$/.test(name)
				: !/^[a-z0-9-]+(\.[a-z]+)*\.ts$/.test(name);
		});
		expect(odd).toEqual([]);
	});
});
