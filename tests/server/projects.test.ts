import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { FirmScope } from '../../src/lib/server/auth/scope';
import { appendEdits } from '../../src/lib/server/designs/append-edits';
import { changeDesign } from '../../src/lib/server/designs/change-design';
import { createDesign } from '../../src/lib/server/designs/create-design';
import { openDesign } from '../../src/lib/server/designs/find-design';
import {
	changeProject,
	createProject,
	findProject,
	listDesigns,
	listRegister
} from '../../src/lib/server/projects/projects';
import { saveVersion } from '../../src/lib/server/versions/save-version';
import { solveSheet } from '../../src/lib/sheet/solve-sheet';
import { actions as newProject } from '../../src/routes/(app)/projects/new/+page.server';
import { actions as projectPage } from '../../src/routes/(app)/projects/[projectId]/+page.server';
import { ORIGIN, type Browser } from './support/browser';
import { freshDatabase, type TestDatabase } from './support/database';
import { colleague, emptyDesign, firm, treeDesign } from './support/designs';
import { signedIn } from './support/people';

let made: TestDatabase;
let ours: FirmScope;
let theirs: FirmScope;
let viewer: Browser;
let engineer: Browser;
beforeAll(async () => {
	Object.assign(process.env, { AUTH_URL: ORIGIN, AUTH_SECRET: 'a secret for tests alone, 32 or more' });
	made = await freshDatabase();
	[ours, theirs] = await Promise.all([firm('ours@example.test'), firm('theirs@example.test')]);
	await Promise.all([
		colleague(ours, 'viewer@example.test', 'viewer'),
		colleague(ours, 'engineer@example.test', 'engineer')
	]);
	[viewer, engineer] = await Promise.all([signedIn('viewer@example.test'), signedIn('engineer@example.test')]);
});
afterAll(() => made?.drop());

const FIELDS = { name: 'Library', client: '', place: '', elevation_m: 250, units: 'IP' as const };
async function project(scope = ours, number: string = randomUUID().slice(0, 8)): Promise<string> {
	const done = await createProject(scope, { ...FIELDS, number });
	if (done === 'taken') throw new Error('the number was taken');
	return done.projectId;
}
const TYPED = { number: 'N-1', name: 'Library', client: '', place: '', elevation: '', units: 'SI' };

describe('a project', () => {
	it('is made, found, changed and archived by its firm', async () => {
		const projectId = await project();
		expect(await findProject(ours, projectId)).toMatchObject({ ...FIELDS, archivedAt: null });
		expect(await changeProject(ours, projectId, { name: 'Museum', elevation_m: 10 })).toBe('done');
		expect(await changeProject(ours, projectId, { archived: true })).toBe('done');
		expect(await findProject(ours, projectId)).toMatchObject({ name: 'Museum', archivedAt: expect.any(Date) });
	});

	it('has a number that no other project of the firm has, and another firm may have', async () => {
		const [, second] = [await project(ours, 'N-7'), await project(ours, 'N-8')];
		expect(await createProject(ours, { ...FIELDS, number: 'N-7' })).toBe('taken');
		expect(await changeProject(ours, second, { number: 'N-7' })).toBe('taken');
		expect(await project(theirs, 'N-7')).toMatch(/-/);
	});

	it('of another firm is absent for reading, changing, archiving and for a new design', async () => {
		const projectId = await project();
		expect(await findProject(theirs, projectId)).toBeNull();
		expect(await changeProject(theirs, projectId, { name: 'Taken' })).toBe('absent');
		expect(await changeProject(theirs, projectId, { archived: true })).toBe('absent');
		expect(await createDesign(theirs, { projectId, name: 'AHU-1', service: '' })).toBe('absent');
		expect(await listDesigns(theirs, projectId)).toEqual([]);
		expect((await listRegister(theirs, 'archived')).map((one) => one.projectId)).not.toContain(projectId);
		expect(await findProject(ours, projectId)).toMatchObject({ name: 'Library', archivedAt: null });
	});
});

describe('a design', () => {
	it('begins with the units and the elevation of its project; its title is its tag until one is typed', async () => {
		const projectId = await project();
		const done = await createDesign(ours, { projectId, name: 'AHU-1', service: 'Supply' });
		if (typeof done === 'string') throw new Error(done);
		const opened = await openDesign(ours, done.designId);
		const { settings, rows } = opened?.sheet ?? {};
		expect([settings?.units?.value, settings?.elevation?.value, settings?.title?.value]).toEqual([
			'IP',
			250,
			undefined
		]);
		expect(rows).toEqual([]);
		expect(opened?.seq).toBe(1);
	});

	it('takes no edits while its project is archived, and takes them again afterwards', async () => {
		const projectId = await project();
		const done = await createDesign(ours, { projectId, name: 'AHU-9', service: '' });
		if (typeof done === 'string') throw new Error(done);
		const edit = { kind: 'set', row: null, field: 'title', typed: 'Hall', units: 'SI' } as const;
		const send = () => appendEdits(ours, done.designId, 1, [{ id: randomUUID(), edit }]);
		await changeProject(ours, projectId, { archived: true });
		expect(await send()).toBeNull();
		await changeProject(ours, projectId, { archived: false });
		expect((await send())?.seq).toBe(2);
	});

	it('has a name of its own in its project, also when it is renamed', async () => {
		const projectId = await project();
		expect(await createDesign(ours, { projectId, name: 'AHU-1', service: '' })).not.toBe('taken');
		expect(await createDesign(ours, { projectId, name: 'AHU-1', service: '' })).toBe('taken');
		const other = await createDesign(ours, { projectId, name: 'AHU-2', service: '' });
		if (typeof other === 'string') throw new Error(other);
		expect(await changeDesign(ours, other.designId, { name: 'AHU-1' })).toBe('taken');
		expect((await listDesigns(ours, projectId)).map(({ name }) => name)).toEqual(['AHU-1', 'AHU-2']);
	});
});

