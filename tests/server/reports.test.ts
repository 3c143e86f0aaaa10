import { randomUUID } from 'node:crypto';
import Papa from 'papaparse';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { canonicalText, solveDesign, validateDocument } from '../../src/lib/engine';
import type { FirmScope } from '../../src/lib/server/auth/scope';
import { openDesign } from '../../src/lib/server/designs/find-design';
import { saveVersion } from '../../src/lib/server/versions/save-version';
import { solveSheet } from '../../src/lib/sheet/solve-sheet';
import { GET as documentJson } from '../../src/routes/api/v1/designs/[designId]/document.json/+server';
import { GET as sheetPdf } from '../../src/routes/api/v1/designs/[designId]/report.pdf/+server';
import { GET as scheduleCsv } from '../../src/routes/api/v1/designs/[designId]/schedule.csv/+server';
import { GET as versionPdf } from '../../src/routes/api/v1/designs/[designId]/versions/[number]/report.pdf/+server';
import { browser, ORIGIN, type Answer, type Browser } from './support/browser';
import { freshDatabase, type TestDatabase } from './support/database';
import { append, colleague, emptyDesign, firm, logOf, rowsOf, sent, treeDesign, write } from './support/designs';
import { signedIn } from './support/people';

let made: TestDatabase;
let ours: FirmScope;
let member: Browser;
let stranger: Browser;
beforeAll(async () => {
	Object.assign(process.env, { AUTH_URL: ORIGIN, AUTH_SECRET: 'a secret for tests alone, 32 or more' });
	made = await freshDatabase();
	ours = await firm('ours@example.test');
	await Promise.all([firm('theirs@example.test'), colleague(ours, 'viewer@example.test', 'viewer')]);
	[member, stranger] = await Promise.all([signedIn('viewer@example.test'), signedIn('theirs@example.test')]);
});
afterAll(() => made?.drop());

const FILES = {
	'report.pdf': sheetPdf,
	'schedule.csv': scheduleCsv,
	'document.json': documentJson,
	'versions/[number]/report.pdf': versionPdf
};
type Name = keyof typeof FILES;

function take(visitor: Browser, designId: string, name: Name, { query = '', number = '1' } = {}): Promise<Answer> {
	return visitor.ask({
		routeId: `/api/v1/designs/[designId]/${name}`,
		path: `/api/v1/designs/${designId}/${name.replace('[number]', number)}${query}`,
		params: { designId, ...(name.includes('[number]') && { number }) },
		run: FILES[name]
	});
}
const bytesOf = async (answer: Answer) => Buffer.from(await (answer.body as Response).arrayBuffer());
/** With its byte order mark, which a response reads away. */
const textOf = async (answer: Answer) => (await bytesOf(answer)).toString('utf8');
const save = (designId: string) => saveVersion(ours, designId, { note: 'first', status: 'issued-for-review' });

describe('the report as PDF', () => {
	it.each([
		['report.pdf', 'working-sheet'],
		['versions/[number]/report.pdf', 'P01']
	] as const)('%s is a whole PDF with a name of its own, not kept by anybody between', async (name, named) => {
		const { designId } = await treeDesign(ours);
		await save(designId);
		const answer = await take(member, designId, name);
		expect(answer.status).toBe(200);
		expect(answer.headers.get('content-type')).toBe('application/pdf');
		expect(answer.headers.get('cache-control')).toBe('private, no-store');
		expect(answer.headers.get('content-disposition')?.replaceAll(' ', '-')).toMatch(
			new RegExp(`^attachment;-filename="[0-9a-f]{8}-Library-AHU-1-${named}\\.pdf"`)
		);
		const bytes = await bytesOf(answer);
		expect(bytes.subarray(0, 5).toString('latin1')).toBe('%PDF-');
		expect(bytes.subarray(-8).toString('latin1')).toContain('%%EOF');
	});

	it('of a version stays as it was when the sheet goes on', async () => {
		const { designId, ids } = await treeDesign(ours);
		await save(designId);
		await append(ours, designId, [sent(write(ids[1] ?? '', 'size', '24xx12'))]);
		expect((await take(member, designId, 'versions/[number]/report.pdf')).status).toBe(200);
		expect((await take(member, designId, 'report.pdf')).status).toBe(422);
	});
});

