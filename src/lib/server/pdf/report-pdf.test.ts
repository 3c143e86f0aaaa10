import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs';
import { describe, expect, it } from 'vitest';
import type { DesignDocument } from '$lib/engine';
import { reportOf, type Report } from '$lib/report';
import { inputOf, library, treeOf } from '$lib/report/sample-input';
import { definitionOf } from './definition';
import { face, NARROW, SANS, STRONG, type Family } from './fonts';
import { sheetOf } from './paper';
import { reportPdf } from './report-pdf';

const PRINTED = new Date('2026-11-24T09:05:00.000Z');
/** What engineers and rooms may be called; the last ones no face has. */
const HARD =
	'Ø315 √∑≤≥≈→ ²³ αβγδεζηθλμνξπρστφχψωΔΣΩ – − ± × · ½ 45° ′ ″ ⌀ ′1\u2009200\u202fL/s Зал Żółć 読書室 \u202e🏛';

interface Text {
	readonly text: string;
	readonly font: Family;
	readonly bold: boolean;
}

/** Every text of a document definition with the face in which it is set, feet of pages included. */
function textsOf(definition: ReturnType<typeof definitionOf>): Text[] {
	const found: Text[] = [];
	const walk = (node: unknown, font: Family, bold: boolean): void => {
		if (typeof node === 'string') found.push({ text: node, font, bold });
		else if (Array.isArray(node)) node.forEach((one) => walk(one, font, bold));
		else if (typeof node === 'object' && node !== null) {
			const one = node as Record<string, unknown>;
			const own = (one.font as Family | undefined) ?? font;
			const weight = (one.bold as boolean | undefined) ?? bold;
			for (const key of ['text', 'stack', 'columns', 'section', 'content']) walk(one[key], own, weight);
			walk((one.table as { body?: unknown } | undefined)?.body, own, weight);
			if (typeof one.footer === 'function') walk(one.footer(1, 12), own, weight);
		}
	};
	walk(definition.content, SANS, false);
	return found;
}

function missing(report: Report): string[] {
	return textsOf(definitionOf(report, PRINTED)).flatMap(({ text, font, bold }) =>
		[...text].filter((one) => one !== '\n' && !face(font, bold ? 'bold' : 'normal').has(one.codePointAt(0) ?? 0))
	);
}

interface Page {
	readonly width: number;
	readonly height: number;
	readonly text: string;
	/** How far below the upper edge the lowest of the words of a text stands [pt]; Infinity where one is missing. */
	readonly lowest: (text: string) => number;
}

async function pagesOf(pdf: Buffer): Promise<Page[]> {
	const task = getDocument({ data: new Uint8Array(pdf), useSystemFonts: false, isEvalSupported: false, verbosity: 0 });
	const document = await task.promise;
	const pages: Page[] = [];
	for (let number = 1; number <= document.numPages; number += 1) {
		const page = await document.getPage(number);
		const { width, height } = page.getViewport({ scale: 1 });
		const { items } = await page.getTextContent();
		const text = items.map((item) => ('str' in item ? item.str + (item.hasEOL ? ' ' : '') : '')).join('');
		const placed = items.flatMap((item) => ('str' in item && item.str.trim() ? [item] : []));
		const lowest = (wanted: string) => {
			const found = placed.filter(({ str }) => wanted.includes(str) && str.length > 3);
			return found.length ? Math.max(...found.map(({ transform }) => height - Number(transform[5]))) : Infinity;
		};
		pages.push({ width, height, text: text.replace(/[\s\u00a0]+/g, ' '), lowest });
	}
	await task.destroy();
	return pages;
}

describe('glyphs', () => {
	const hard: DesignDocument = {
		...library,
		rows: library.rows.map((row) => ({ ...row, serves: HARD }))
	};

	it('are there for every character of every text, in the face in which it is set', () => {
		for (const units of ['SI', 'IP'] as const)
			for (const document of [library, hard]) {
				const report = reportOf(inputOf(document, { units }));
				expect(missing({ ...report, heading: { ...report.heading, title: HARD } })).toEqual([]);
			}
	});

	it('would be missed by the condensed face alone', () => {
		expect(face(NARROW, 'normal').has('≤'.codePointAt(0) ?? 0)).toBe(false);
		expect(face(STRONG, 'normal').has('≤'.codePointAt(0) ?? 0)).toBe(true);
	});
});

describe('the definition', () => {
	it('is the same for the same report', () => {
		const report = reportOf(inputOf(library));
		const text = () => JSON.stringify(definitionOf(report, PRINTED));
		expect(text()).toBe(text());
	});
});

