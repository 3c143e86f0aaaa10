/**
 * Every route that names a project or a design, asked by people who have no business there. Routes are found by their
 * files, so that a new one is attacked without being named here.
 */
import { randomUUID } from 'node:crypto';
import { relative } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { FirmScope } from '../../src/lib/server/auth/scope';
import { inFirm } from '../../src/lib/server/db';
import {
	design,
	edit,
	firm as firmTable,
	membership,
	project,
	snapshot,
	version
} from '../../src/lib/server/db/schema';
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
	readonly GET?: Run;
	readonly POST?: Run;
}

const ROUTES = '../../src/routes';
const files = import.meta.glob<Module>('../../src/routes/**/+{page,layout}.server.ts', { eager: true });
const servers = import.meta.glob<Module>('../../src/routes/**/+server.ts', { eager: true });
/** The ids of routes, as SvelteKit names them, with what answers there; those alone that name something of a firm. */
const named = (modules: Record<string, Module>, file: string) =>
	Object.entries(modules).flatMap(([path, module]) => {
		const id = `/${relative(ROUTES, path)}`.replace(`/${file}`, '');
		return path.endsWith(`/${file}`) && /\[\w+Id\]/.test(id) ? [[id, module] as const] : [];
	});
const pages = named(files, '+page.server.ts');
const layouts = named(files, '+layout.server.ts');
const apis = named(servers, '+server.ts');
const actions = pages.flatMap(([id, { actions = {} }]) =>
	Object.entries(actions).map(([name, run]) => [id, name, run] as const)
);
const loads = [...layouts, ...pages].flatMap(([id, { load }]) => (load ? [[id, load] as const] : []));
const neverCalled = () => {
	throw new Error('a layout that loads nothing');
};

const SECRET = 'Brackenfold Hall';
const TENANT = [firmTable, membership, project, design, edit, snapshot, version];

let made: TestDatabase;
let theirs: FirmScope;
let target: Readonly<Record<'designId' | 'projectId' | 'number', string>>;
let foreign: { readonly visitor: Browser; readonly projectId: string; readonly designId: string };
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
	foreign = { visitor, designId: own, projectId: await projectOf(ours, own) };
});
afterAll(() => made?.drop());

/** Everything that the attacked firm has. */
const kept = () =>
	inFirm(theirs, async (tx) => {
		const tables = [];
		for (const table of TENANT) tables.push(await tx.select().from(table));
		return JSON.stringify(tables);
	});

type Params = Readonly<Record<string, string>>;
const pathOf = (id: string, params: Params) =>
	id.replace(/\/\(\w+\)/, '').replace(/\[(\w+)\]/g, (_all, name: string) => params[name] ?? '');
const asked = (id: string, params: Params, run: Run | undefined) => ({
	routeId: id,
	path: pathOf(id, params),
	params,
	run
});

/** Valid for every form there is, so that none is refused for what it holds. */
const formOf = (more: Params = {}) => ({
	...{ number: randomUUID().slice(0, 8), name: 'Taken', client: '', place: '', elevation: '0 m', units: 'SI' },
	...{ service: '', serves: '', typedIn: 'SI', note: 'Taken', status: 'work-in-progress', before: '1' },
	...{ archived: 'yes', designId: target.designId, ...more }
});
const act = (visitor: Browser, [id, name, run]: (typeof actions)[number], params: Params, more?: Params) => {
	const ask = asked(id, params, run);
	return visitor.ask({ ...ask, path: `${ask.path}?/${name}`, form: formOf(more) });
};
const edits = () => ({ base: 0, edits: [sent(write(null, 'title', 'Taken'))] });
const call = (visitor: Browser, id: string, method: 'GET' | 'POST', run: Run) =>
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
		expect(actions.map(([id, name]) => `${id}?/${name}`)).toEqual(
			expect.arrayContaining(['/(app)/projects/[projectId]?/archiveDesign', '/(app)/designs/[designId]/basis?/save'])
		);
		expect([pages.length, layouts.length, apis.length].every((found) => found > 0)).toBe(true);
		const names = [...pages, ...layouts, ...apis].flatMap(([id]) => id.match(/(?<=\[)\w+(?=\])/g) ?? []);
		expect(new Set(names)).toEqual(new Set(Object.keys(target)));
	});
});

