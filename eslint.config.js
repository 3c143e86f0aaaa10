import prettier from 'eslint-config-prettier';
import js from '@eslint/js';
import svelte from 'eslint-plugin-svelte';
import globals from 'globals';
import ts from 'typescript-eslint';

/** One rule, several patterns: `no-restricted-imports` does not merge, so each block lists all that holds for it. */
const ban = (...patterns) => ({ 'no-restricted-imports': ['error', { patterns }] });

const engine = { group: ['**/engine/*'], message: 'Import $lib/engine, its only door.' };
const server = { group: ['**/server/**', '$env/*/private'], message: 'Get server data from load() or the API.' };
const sql = { group: ['drizzle-orm', 'drizzle-orm/*', 'postgres', '**/db/schema'], message: 'Call a use case.' };
const screen = { group: ['**/components/**', '**/*.svelte'], message: 'The server does not know the screen.' };
const tests = { group: ['**/tests/**', '**/fixtures/**'], message: 'The product stands without its tests.' };
const pure = (allowed, message) => ({ regex: `^(?!\\.{1,2}/)(?!(?:${allowed})$)`, message });
const inward = { regex: '^\\.\\./\\.\\./\\.\\./(?!engine)', message: 'The engine imports nothing but itself.' };
const outOfEngine = {
	group: ['**/server/**', '**/sheet/**', '**/components/**', '**/report/**', '$lib/**'],
	message: 'The engine imports nothing but itself.'
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
	{ files: ['src/**/*.{ts,svelte}'], rules: ban(engine, tests) },
	{
		files: [
			'src/lib/components/**/*.{ts,svelte}',
			'src/lib/sheet/**/*.{ts,svelte}',
			'src/routes/**/*.svelte',
			'src/routes/**/+{page,layout}.ts'
		],
		rules: ban(engine, server, sql, tests)
	},
	{ files: ['src/lib/{report,drawing,schemas}/**/*.ts'], rules: ban(engine, server, sql, screen, tests) },
	{ files: ['src/routes/**/*server.ts', 'src/hooks.server.ts'], rules: ban(engine, sql, tests) },
	{ files: ['src/lib/server/**/*.ts'], rules: ban(engine, screen, tests) },
	{
		files: ['src/lib/engine/**/*.ts'],
		rules: ban(pure('', 'The engine is pure: no package here.'), inward, outOfEngine)
	},
	{
		files: ['src/lib/engine/document/**/*.ts'],
		rules: ban(pure('zod', 'Only zod is allowed in the document room.'), inward, outOfEngine)
	},
	{
		files: ['src/lib/engine/quantity/**/*.ts'],
		rules: ban(pure('decimal\\.js', 'Only decimal.js is allowed in the quantity room.'), inward, outOfEngine)
	},
	// Unit tests read fixtures and use test libraries, and may open any room they stand beside.
	{ files: ['src/**/*.test.ts'], rules: { 'no-restricted-imports': 'off' } }
);