describe('the file', () => {
	it('tells stamp, duty, index path, cautions and page x of y', async () => {
		const input = inputOf(library);
		const report = reportOf(input);
		const pages = await pagesOf(await reportPdf(report));
		const [cover] = pages;
		expect(cover?.text).toContain('ISSUED FOR REVIEW');
		expect(cover?.text).toContain('NOT FOR CONSTRUCTION');
		expect(cover?.text).toContain('Left empty by the program. Nothing printed here is a seal or certification.');
		expect(cover?.text).toContain('7c1e 04bd 55a2 9f30');
		expect(cover?.text).toContain(`${report.result.cells[0]?.value} Pa`);
		pages.forEach(({ text }, place) => {
			expect(text).toContain(`${place + 1} of ${pages.length}`);
			expect(text).toContain('Calculation aid. Results need review by a licensed professional; local codes govern.');
		});
		const all = pages.map(({ text }) => text).join(' ');
		for (const { rows } of [report.schedule]) for (const { tag } of rows) expect(all).toContain(tag);
		expect(all).toContain('index path first');
		expect(all).toContain('α–ω');
	});

	it('is the same, byte for byte, when printed again', async () => {
		const report = reportOf(inputOf(library));
		expect((await reportPdf(report)).equals(await reportPdf(report))).toBe(true);
	});

	it.each([
		['A4', 595, 842],
		['Letter', 612, 792],
		['A3', 1191, 842],
		['Tabloid', 1224, 792]
	] as const)('stands on %s', async (paper, width, height) => {
		const pages = await pagesOf(await reportPdf(reportOf(inputOf(library, { paper }))));
		expect([Math.round(pages[0]?.width ?? 0), Math.round(pages[0]?.height ?? 0)]).toEqual([width, height]);
		const schedule = pages.find(({ text }) => text.startsWith('Duct schedule'));
		expect(schedule && schedule.width > schedule.height).toBe(true);
	});

	it.each(['A4', 'Letter', 'A3', 'Tabloid'] as const)(
		'has a cover of one page on %s, its line of verification clear of the title block',
		async (paper) => {
			for (const units of ['SI', 'IP'] as const) {
				const input = inputOf(library, { paper, units });
				const [first] = input.revisions;
				const revisions = ['P03', 'P02', 'P01'].map((revision) => ({ ...first!, revision }));
				const report = reportOf({ ...input, revisions });
				const pages = await pagesOf(await reportPdf(report));
				expect(pages[0]?.text).toContain('Basis of design');
				expect(pages[1]?.text.startsWith('Checks')).toBe(true);
				const { code, line } = report.verification;
				expect(pages[0]?.lowest(code ?? '')).toBeLessThan(sheetOf(paper, 'text').blockTop);
				expect(pages[0]?.lowest(line)).toBeLessThan(sheetOf(paper, 'text').blockTop);
			}
		}
	);

	it('repeats the heads of the schedule on each of its pages, and loses no row of a long one', async () => {
		const report = reportOf(inputOf(treeOf(90)));
		const pages = await pagesOf(await reportPdf({ ...report, ledger: { ...report.ledger, accounts: [] }, parts: [] }));
		const schedule = pages.filter(({ text }) => text.includes('Vel. pr.') && text.includes('Joins'));
		expect(schedule.length).toBeGreaterThan(2);
		const tags = new Set(schedule.flatMap(({ text }) => text.split(' ')));
		for (const { tag } of report.schedule.rows) expect(tags).toContain(tag);
	});

	it('keeps the order of the pages when names and notes are long', async () => {
		const long = 'W'.repeat(60);
		const input = inputOf({ ...library, rows: library.rows.map((row) => ({ ...row, serves: long })) });
		const note = 'A long note about what changed and why, told in full. '.repeat(9);
		const report = reportOf({
			...input,
			heading: { ...input.heading, firm: long, projectName: long, system: long, client: long },
			revisions: Array.from({ length: 9 }, (_, place) => ({ ...input.revisions[0]!, revision: `P0${9 - place}`, note }))
		});
		const pages = await pagesOf(await reportPdf(report));
		const firsts = ['Checks', 'Duct schedule', 'Paths and ledger', 'Parts of each section', 'Fan duty'].map((name) =>
			pages.findIndex(({ text }) => text.startsWith(name))
		);
		expect(firsts.every((place) => place > 0)).toBe(true);
		expect(firsts).toEqual([...firsts].sort((a, b) => a - b));
	});
});
