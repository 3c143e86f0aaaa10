import { createHash, randomUUID } from 'node:crypto';
import { readFileSync } from 'node:fs';
import postgres from 'postgres';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { canonicalText, ENGINE_VERSION, solveDesign } from '../../src/lib/engine';
import type { FirmScope } from '../../src/lib/server/auth/scope';
import { changeDesign } from '../../src/lib/server/designs/change-design';
import { openDesign } from '../../src/lib/server/designs/find-design';
import { reportOfSheet, reportOfVersion } from '../../src/lib/server/versions/report-of';
import { listRegister } from '../../src/lib/server/projects/projects';
import { putBack, restoreVersion } from '../../src/lib/server/versions/restore-version';
import { saveVersion } from '../../src/lib/server/versions/save-version';
import { listVersions, openVersion } from '../../src/lib/server/versions/versions';
import { ORIGIN } from './support/browser';
import { freshDatabase, type TestDatabase } from './support/database';
import { append, emptyDesign, firm, logOf, rowsOf, sent, treeDesign, write } from './support/designs';

let made: TestDatabase;
let ours: FirmScope;
let theirs: FirmScope;
beforeAll(async () => {
	Object.assign(process.env, { AUTH_URL: ORIGIN, AUTH_SECRET: 'a secret for tests alone, 32 or more' });
	made = await freshDatabase();
	[ours, theirs] = await Promise.all([firm('ours@example.test'), firm('theirs@example.test')]);
});
afterAll(() => made?.drop());

const NOTE = { note: 'first issue', status: 'work-in-progress' as const };
const save = (designId: string, note = NOTE.note) => saveVersion(ours, designId, { ...NOTE, note });
const version = async (designId: string, number: number) => {
	const found = await openVersion(ours, designId, number);
	if (!found) throw new Error(`there is no version ${number}`);
	return found;
};
const sheetOf = async (designId: string) => (await openDesign(ours, designId))?.sheet;

describe('a version', () => {
	it('is numbered P01, P02 and on, listed newest first, and keeps sheet, document, figures and hash', async () => {
		const { designId, ids } = await treeDesign(ours);
		expect(await save(designId)).toMatchObject({ ok: true, number: 1, revision: 'P01' });
		await append(ours, designId, [sent(write(ids[2] ?? '', 'length', '14'))]);
		expect(await save(designId, 'longer')).toMatchObject({ ok: true, number: 2, revision: 'P02' });
		const lines = await listVersions(ours, designId);
		expect(lines.map(({ revision, note, seq, by }) => [revision, note, seq, by])).toEqual([
			['P02', 'longer', 3, 'Some Person'],
			['P01', 'first issue', 2, 'Some Person']
		]);
		const [first, second] = [await version(designId, 1), await version(designId, 2)];
		expect(second.sheet).toEqual(await sheetOf(designId));
		expect(first.document.rows[2]?.length).toBe(12);
		expect(second.document.rows[2]?.length).toBe(14);
		expect(first.heading).toMatchObject({ name: 'AHU-1', projectName: 'Library', firm: 'Firm of Some Person' });
		expect(first.sha256).not.toBe(second.sha256);
	});

	it('has for its hash the SHA-256 of its canonical content, computed anew from what is stored', async () => {
		const { designId } = await treeDesign(ours);
		const saved = await save(designId);
		const { document, solution, engineVersion, sha256 } = await version(designId, 1);
		const text = canonicalText({ document, solution, engineVersion });
		expect(createHash('sha256').update(text, 'utf8').digest('hex')).toBe(sha256);
		expect(saved).toMatchObject({ sha256 });
		const altered = canonicalText({ document: { ...document, title: 'altered' }, solution, engineVersion });
		expect(createHash('sha256').update(altered, 'utf8').digest('hex')).not.toBe(sha256);
	});

	it('keeps the names of its title block when the design is renamed', async () => {
		const { designId } = await treeDesign(ours);
		await save(designId);
		expect(await changeDesign(ours, designId, { name: 'AHU-9' })).toBe('done');
		expect((await version(designId, 1)).heading.name).toBe('AHU-1');
		expect((await openDesign(ours, designId))?.heading.name).toBe('AHU-9');
	});

	it('never changes: the database refuses it to the application and to the owner of the tables', async () => {
		const { designId } = await treeDesign(ours);
		await save(designId);
		const before = await version(designId, 1);
		const owner = postgres(made.ownerUrl, { max: 1, onnotice: () => {} });
		const app = postgres(process.env.DATABASE_URL ?? '', { max: 1, onnotice: () => {} });
		try {
			for (const [sql, code] of [
				[owner, '23001'],
				[app, '42501']
			] as const)
				for (const statement of [
					"update version set note = 'other'",
					"update version set solution = '{}'",
					'delete from version'
				])
					await expect(
						sql.begin(async (tx) => {
							await tx`select set_config('app.firm_id', ${ours.firmId}, true)`;
							await tx.unsafe(statement);
						})
					).rejects.toMatchObject({ code });
		} finally {
			await Promise.all([owner.end(), app.end()]);
		}
		expect(await version(designId, 1)).toEqual(before);
	});
});

