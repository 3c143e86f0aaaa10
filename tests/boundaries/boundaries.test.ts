import { ESLint } from 'eslint';
import { describe, expect, it } from 'vitest';

const eslint = new ESLint();
const script = (text: string) => `<script lang="ts">${text}</script>`;

/** Which boundary rules speak up when a file holds this text. Files that are skipped say so. */
async function refusals(filePath: string, text: string): Promise<string[]> {
	const [result] = await eslint.lintText(filePath.endsWith('.svelte') ? script(text) : text, { filePath });
	const messages = result?.messages ?? [{ ruleId: null, message: 'not linted' }];
	return messages
		.filter(({ ruleId }) => ruleId === null || /no-restricted-(imports|syntax)/.test(ruleId))
		.map(({ ruleId, message }) => ruleId ?? message);
}

const component = 'src/lib/components/site/X.svelte';
const componentRunes = 'src/lib/components/site/x.svelte.ts';
const sheet = 'src/lib/sheet/x.ts';
const sheetParts = 'src/lib/sheet/parts/x.ts';
const page = 'src/routes/(app)/designs/[designId]/+page.svelte';
const pageLoad = 'src/routes/(app)/designs/[designId]/+page.ts';
const besidePage = 'src/routes/(app)/designs/[designId]/x.ts';
const pageServer = 'src/routes/(app)/designs/[designId]/+page.server.ts';
const endpoint = 'src/routes/api/v1/x/+server.ts';
const useCase = 'src/lib/server/designs/x.ts';
const report = 'src/lib/report/x.ts';
const schema = 'src/lib/schemas/x.ts';
const engine = 'src/lib/engine/x.ts';
const room = 'src/lib/engine/air/x.ts';
const deepRoom = 'src/lib/engine/air/deep/x.ts';
const documentRoom = 'src/lib/engine/document/x.ts';
const quantityRoom = 'src/lib/engine/quantity/x.ts';

const forbidden: readonly (readonly [string, string])[] = [
	// The engine imports nothing but itself.
	...[engine, room, deepRoom, documentRoom, quantityRoom].flatMap((file) =>
		[
			'drizzle-orm',
			'svelte',
			'node:fs',
			'fs',
			'papaparse',
			'$lib/sheet/sheet',
			'$lib/engine',
			'$lib/server/db',
			'$app/environment',
			'$env/static/private'
		].map((from) => [file, `import '${from}';`] as const)
	),
	[engine, `import '../sheet/sheet';`],
	[engine, `import '../schemas/basis';`],
	[engine, `import '../../routes/x';`],
	[engine, `import '..';`],
	[room, `import '../../sheet/sheet';`],
	[room, `import '../../sheet';`],
	[room, `import '../../schemas/basis';`],
	[room, `import '../../report/index';`],
	[room, `import '../../server/db';`],
	[room, `import '../../../routes/x';`],
	[room, `import '../../..';`],
	[room, `export * from '../../sheet/sheet';`],
	[room, `import type { Sheet } from '../../sheet/sheet'; export type X = Sheet;`],
	[room, `export const x = import('../../sheet/sheet');`],
	[room, `export const x = import('node:fs');`],
	[deepRoom, `import '../../../sheet/sheet';`],
	[engine, `import 'zod';`],
	[room, `import 'zod';`],
	[quantityRoom, `import 'zod';`],
	[documentRoom, `import 'zod/v4/core';`],
	[engine, `import 'decimal.js';`],
	[room, `import 'decimal.js';`],
	[documentRoom, `import 'decimal.js';`],
	[documentRoom, `import '../../schemas/basis';`],
	[quantityRoom, `import '../../sheet/sheet';`],

	// What runs in the browser knows neither the server, nor the database, nor the inside of the engine.
	...[component, componentRunes, sheet, sheetParts, page, pageLoad, besidePage].flatMap((file) =>
		[
			'$lib/server/db',
			'$lib/server/designs/load-sheet',
			'$env/static/private',
			'$env/dynamic/private',
			'drizzle-orm',
			'drizzle-orm/pg-core',
			'postgres',
			'$lib/engine/errors',
			'$lib/engine/network',
			'$lib/engine/network/solve',
			'$lib/engine/index'
		].map((from) => [file, `import '${from}';`] as const)
	),
	[sheet, `import '../server/db';`],
	[sheetParts, `import '../../engine/errors';`],
	[component, `import '../../engine/errors';`],
	[component, `import type { Tx } from '$lib/server/db'; export type X = Tx;`],
	[component, `export const x = import('$lib/server/db');`],
	[page, `export const x = import('drizzle-orm');`],
	[sheet, `import '$lib/components/site/Link.svelte';`],
	[sheet, `import '../components/air-words';`],
	['src/lib/sheet/x.svelte.ts', `import '../components/air-words';`],

	// The server does not know the screen; routes do not know the database.
	[useCase, `import '$lib/components/site/Link.svelte';`],
	[useCase, `import '$lib/components/air-words';`],
	[useCase, `import '../../components/air-words';`],
	[useCase, `import '../../engine/network/solve';`],
	[useCase, `import '../../../routes/x';`],
	...[pageServer, endpoint, 'src/hooks.server.ts'].flatMap((file) =>
		['drizzle-orm', 'drizzle-orm/pg-core', 'postgres', '$lib/server/db/schema', '$lib/engine/network'].map(
			(from) => [file, `import '${from}';`] as const
		)
	),
	...[report, schema].flatMap((file) =>
		['$lib/server/db', 'drizzle-orm', '$lib/components/site/Link.svelte', '$lib/engine/network'].map(
			(from) => [file, `import '${from}';`] as const
		)
	),

	// Nobody knows the tests.
	...[component, sheet, page, pageServer, useCase, report, 'src/hooks.server.ts'].flatMap((file) => [
		[file, `import '../../../tests/sheet/any-sheet';`] as const,
		[file, `import '../../../fixtures/published/air.json';`] as const
	]),
	[room, `import '../../../../tests/engine/any-design';`],
	[room, `import '../../../../fixtures/published/air.json';`]
];

