import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { ACCESS, verdict } from '../../src/lib/server/auth/access';
import { requireEditor, requirePerson, requireScope } from '../../src/lib/server/auth/require';
import { provenScope } from '../../src/lib/server/auth/scope';
import { inFirm } from '../../src/lib/server/db';
import { membership, ROLES, type Role } from '../../src/lib/server/db/tables/firms';
import { log } from '../../src/lib/server/http/log';
import { problem, STATUS, type ProblemCode } from '../../src/lib/server/http/problem';
import { actions as signIn } from '../../src/routes/(site)/sign-in/+page.server';
import { browser, ORIGIN } from './support/browser';
import { freshDatabase, type TestDatabase } from './support/database';
import { owner, signedIn } from './support/people';
import { routeIds } from './support/routes';

let made: TestDatabase;
beforeAll(async () => {
	Object.assign(process.env, { AUTH_URL: ORIGIN, AUTH_SECRET: 'a secret for tests alone, 32 or more' });
	made = await freshDatabase();
	await owner('owner@example.test');
});
afterAll(() => made?.drop());

const visitorAs = (role: Role | null) => ({
	person: { id: 'p', email: 'p@example.test', name: 'P' },
	scope: role && provenScope('f', 'p', role)
});

describe('the table of access', () => {
	it('names every route that answers', () => {
		expect(routeIds().filter((id) => !Object.hasOwn(ACCESS, id))).toEqual([]);
	});

	it('names no route that is not there', () => {
		const there = routeIds();
		expect(Object.keys(ACCESS).filter((id) => !there.includes(id))).toEqual([]);
	});

	it('closes a route that it does not name, for everybody', () => {
		for (const id of ['/(app)/forgotten', '/api/v1/forgotten', 'toString', '__proto__'])
			expect(verdict(id, visitorAs('owner')), id).toBe('unlisted');
	});

	it('lets in by what it says', () => {
		const stranger = { person: null, scope: null };
		expect(verdict('/(site)/methods', stranger)).toBe('open');
		expect(verdict('/(app)/account', stranger)).toBe('sign-in');
		expect(verdict('/(app)/account', visitorAs(null))).toBe('open');
		expect(verdict('/(app)/register', visitorAs(null))).toBe('absent');
		for (const role of ROLES) expect(verdict('/(app)/register', visitorAs(role))).toBe('open');
	});
});