describe('a sheet that does not stand whole', () => {
	it.each([
		['a cell that is not understood', 'size', '24xx12'],
		['an end without a flow', 'flow', ''],
		['a ring', 'joins', 'S2'],
		['a row that joins none there is', 'joins', 'S9']
	] as const)('with %s is not saved', async (_what, field, typed) => {
		const { designId, ids } = await treeDesign(ours);
		await append(ours, designId, [sent(write(ids[1] ?? '', field, typed))]);
		const refused = await save(designId);
		expect(refused).toMatchObject({ ok: false, reason: 'incomplete' });
		expect(!refused.ok && refused.reason === 'incomplete' && refused.solved.problems.length).toBeGreaterThan(0);
		expect(await listVersions(ours, designId)).toEqual([]);
	});

	it('is not saved empty', async () => {
		const designId = await emptyDesign(ours);
		expect(await save(designId)).toMatchObject({ ok: false, reason: 'incomplete' });
	});
});

describe('versions that are saved at the same time', () => {
	it('get numbers of their own, without a gap', async () => {
		const { designId } = await treeDesign(ours);
		const saved = await Promise.all(Array.from({ length: 8 }, (_, at) => save(designId, `copy ${at}`)));
		expect(saved.map((one) => one.ok && one.number).sort()).toEqual([1, 2, 3, 4, 5, 6, 7, 8]);
		expect((await listVersions(ours, designId)).at(0)?.revision).toBe('P08');
	});

	it('as edits are made, hold the sheet as it stood after the entry that they name', async () => {
		const { designId, ids } = await treeDesign(ours);
		const edits = Array.from({ length: 12 }, (_, at) =>
			append(ours, designId, [sent(write(ids[0] ?? '', 'length', `${at + 1}`))])
		);
		await Promise.all([...edits, ...Array.from({ length: 4 }, () => save(designId))]);
		const log = await logOf(ours, designId);
		for (const { number, seq } of await listVersions(ours, designId)) {
			const last = log.filter((row) => row.seq <= seq && row.seq > 2).at(-1)?.entry as
				{ cell: { typed: string } } | undefined;
			expect((await version(designId, number)).sheet.rows[0]?.cells.length?.typed).toBe(last?.cell.typed ?? '8');
		}
	});
});

describe('the engine', () => {
	interface Demo {
		designs: { name: string; settings: Record<string, string>; rows: Record<string, string>[] }[];
	}
	const demo = JSON.parse(readFileSync('fixtures/demo/larkmoor.json', 'utf8')) as Demo;

	/** A saved design of each kind that there is at hand, told by what it holds. */
	const designs = [
		...demo.designs.map(({ name, settings, rows }) => ({ name, settings, rows })),
		{
			name: 'air that is warm and high, with a riser',
			settings: { temperature: '41.5', humidity: '63 %', elevation: '1234 m', surroundings: '-7', flexFactor: '3.7' },
			rows: [
				{ tag: 'R1', size: '17.5"x9.375"', length: '33\'-4 1/2"', rise: '11.3', parts: '3x elbow r1.5, damper' },
				{ tag: 'R2', joins: 'R1', size: '7"', length: '9.87654321', flow: '123.456', flex: '1.1', outlet: '0.07"' },
				{ tag: 'R3', joins: 'R1', size: '153.7', length: '3', flow: '77.7 cfm', outlet: '13 static' }
			]
		}
	];

	it.each(designs)('reproduces the stored figures of $name to the last bit', async ({ name, settings, rows }) => {
		const designId = await emptyDesign(ours, name);
		const set = Object.entries(settings).map(([field, typed]) => sent(write(null, field, typed)));
		const done = await append(ours, designId, [...set, sent(rowsOf(rows).edit)]);
		expect(done.solved.problems).toEqual([]);
		expect(await save(designId)).toMatchObject({ ok: true });
		const { document, solution, engineVersion } = await version(designId, 1);
		expect(engineVersion).toBe(ENGINE_VERSION);
		const again = solveDesign(document);
		expect(again.ok && canonicalText(again.solution)).toBe(canonicalText(solution));
	});
});

