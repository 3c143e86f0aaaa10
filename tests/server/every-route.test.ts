/**
 * Every route that names a project or a design, asked by people who have no business there. Routes are found by their
 * files, so that a new one is attacked without being named here.
 */
import { randomUUID } from 'node:crypto';
import { relative } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { FirmScope } from '../../src/lib/server/auth/scope';
import { inFirm } from '../../src/lib/server/db';
import * as tables from '../../src/lib/server/db/schema';
import { findDesign } from '../../src/lib/server/designs/find-design';
import { saveVersion } from '../../src/lib/server/versions/save-version';
import { browser, ORIGIN, type Answer, type Browser } from './support/browser';
import { freshDatabase, type TestDatabase } from './support/database';
import { colleague, emptyDesign, firm, sent, treeDesign, write } from './support/designs';
import { signedIn } from './support/people';

type Run = (event: never) => unknown;
interface Module {
	readonly load?: Run;
	readonly actions?: Readonly<Record<string, Run>>;
}

const ROUTES = '../../src/routes';
const files = import.meta.glob<Module>('../../src/routes/**/+{page,layout}.server.ts', { eager: true });
const servers = import.meta.glob<Readonly<Record<string, Run>>>('../../src/routes/**/+server.ts', { eager: true });
/** The ids of routes, as SvelteKit names them, with what answers there; those alone that name something of a firm. */
const named = <M>(modules: Record<string, M>, file: string) =>
	Object.entries(modules).flatMap(([path, module]) => {
		const id = `/${relative(ROUTES, path)}`.replace(`/${file}`, '');
		return path.endsWith(`/${file}`) && /\[\w+Id\]/.test(id) ? [[id, module] as const] : [];
	});
const pages = named(files, '+page.server.ts');
const layouts = named(files, '+layout.server.ts');
const apis = named(servers, '+server.ts').flatMap(([id, handlers]) =>
	Object.entries(handlers).map(([method, run]) => [id, method, run] as const)
);
const actions = pages.flatMap(([id, { actions = {} }]) =>
	Object.entries(actions).map(([name, run]) => [id, name, run] as const)
);
const loads = [...layouts, ...pages].flatMap(([id, { load }]) => (load ? [[id, load] as const] : []));
const isLayout = (load: Run) => layouts.some(([, above]) => above.load === load);

const SECRET = 'Brackenfold Hall';
const { firm: firms, membership, project, design, edit, snapshot, version } = tables;
const TENANT = [firms, membership, project, design, edit, snapshot, version];

let made: TestDatabase;
let theirs: FirmScope;
let target: Readonly<Record<'designId' | 'projectId' | 'number', string>>;
let foreign: { readonly visitor: Browser; readonly projectId: string };
const inside = {} as Record<'owner' | 'checker' | 'field' | 'viewer', Browser>;

const projectOf = async (scope: FirmScope, designId: string) =>
	(await inFirm(scope, (tx) => findDesign(tx, scope, designId)))?.projectId ?? '';

beforeAll(async () => {
	Object.assign(process.env, { AUTH_URL: ORIGIN, AUTH_SECRET: 'a secret for tests alone, 32 or more' });
	made = await freshDatabase();
	theirs = await firm('owner@example.test');
	const ours = await firm('foreign@example.test');
	for (const role of ['checker', 'field', 'viewer'] as const) await colleague(theirs, `${role}@example.test`, role);
	for (const who of ['owner', 'checker', 'field', 'viewer'] as const)
		inside[who] = await signedIn(`${who}@example.test`);
	const [{ designId }, own] = [await treeDesign(theirs, SECRET), await emptyDesign(ours)];
	await saveVersion(theirs, designId, { note: SECRET, status: 'work-in-progress' });
	target = { designId, projectId: await projectOf(theirs, designId), number: '1' };
	const visitor = await signedIn('foreign@example.test');
	foreign = { visitor, projectId: await projectOf(ours, own) };
});
afterAll(() => made?.drop());

/** Everything that the attacked firm has. */
const kept = () =>
	inFirm(theirs, async (tx) => {
		const rows = [];
		for (const table of TENANT) rows.push(await tx.select().from(table));
		return JSON.stringify(rows);
	});

type Params = Readonly<Record<string, string>>;
const pathOf = (id: string, params: Params) =>
	id.replace(/\/\(\w+\)/, '').replace(/\[(\w+)\]/g, (_all, name: string) => params[name] ?? '');
const asked = (routeId: string, params: Params, run: Run) => ({ routeId, path: pathOf(routeId, params), params, run });