describe('a file of a design', () => {
	it.each(Object.keys(FILES) as Name[])('%s is absent for another firm and closed for a stranger', async (name) => {
		const { designId } = await treeDesign(ours);
		await save(designId);
		for (const [visitor, of] of [
			[stranger, designId],
			[member, randomUUID()],
			[member, 'no-id']
		] as const) {
			const answer = await take(visitor, of, name);
			expect(answer.status).toBe(404);
			expect(answer.headers.get('content-type')).toBe('application/problem+json');
		}
		expect((await take(browser(), designId, name)).status).toBe(401);
		expect((await take(member, designId, name)).status).toBe(200);
	});

	it.each(['2', '0', '-1', '1.0', '1e20', '99999999999', 'P01'])('of version %s is absent', async (number) => {
		const { designId } = await treeDesign(ours);
		await save(designId);
		expect((await take(member, designId, 'versions/[number]/report.pdf', { number })).status).toBe(404);
	});

	it.each(['report.pdf', 'schedule.csv', 'document.json'] as const)(
		'%s is refused with a problem while the sheet does not stand whole or is empty',
		async (name) => {
			const { designId, ids } = await treeDesign(ours);
			await append(ours, designId, [sent(write(ids[1] ?? '', 'joins', 'S3'))]);
			for (const of of [designId, await emptyDesign(ours)]) {
				const answer = await take(member, of, name);
				expect(answer.status).toBe(422);
				expect(answer.headers.get('content-type')).toBe('application/problem+json');
			}
		}
	);

	it('takes what it does not know in its address for what a design says', async () => {
		const { designId } = await treeDesign(ours);
		const query = "?paper=A0&units=CGS&x='";
		expect((await take(member, designId, 'report.pdf', { query })).status).toBe(200);
		const csv = await textOf(await take(member, designId, 'schedule.csv', { query }));
		expect(csv).toContain('[L/s]');
	});

	it('writes nothing into the log', async () => {
		const { designId } = await treeDesign(ours);
		await save(designId);
		for (const name of Object.keys(FILES) as Name[]) await take(member, designId, name);
		expect(await logOf(ours, designId)).toHaveLength(2);
	});
});

describe('the document as JSON', () => {
	it("read and solved by itself gives the sheet's own figures to the last bit", async () => {
		const { designId } = await treeDesign(ours);
		await append(ours, designId, [sent(write(null, 'temperature', '31.5')), sent(write(null, 'mainVelocity', '6'))]);
		const text = await textOf(await take(member, designId, 'document.json'));
		const read = validateDocument(JSON.parse(text));
		if (!read.ok) throw new Error(read.problems[0]?.message);
		const solved = solveDesign(read.document);
		const own = solveSheet(
			(await openDesign(ours, designId))?.sheet ?? { format: 'evendraft/sheet@1', settings: {}, rows: [] }
		);
		expect(solved.ok && canonicalText(solved.solution)).toBe(canonicalText(own.solution));
		expect(solved.ok && Object.keys(solved.solution.rows)).toEqual(['S1', 'S2', 'S3']);
	});

	it('is the same byte for byte in SI and in IP: units change what is shown, not what is stored', async () => {
		const { designId } = await treeDesign(ours);
		const text = async () => textOf(await take(member, designId, 'document.json'));
		const before = await text();
		for (const units of ['IP', 'SI']) {
			await append(ours, designId, [sent(write(null, 'units', units))]);
			expect(await text()).toBe(before);
		}
	});
});

describe('the schedule as CSV', () => {
	async function tableOf(designId: string, query = ''): Promise<{ text: string; rows: Record<string, string>[] }> {
		const text = await textOf(await take(member, designId, 'schedule.csv', { query }));
		const { data, errors } = Papa.parse<Record<string, string>>(text.replace(/^\ufeff/, ''), {
			header: true,
			skipEmptyLines: true
		});
		expect(errors).toEqual([]);
		return { text, rows: data };
	}

	it('begins with the byte order mark, and has a line for each row with figures that programs read', async () => {
		const designId = await emptyDesign(ours);
		await append(ours, designId, [
			sent(rowsOf([{ tag: 'S1', size: '1200x600', length: '1234.5', flow: '3600', outlet: '20' }]).edit)
		]);
		const { text, rows } = await tableOf(designId);
		expect(text).toMatch(/^\ufeff[^\n]+\r\n/);
		expect(rows).toHaveLength(1);
		const [row = {}] = rows;
		const flow = Object.entries(row).find(([head]) => head.includes('[L/s]'));
		const length = Object.entries(row).find(([head]) => head.includes('[m]'));
		expect([flow?.[1], length?.[1]]).toEqual(['3600', '1234.5']);
	});

	it('writes a loss below zero with a hyphen, as a figure', async () => {
		const designId = await emptyDesign(ours);
		await append(ours, designId, [
			sent(write(null, 'temperature', '40')),
			sent(write(null, 'surroundings', '-10')),
			sent(rowsOf([{ tag: 'S1', size: '1200x1200', length: '60', rise: '60', flow: '200', outlet: '0' }]).edit)
		]);
		const { rows } = await tableOf(designId);
		const below = Object.values(rows[0] ?? {}).filter((cell) => cell.includes('-') && !cell.startsWith('S'));
		expect(below.length).toBeGreaterThan(0);
		for (const cell of below) expect(cell).toMatch(/^-\d+(\.\d+)?$/);
	});

	it.each(['=HYPERLINK("http://elsewhere.example")', '+1+1', '-1+cmd', '@SUM(A1)', '\t=1+1', '−2'])(
		'lets no program run %j as a formula',
		async (serves) => {
			const designId = await emptyDesign(ours);
			await append(ours, designId, [
				sent(rowsOf([{ tag: '=A1', serves, size: '300x200', length: '3', flow: '100', outlet: '20' }]).edit)
			]);
			const { rows } = await tableOf(designId);
			const cells = Object.values(rows[0] ?? {});
			expect(cells).toContain("'=A1");
			for (const cell of cells) expect(cell).not.toMatch(/^[=+@\t\r]|^-(?!\d+(\.\d+)?$)/);
		}
	);
});