describe('a version that is restored', () => {
	it('is what the sheet stands as until the next edit, as is a version whose own edit is put back', async () => {
		const { designId, ids } = await treeDesign(ours);
		const stands = async () => {
			const head = (await openDesign(ours, designId))?.seq;
			const [project] = (await listRegister(ours, 'current')).filter(({ designs }) =>
				designs.some((one) => one.designId === designId)
			);
			const inRegister = project?.designs.find((one) => one.designId === designId);
			const told = (await listVersions(ours, designId)).filter(({ standsAt }) => standsAt === head);
			expect(inRegister?.revisions.filter(({ standsAt }) => standsAt === inRegister.headSeq)).toHaveLength(told.length);
			return told.map(({ revision }) => revision);
		};
		await save(designId);
		expect(await stands()).toEqual(['P01']);
		await append(ours, designId, [sent(write(ids[0] ?? '', 'length', '31'))]);
		expect(await stands()).toEqual([]);
		await save(designId, 'longer');
		expect(await stands()).toEqual(['P02']);
		await restoreVersion(ours, designId, 1);
		expect(await stands()).toEqual(['P01']);
		await putBack(ours, designId, 3);
		expect(await stands()).toEqual(['P02']);
		await append(ours, designId, [sent(write(ids[0] ?? '', 'length', '32'))]);
		expect(await stands()).toEqual([]);
	});

	it('gives the same document when saved again, as one more entry of the log', async () => {
		const { designId, ids } = await treeDesign(ours);
		await save(designId);
		await append(ours, designId, [
			sent({ kind: 'delete', rows: [ids[2] ?? ''] }),
			sent(write(ids[0] ?? '', 'size', '24x12 in')),
			sent(write(null, 'elevation', '900 m'))
		]);
		expect(await save(designId)).toMatchObject({ ok: true, revision: 'P02' });
		expect(await restoreVersion(ours, designId, 1)).toEqual({ from: 'P01', before: 5 });
		expect(await save(designId)).toMatchObject({ ok: true, revision: 'P03' });
		const [first, second, third] = [await version(designId, 1), await version(designId, 2), await version(designId, 3)];
		expect(third.document).toEqual(first.document);
		expect(third.sheet).toEqual(first.sheet);
		expect(third.sha256).toBe(first.sha256);
		expect(second.sha256).not.toBe(first.sha256);
		const log = await logOf(ours, designId);
		expect(log.map(({ seq }) => seq)).toEqual([1, 2, 3, 4, 5, 6]);
		expect(log.at(-1)?.entry).toMatchObject({ kind: 'replace', from: 'P01' });
		// Rows are the same ones, so edits go on where they stood.
		await append(ours, designId, [sent(write(ids[2] ?? '', 'length', '15'))]);
		expect((await sheetOf(designId))?.rows[2]?.cells.length?.typed).toBe('15');
	});

	it('gives way again to what stood there before, whatever the log holds since', async () => {
		const { designId, ids } = await treeDesign(ours);
		await save(designId);
		await append(ours, designId, [sent({ kind: 'delete', rows: [ids[2] ?? ''] })]);
		const stood = await sheetOf(designId);
		const restored = await restoreVersion(ours, designId, 1);
		expect(await sheetOf(designId)).not.toEqual(stood);
		expect(await putBack(ours, designId, restored?.before ?? 0)).toEqual({ from: 'edit 3', before: 4 });
		expect(await sheetOf(designId)).toEqual(stood);
		expect(await putBack(ours, designId, 99)).toBeNull();
		expect((await logOf(ours, designId)).map(({ seq }) => seq)).toEqual([1, 2, 3, 4, 5]);
	});

	it('that does not exist restores nothing', async () => {
		const { designId } = await treeDesign(ours);
		expect(await restoreVersion(ours, designId, 7)).toBeNull();
		expect(await logOf(ours, designId)).toHaveLength(2);
	});
});

describe('an archived design', () => {
	it('is neither saved nor restored into, and shows its versions', async () => {
		const { designId } = await treeDesign(ours);
		await save(designId);
		await changeDesign(ours, designId, { archived: true });
		expect(await save(designId)).toEqual({ ok: false, reason: 'absent' });
		expect(await restoreVersion(ours, designId, 1)).toBeNull();
		expect(await version(designId, 1)).toMatchObject({ revision: 'P01' });
		expect(await logOf(ours, designId)).toHaveLength(2);
	});
});

describe("another firm's design", () => {
	it('has no versions, no report, and takes none', async () => {
		const { designId } = await treeDesign(ours);
		await save(designId);
		const print = { paper: 'A4' as const };
		expect(await listVersions(theirs, designId)).toEqual([]);
		expect(await openVersion(theirs, designId, 1)).toBeNull();
		expect(await reportOfSheet(theirs, designId, print, 'T')).toBeNull();
		expect(await reportOfVersion(theirs, designId, 1, print)).toBeNull();
		expect(await saveVersion(theirs, designId, NOTE)).toEqual({ ok: false, reason: 'absent' });
		expect(await restoreVersion(theirs, designId, 1)).toBeNull();
		expect(await putBack(theirs, designId, 2)).toBeNull();
		expect(await saveVersion(theirs, randomUUID(), NOTE)).toEqual({ ok: false, reason: 'absent' });
		expect(await reportOfVersion(ours, designId, 1, print)).not.toBeNull();
		expect(await listVersions(ours, designId)).toHaveLength(1);
		expect(await logOf(ours, designId)).toHaveLength(2);
	});
});