/** Valid for every form there is, so that none is refused for what it holds. */
const formOf = (more: Params = {}) => ({
	...{ number: randomUUID().slice(0, 8), name: 'Taken', client: '', place: '', elevation: '0 m', units: 'SI' },
	...{ service: '', serves: '', typedIn: 'SI', note: 'Taken', status: 'work-in-progress', before: '2' },
	...{ archived: 'yes', designId: target.designId, ...more }
});
const act = (visitor: Browser, [id, name, run]: (typeof actions)[number], params: Params, more?: Params) => {
	const ask = asked(id, params, run);
	return visitor.ask({ ...ask, path: `${ask.path}?/${name}`, form: formOf(more) });
};
const wordsFor = ([id, name]: (typeof actions)[number]) => `${id}?/${name}`;
const edits = () => ({ base: 0, edits: [sent(write(null, 'title', 'Taken'))] });
const call = (visitor: Browser, [id, method, run]: (typeof apis)[number]) =>
	visitor.ask({
		...asked(id, target, run),
		...{ method, headers: { 'content-type': 'application/json' } },
		...(method === 'POST' && { content: JSON.stringify(edits()) })
	});

/** Runs a load function as SvelteKit does; what stands above it is asked for only if it asks. */
function open(visitor: Browser, id: string, load: Run): Promise<Answer> {
	const run = (event: object) => {
		const above = layouts.find(([of]) => id.startsWith(of))?.[1].load;
		const more = { ...event, depends: () => undefined };
		return load({ ...more, parent: () => above?.(more as never) } as never);
	};
	return visitor.ask(asked(id, target, run));
}

describe('what is attacked', () => {
	it('was found, and names nothing but projects, designs and versions', () => {
		expect(actions.map(wordsFor)).toEqual(
			expect.arrayContaining(['/(app)/projects/[projectId]?/archiveDesign', '/(app)/designs/[designId]/basis?/save'])
		);
		expect(new Set(apis.map(([, method]) => method))).toEqual(new Set(['GET', 'POST']));
		const names = [...pages, ...layouts, ...apis].flatMap(([id]) => id.match(/(?<=\[)\w+(?=\])/g) ?? []);
		expect(new Set(names)).toEqual(new Set(Object.keys(target)));
	});
});

describe('a person of another firm', () => {
	it('changes nothing by any form, whichever id in it is foreign', async () => {
		const before = await kept();
		for (const action of actions)
			expect((await act(foreign.visitor, action, target)).status, wordsFor(action)).toBe(404);
		// A design that stands in the form, under a project of one's own.
		for (const action of actions.filter(([, name]) => name === 'archiveDesign'))
			expect((await act(foreign.visitor, action, { projectId: foreign.projectId })).status).toBe(404);
		expect(await kept()).toBe(before);
	});

	it('neither reads nor writes by any address of the API', async () => {
		const before = await kept();
		for (const api of apis) expect((await call(foreign.visitor, api)).status, api[0]).toBe(404);
		expect(await kept()).toBe(before);
	});

	it('reads nothing by any page, also where only the innermost part of it is asked for', async () => {
		for (const [id, load] of loads) {
			const { status, body } = await open(foreign.visitor, id, load);
			expect(JSON.stringify(body ?? null), id).not.toMatch(new RegExp(`${SECRET}|${theirs.firmId}|owner@`));
			if (isLayout(load)) expect(status, id).toBe(404);
		}
	});

	it('sees the same in what is foreign and in what does not exist', async () => {
		const absent = { designId: randomUUID(), projectId: randomUUID(), number: '1' };
		for (const action of actions) {
			const [there, nowhere] = [
				await act(foreign.visitor, action, target),
				await act(foreign.visitor, action, absent, { designId: absent.designId })
			];
			expect([there.status, there.body], wordsFor(action)).toEqual([nowhere.status, nowhere.body]);
		}
	});
});

describe.each(['viewer', 'field'] as const)('a member as %s', (role) => {
	it('is refused every form and every edit, and changes nothing', async () => {
		const before = await kept();
		for (const action of actions) expect((await act(inside[role], action, target)).status, wordsFor(action)).toBe(404);
		for (const api of apis.filter(([, method]) => method !== 'GET'))
			expect((await call(inside[role], api)).status, api[0]).toBe(404);
		expect(await kept()).toBe(before);
	});
});

describe.each(['checker', 'owner'] as const)('a member as %s', (role) => {
	it('gets through with the very same requests', async () => {
		for (const action of actions) {
			const name = `${SECRET} ${randomUUID().slice(0, 8)}`;
			const answer = await act(inside[role], action, target, { archived: 'no', name });
			expect([200, 303], wordsFor(action)).toContain(answer.status);
			// A form that was sent back has a status of its own.
			expect(answer.body ?? {}, wordsFor(action)).not.toHaveProperty('status');
		}
		for (const api of apis) expect((await call(inside[role], api)).status, api[0]).toBe(200);
		const told = [];
		for (const [id, load] of loads) {
			const { status, body } = await open(inside[role], id, load);
			expect([200, 303], id).toContain(status);
			told.push(JSON.stringify(body ?? null));
		}
		expect(told.filter((text) => text.includes(SECRET)).length).toBeGreaterThanOrEqual(4);
	});
});

describe('a stranger', () => {
	it('is sent to sign in by every page and form, and refused by the API', async () => {
		for (const action of actions) expect((await act(browser(), action, target)).location).toMatch(/^\/sign-in\?to=/);
		for (const [id, load] of loads) expect((await open(browser(), id, load)).location).toMatch(/^\/sign-in/);
		for (const api of apis) expect((await call(browser(), api)).status, api[0]).toBe(401);
	});
});