describe('the guard', () => {
	const work = vi.fn(() => 'worked');
	const reach = async (visitor: ReturnType<typeof browser>, routeId: string | null, path: string, method = 'GET') => {
		work.mockClear();
		const answer = await visitor.ask({ routeId, path, method, run: work });
		return { ...answer, ran: work.mock.calls.length > 0 };
	};

	it.each(['GET', 'POST', 'PUT', 'DELETE'])(
		'closes an unlisted route to %s, runs nothing and writes it down',
		async (method) => {
			const written = vi.spyOn(log, 'error');
			const visitor = await signedIn('owner@example.test');
			expect(await reach(visitor, '/(app)/unlisted', '/unlisted', method)).toMatchObject({ status: 404, ran: false });
			expect(written).toHaveBeenCalledWith({ route: '/(app)/unlisted' }, expect.any(String));
			written.mockRestore();
		}
	);

	it('sends a stranger from a page to sign-in, and back after it', async () => {
		expect(await reach(browser(), '/(app)/register', '/register?open=1')).toMatchObject({
			status: 303,
			location: `/sign-in?to=${encodeURIComponent('/register?open=1')}`,
			ran: false
		});
	});

	it('answers a stranger at the API with a problem, not with a page', async () => {
		const path = '/api/v1/designs/1/edits';
		const answer = await reach(browser(), '/api/v1/designs/[designId]/edits', path, 'POST');
		expect(answer).toMatchObject({ status: 401, ran: false });
		expect(answer.headers.get('content-type')).toBe('application/problem+json');
	});

	it('lets a member in', async () => {
		const visitor = await signedIn('owner@example.test');
		expect(await reach(visitor, '/(app)/register', '/register')).toMatchObject({ status: 200, ran: true });
	});

	it('answers alike to what is absent, forbidden and unlisted', async () => {
		const { firmId, userId } = await owner('leaver@example.test');
		const visitor = await signedIn('leaver@example.test');
		await inFirm(provenScope(firmId, userId, 'owner'), (tx) => tx.delete(membership));
		const [forbidden, absent, unlisted] = [
			await reach(visitor, '/(app)/register', '/register'),
			await reach(visitor, null, '/nothing'),
			await reach(visitor, '/(app)/unlisted', '/unlisted')
		];
		const shown = ({ status, location, headers }: typeof absent) => ({ status, location, headers: [...headers] });
		expect(shown(forbidden)).toEqual(shown(absent));
		expect(shown(unlisted)).toEqual(shown(absent));
		expect(absent.status).toBe(404);
	});

	it('reads the membership at each request, so that one that ended ends at once', async () => {
		const { firmId, userId } = await owner('ends@example.test');
		const visitor = await signedIn('ends@example.test');
		expect((await reach(visitor, '/(app)/register', '/register')).status).toBe(200);
		await inFirm(provenScope(firmId, userId, 'owner'), (tx) => tx.delete(membership));
		expect((await reach(visitor, '/(app)/register', '/register')).status).toBe(404);
	});

	it.each([
		['a form', { 'content-type': 'application/x-www-form-urlencoded' }],
		['JSON', { 'content-type': 'application/json' }]
	])('refuses %s that was sent by a page of another site', async (_what, headers) => {
		const asked = { routeId: '/(site)/sign-in', path: '/sign-in?/enter', method: 'POST', run: signIn.enter };
		for (const origin of ['https://elsewhere.example', 'null'])
			expect((await browser().ask({ ...asked, headers: { ...headers, origin } })).status).toBe(403);
	});

	it('opens no address of Auth.js but that of the link', async () => {
		for (const path of [
			'signin',
			'signin/credentials',
			'callback/credentials',
			'session',
			'csrf',
			'providers',
			'signout'
		])
			for (const method of ['GET', 'POST'])
				expect((await browser().ask({ routeId: null, path: `/auth/${path}`, method })).status, path).toBe(404);
		expect((await browser().ask({ routeId: null, path: '/auth/callback/email', method: 'POST' })).status).toBe(404);
	});

	it('puts the headers of safety on every reply', async () => {
		const { headers } = await reach(browser(), '/(site)/methods', '/methods');
		expect(headers.get('x-content-type-options')).toBe('nosniff');
		expect(headers.get('referrer-policy')).toBe('same-origin');
		expect(headers.get('permissions-policy')).toContain('camera=()');
		expect(headers.get('strict-transport-security')).toBeNull();
		const secure = await browser().ask({
			routeId: '/(site)/methods',
			path: 'https://evendraft.test/methods',
			run: work
		});
		expect(secure.headers.get('strict-transport-security')).toContain('max-age=');
	});
});

describe('what routes require', () => {
	const locals = (role: Role | null) => ({ ...visitorAs(role) }) as App.Locals;
	const absent = expect.objectContaining({ status: 404 });

	it.each(ROLES)('an editor of %s', (role) => {
		const may = ['owner', 'administrator', 'engineer', 'checker'].includes(role);
		if (may) expect(requireEditor(locals(role)).role).toBe(role);
		else expect(() => requireEditor(locals(role))).toThrow(absent);
	});

	it('a person and a scope, which look absent to whoever has none', () => {
		expect(requirePerson(locals(null)).id).toBe('p');
		expect(() => requirePerson({ person: null } as App.Locals)).toThrow(absent);
		expect(() => requireScope(locals(null))).toThrow(absent);
	});
});

describe('a problem', () => {
	it.each(Object.keys(STATUS) as ProblemCode[])('%s carries its status, code and title', async (code) => {
		const answer = problem(code, 'What is wrong', { problems: [1], status: 200 });
		expect(answer.status).toBe(STATUS[code]);
		const body = await answer.json();
		expect(body).toMatchObject({ code, status: STATUS[code], title: 'What is wrong', problems: [1] });
		expect(body.type).toBe(`urn:evendraft:problem:${code}`);
	});
});
