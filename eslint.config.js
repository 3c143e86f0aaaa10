import prettier from 'eslint-config-prettier';
import js from '@eslint/js';
import svelte from 'eslint-plugin-svelte';
import globals from 'globals';
import ts from 'typescript-eslint';

/** One rule, several patterns: `no-restricted-imports` does not merge, so each block lists all that holds for it. */
const ban = (...patterns) => ({ 'no-restricted-imports': ['error', { patterns }] });

const engine = { group: ['**/engine/*'], message: 'Import $lib/engine, its only door.' };
const server = { group: ['**/server', '$env/*/private'], message: 'Get server data from load() or the API.' };
const sql = { group: ['drizzle-orm', 'postgres', '**/db/schema'], message: 'Call a use case.' };
const components = { group: ['**/components'], message: 'This room does not know the screen.' };
const screen = { ...components, group: [...components.group, '**/*.svelte'] };
const tests = { group: ['**/tests/**', '**/fixtures/**'], message: 'The product stands without its tests.' };
const routes = { group: ['**/routes'], message: 'A route is an end: nobody imports it.' };

/** A file of the engine, so many folders below it, imports the engine and at most one package. */
function pureEngine(folders, files, allowed, message) {
	const packages = { regex: `^(?!\\.{1,2}(?:/|$))(?!(?:${allowed})$)`, message };
	const out = { regex: `^\\.\\.(?:/\\.\\.){${folders}}(?:/|$)`, message: 'The engine imports nothing but itself.' };
	return { files, rules: ban(packages, out) };
}
/** The rule above does not see `import()`; where something must stay out, so must that. */
const noDynamic = {
	'no-restricted-syntax': [
		'error',
		{ selector: 'ImportExpression', message: 'Import at the top, where the boundaries are kept.' }
	]
};

export default ts.config(
	{ ignores: ['.svelte-kit/', 'build/', '.evendraft/', 'node_modules/', 'static/'] },
	js.configs.recommended,
	...ts.configs.recommended,
	...svelte.configs.recommended,
	prettier,
	...svelte.configs.prettier,
	{
		languageOptions: { globals: { ...globals.browser, ...globals.node } },
		rules: {
			'no-undef': 'off',
			'no-console': 'error',
			'svelte/no-navigation-without-resolve': 'off',
			// State holds plain values that are replaced whole, never changed in place.
			'svelte/prefer-svelte-reactivity': 'off',
			'@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }]
		}
	},
	{ files: ['**/*.svelte', '**/*.svelte.ts'], languageOptions: { parserOptions: { parser: ts.parser } } },
	{ files: ['scripts/**', 'tests/**'], rules: { 'no-console': 'off' } },
	{ files: ['src/**/*.{ts,svelte}'], rules: { ...ban(engine, tests, routes), ...noDynamic } },
	{
		// What a thread starts on has to be a file of its own, and only this makes the build give it one.
		files: ['src/lib/server/pdf/print-report.ts'],
		rules: {
			'no-restricted-syntax': [
				'error',
				{
					selector: "ImportExpression[source.value!='./print-worker']",
					message: 'Only the file that a thread starts on.'
				}
			]
		}
	},
	{
		files: ['src/lib/components/**/*.{ts,svelte}', 'src/routes/**/*.{ts,svelte}'],
		rules: ban(engine, server, sql, tests, routes)
	},
	{
		files: ['src/lib/{report,drawing,methods,schemas}/**/*.ts'],
		rules: ban(engine, server, sql, screen, tests, routes)
	},
	// Runes stand in files that are named like components.
	{ files: ['src/lib/sheet/**/*.ts'], rules: ban(engine, server, sql, components, tests, routes) },
	{ files: ['src/routes/**/*server.ts', 'src/hooks.server.ts'], rules: ban(engine, sql, tests, routes) },
	{ files: ['src/lib/server/**/*.ts'], rules: ban(engine, screen, tests, routes) },
	pureEngine(0, ['src/lib/engine/*.ts'], '', 'The engine is pure: no package here.'),
	pureEngine(1, ['src/lib/engine/*/*.ts'], '', 'The engine is pure: no package here.'),
	pureEngine(2, ['src/lib/engine/*/*/**/*.ts'], '', 'The engine is pure: no package here.'),
	pureEngine(1, ['src/lib/engine/document/*.ts'], 'zod', 'Only zod is allowed in the document room.'),
	pureEngine(1, ['src/lib/engine/quantity/*.ts'], 'decimal\\.js', 'Only decimal.js is allowed in the quantity room.'),
	// Unit tests read fixtures and use test libraries, and may open any room they stand beside.
	{ files: ['src/**/*.test.ts'], rules: { 'no-restricted-imports': 'off', 'no-restricted-syntax': 'off' } }
);