const allowed: readonly (readonly [string, string])[] = [
	[engine, `import './errors';`],
	[engine, `import './network/solve';`],
	[room, `import '../errors';`],
	[room, `import '../fitting';`],
	[room, `import './air-state';`],
	[deepRoom, `import '../../errors';`],
	[deepRoom, `import '../../fitting/catalogue';`],
	[documentRoom, `import 'zod';`],
	[documentRoom, `import { z } from 'zod'; export type X = z.ZodType;`],
	[quantityRoom, `import 'decimal.js';`],
	[component, `import '$lib/engine';`],
	[component, `import '$lib/sheet/sheet'; import './Link.svelte'; import '@tanstack/svelte-table';`],
	[componentRunes, `import '$lib/engine';`],
	[sheet, `import '$lib/engine'; import './server-reply'; import 'zod';`],
	[sheetParts, `import '$lib/engine'; import '../sheet';`],
	['src/lib/sheet/x.svelte.ts', `import './outbox.svelte'; import '$lib/engine';`],
	[page, `import '$lib/components/site/Link.svelte'; import '$lib/sheet/sheet'; import '$app/state';`],
	[pageLoad, `import '$lib/engine';`],
	[pageServer, `import '$lib/server/designs/load-sheet'; import '$lib/schemas/basis'; import '$lib/engine';`],
	[endpoint, `import '$lib/server/http/problem'; import '$lib/sheet/edit';`],
	[useCase, `import 'drizzle-orm'; import '../db/schema'; import '$lib/engine'; import '$lib/sheet/apply';`],
	[report, `import '$lib/engine'; import './input';`],
	[schema, `import 'zod'; import '$lib/sheet/fields';`],
	['src/lib/sheet/x.test.ts', `import '../../../tests/sheet/any-sheet'; import 'fast-check';`],
	['src/lib/engine/air/x.test.ts', `import '../../../../fixtures/published/air.json'; import 'vitest';`]
];

describe('a boundary', { timeout: 30_000 }, () => {
	it.each(forbidden)('keeps %s from %s', async (file, text) => {
		const found = await refusals(file, text);
		expect(found).not.toEqual([]);
		for (const rule of found) expect(rule).toMatch(/no-restricted/);
	});

	it.each(allowed)('lets %s do %s', async (file, text) => expect(await refusals(file, text)).toEqual([]));
});
