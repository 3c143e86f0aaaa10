import { render } from 'svelte/server';
import { describe, expect, it } from 'vitest';
import { catalogue, checkList, ENGINE_VERSION, materials, NOT_SHOWN } from '$lib/engine';
import { familyNotes, publishedGroups } from '$lib/methods';
import { FORMULA_GROUPS } from './formulas';
import MethodsSheet from './MethodsSheet.svelte';

const families = familyNotes();
const published = Object.fromEntries(FORMULA_GROUPS.map(({ id }) => [id, publishedGroups(id)]));
const props = { families, published, materials, checks: checkList, notShown: NOT_SHOWN, engineVersion: ENGINE_VERSION };
const { body } = render(MethodsSheet, { props });

/** The article of an entry. */
function articleOf(key: string): string {
	const start = body.indexOf(`<article id="${key}"`);
	return start < 0 ? '' : body.slice(start, body.indexOf('</article>', start));
}

const textOf = (html: string) =>
	html
		.replace(/<!--.*?-->|<[^>]+>/g, '')
		.replace(/\s+/g, ' ')
		.trim();

describe('the method notes as a page', () => {
	it.each(catalogue.map(({ key }) => ({ key })))(
		'show $key: drawing, method, source, and check values or a word',
		({ key }) => {
			const article = articleOf(key);
			const entry = catalogue.find((one) => one.key === key);
			expect(article).toMatch(/<svg viewBox="0 0 340 /);
			const text = textOf(article).replaceAll('&amp;', '&');
			for (const words of [entry?.name ?? '?', entry?.method ?? '?', entry?.source ?? '?', entry?.caution ?? ''])
				expect(text).toContain(words);
			if (publishedGroups(key).length === 0)
				expect(text).toMatch(/No published worked figure was found|None: the coefficient/);
		}
	);

	it('put the figure of the source, ours and what is allowed side by side', () => {
		const rows = [...articleOf('sudden-expansion').matchAll(/<tr[^>]*>(.*?)<\/tr>/gs)].map(([, row = '']) =>
			[...row.matchAll(/<td[^>]*>(.*?)<\/td>/gs)].map(([, cell = '']) => textOf(cell))
		);
		// Borda & Carnot: (1 - 0.2)^2
		expect(rows).toContainEqual(['A₁/A₂ 0.2on V1 (smaller)', '0.64', '0.64', '±0.0001 %']);
	});

	it('list every check and every material', () => {
		for (const { key } of checkList) expect(body).toContain(`id="check-${key}"`);
		for (const { name } of materials) expect(body).toContain(name);
	});

	it('have an anchor for each link of the contents', () => {
		const links = [...body.matchAll(/<a[^>]* href="#([^"]+)"/g)].map(([, id]) => id);
		const ids = new Set([...body.matchAll(/ id="([^"]+)"/g)].map(([, id]) => id));
		expect(links.length).toBeGreaterThan(catalogue.length);
		expect(links.filter((id) => !ids.has(id ?? ''))).toEqual([]);
		expect(ids.size).toBe([...body.matchAll(/ id="([^"]+)"/g)].length);
	});

	it('stay light', () => expect(body.length).toBeLessThan(900_000));
});