describe('the register', () => {
	it('shows the figures of the solution and the revisions of each design, and nothing of another firm', async () => {
		const { designId } = await treeDesign(ours, 'AHU-7');
		const foreign = await emptyDesign(theirs, 'Foreign');
		await saveVersion(ours, designId, { note: 'one', status: 'issued-for-review' });
		const opened = await openDesign(ours, designId);
		const { solution } = solveSheet(opened?.sheet ?? { format: 'evendraft/sheet@1', settings: {}, rows: [] });
		const designs = (await listRegister(ours, 'current')).flatMap((one) => one.designs);
		const line = designs.find((one) => one.designId === designId);
		expect(line?.figures).toMatchObject({
			flow: solution?.fan.flow,
			totalPressure: solution?.fan.totalPressure,
			index: solution?.index.supply
		});
		expect(line?.revisions).toMatchObject([{ revision: 'P01', status: 'issued-for-review' }]);
		expect(designs.map((one) => one.designId)).not.toContain(foreign);
	});

	it('parts what is current from what is archived', async () => {
		const { designId } = await treeDesign(ours, 'AHU-8');
		const shown = async (show: 'current' | 'archived') =>
			(await listRegister(ours, show))
				.flatMap((one) => one.designs.map((design) => design.designId))
				.includes(designId);
		expect([await shown('current'), await shown('archived')]).toEqual([true, false]);
		await changeDesign(ours, designId, { archived: true });
		expect([await shown('current'), await shown('archived')]).toEqual([false, true]);
	});
});

describe('the forms of projects and designs', () => {
	const make = (visitor: Browser, form: Record<string, string>) =>
		visitor.ask({ routeId: '/(app)/projects/new', path: '/projects/new', form, run: newProject.default });
	const act = (visitor: Browser, projectId: string, action: keyof typeof projectPage, form: Record<string, string>) =>
		visitor.ask({
			routeId: '/(app)/projects/[projectId]',
			path: `/projects/${projectId}?/${action}`,
			params: { projectId },
			form,
			run: projectPage[action]
		});

	it('make a project and a design in it, and lead to its sheet', async () => {
		const made = await make(engineer, { ...TYPED, elevation: '820 ft' });
		expect(made.status).toBe(303);
		const projectId = made.location?.split('/').at(-1) ?? '';
		expect((await findProject(ours, projectId))?.elevation_m).toBeCloseTo(249.936, 9);
		const sheet = await act(engineer, projectId, 'design', { name: 'AHU-1', service: '' });
		expect(sheet.location).toMatch(/^\/designs\/[0-9a-f-]{36}\/sheet$/);
	});

	it.each([
		['no number', { number: '' }],
		['an elevation that is none', { elevation: 'high' }],
		['a name too long', { name: 'x'.repeat(121) }],
		['a character that no database keeps', { name: 'Lib\0rary' }]
	])('refuse %s beside the field and make nothing', async (_what, wrong) => {
		const number = randomUUID().slice(0, 8);
		const answer = await make(engineer, { ...TYPED, number, ...wrong });
		expect(answer.body).toMatchObject({
			status: 400,
			data: { form: { errors: { [Object.keys(wrong)[0] ?? '']: expect.anything() } } }
		});
		expect((await listRegister(ours, 'current')).map((one) => one.number)).not.toContain(number);
	});

	it('let a viewer change nothing, and say only that there is nothing', async () => {
		const projectId = await project();
		const designId = await emptyDesign(ours, 'Kept');
		expect((await make(viewer, { ...TYPED, number: 'V-1' })).status).toBe(404);
		for (const [action, form] of [
			['change', { ...TYPED, name: 'Taken' }],
			['archive', { archived: 'yes' }],
			['design', { name: 'AHU-5', service: '' }],
			['archiveDesign', { designId, archived: 'yes' }]
		] as const)
			expect((await act(viewer, projectId, action, form)).status, action).toBe(404);
		expect(await findProject(ours, projectId)).toMatchObject({ name: 'Library', archivedAt: null });
		expect(await listDesigns(ours, projectId)).toEqual([]);
		expect((await openDesign(ours, designId))?.heading.archivedAt).toBeNull();
	});

	it("do not reach another firm's project or design, nor what is no id", async () => {
		const [foreign, own] = [await project(theirs), await project()];
		const designId = await emptyDesign(theirs);
		expect((await act(engineer, foreign, 'change', TYPED)).status).toBe(404);
		expect((await act(engineer, foreign, 'archive', { archived: 'yes' })).status).toBe(404);
		expect((await act(engineer, foreign, 'design', { name: 'A', service: '' })).status).toBe(404);
		for (const id of [designId, 'no-id', ''])
			expect((await act(engineer, own, 'archiveDesign', { designId: id, archived: 'yes' })).status).toBe(404);
		expect((await act(engineer, 'no-id', 'archive', { archived: 'yes' })).status).toBe(404);
		expect((await openDesign(theirs, designId))?.heading.archivedAt).toBeNull();
	});
});