describe('a person of another firm', () => {
	it('changes nothing by any form, whichever id in it is foreign', async () => {
		const before = await kept();
		for (const action of actions)
			expect((await act(foreign.visitor, action, target)).status, action.slice(0, 2).join('?/')).toBe(404);
		const archive = actions.find(([, name]) => name === 'archiveDesign');
		if (!archive) throw new Error('no form archives a design');
		expect((await act(foreign.visitor, archive, { projectId: foreign.projectId })).status).toBe(404);
		expect(await kept()).toBe(before);
	});

	it('neither reads nor writes by any address of the API', async () => {
		const before = await kept();
		for (const [id, { GET, POST }] of apis) {
			if (GET) expect((await call(foreign.visitor, id, 'GET', GET)).status, id).toBe(404);
			if (POST) expect((await call(foreign.visitor, id, 'POST', POST)).status, id).toBe(404);
		}
		expect(await kept()).toBe(before);
	});

	it('reads nothing by any page, also where only the innermost part of it is asked for', async () => {
		for (const [id, load] of loads) {
			const told = JSON.stringify((await open(foreign.visitor, id, load)).body ?? null);
			expect(told, id).not.toMatch(new RegExp(`${SECRET}|${theirs.firmId}|owner@`));
		}
		for (const [id, { load = neverCalled }] of layouts)
			expect((await open(foreign.visitor, id, load)).status, id).toBe(404);
	});

	it('sees the same in what is foreign and in what does not exist', async () => {
		const absent = { designId: randomUUID(), projectId: randomUUID(), number: '1' };
		for (const action of actions) {
			const [there, nowhere] = [
				await act(foreign.visitor, action, target),
				await act(foreign.visitor, action, absent, { designId: absent.designId })
			];
			expect([there.status, there.body], action.slice(0, 2).join('?/')).toEqual([nowhere.status, nowhere.body]);
		}
	});
});

describe.each(['viewer', 'field'] as const)('a member as %s', (role) => {
	it('is refused every form and every edit, and changes nothing', async () => {
		const before = await kept();
		for (const action of actions)
			expect((await act(inside[role], action, target)).status, action.slice(0, 2).join('?/')).toBe(404);
		for (const [id, { POST }] of apis)
			if (POST) expect((await call(inside[role], id, 'POST', POST)).status, id).toBe(404);
		expect(await kept()).toBe(before);
	});
});

describe.each(['checker', 'owner'] as const)('a member as %s', (role) => {
	it('gets through with the very same requests', async () => {
		for (const action of actions) {
			const { status } = await act(inside[role], action, target, { archived: 'no', name: `${SECRET} ${role}` });
			expect([200, 303], action.slice(0, 2).join('?/')).toContain(status);
		}
		for (const [id, { GET, POST }] of apis) {
			if (POST) expect((await call(inside[role], id, 'POST', POST)).status, id).toBe(200);
			if (GET) expect((await call(inside[role], id, 'GET', GET)).status, id).toBe(200);
		}
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
		for (const [id, { GET, POST }] of apis) {
			if (GET) expect((await call(browser(), id, 'GET', GET)).status, id).toBe(401);
			if (POST) expect((await call(browser(), id, 'POST', POST)).status, id).toBe(401);
		}
	});
});

describe('adhoc', () => {
	it('link before reset', async () => {
		const { startMail } = await import('./support/mail');
		const mail = await startMail();
		const { actions: link } = await import('../../src/routes/(site)/sign-in/link/+page.server');
		const { resetPassword } = await import('../../src/lib/server/auth/reset-password');
		const { newMailToken } = await import('../../src/lib/server/auth/mail-tokens');
		const email = 'owner@example.test';
		await browser().ask({
			routeId: '/(site)/sign-in/link',
			path: '/sign-in/link',
			form: { email, to: '' },
			run: link.default as never
		});
		const token = (await mail.link(email)).searchParams.get('token') ?? '';
		const t = await newMailToken(theirs.userId, 'reset-password');
		console.log('RESET', await resetPassword(t, 'brand new sentence'));
		const v = browser();
		const a = await v.ask({ routeId: null, path: `/auth/callback/email?${new URLSearchParams({ token, email })}` });
		console.log('OLD LINK', a.status, a.location, [...v.jar.keys()]);
		for (const to of [
			'/.//evil.example',
			'/x/..//evil.example',
			'/%2e//evil.example',
			'/.%2f/evil.example',
			'/a/%2e%2e//evil'
		]) {
			const { returnPath } = await import('../../src/lib/server/auth/return-path');
			console.log(to, returnPath(to));
		}
		await mail.close();
	});
});
