import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { database } from '../../src/lib/server/db';
import { signedInSession } from '../../src/lib/server/db/schema';
import { actions as account, load as loadAccount } from '../../src/routes/(app)/account/+page.server';
import { browser, ORIGIN, type Browser } from './support/browser';
import { freshDatabase, type TestDatabase } from './support/database';
import { enter, owner, PASSWORD, signedIn, whoIs } from './support/people';

let made: TestDatabase;
beforeAll(async () => {
	Object.assign(process.env, { AUTH_URL: ORIGIN, AUTH_SECRET: 'a secret for tests alone, 32 or more' });
	made = await freshDatabase();
});
afterAll(() => made?.drop());

const at = { routeId: '/(app)/account', path: '/account' };
const submit = (visitor: Browser, name: keyof typeof account, form: Record<string, string> = {}) =>
	visitor.ask({ ...at, form, run: account[name] });
const idOf = async (visitor: Browser): Promise<string> => (await whoIs(visitor)).sessionId ?? '';
const signedOut = async (visitor: Browser) => (await whoIs(visitor)).person === null;

describe('sessions', () => {
	it('are listed on the account page with the browser, the present one marked', async () => {
		await owner('lists@example.test');
		await signedIn('lists@example.test', 'Mozilla/5.0 (Windows NT 10.0) Chrome/140.0 Safari/537.36');
		const here = await signedIn('lists@example.test');
		const { body } = await here.ask({ ...at, run: loadAccount });
		const { sessions } = body as { sessions: { browser: string; here: boolean }[] };
		expect(sessions.map(({ browser, here }) => [browser, here]).sort()).toEqual([
			['Chrome on Windows', false],
			['Firefox on Linux', true]
		]);
	});

	it('are revoked one at a time, or all others at once', async () => {
		await owner('revokes@example.test');
		const [here, second, third] = [
			await signedIn('revokes@example.test'),
			await signedIn('revokes@example.test'),
			await signedIn('revokes@example.test')
		];
		await submit(here, 'revoke', { sessionId: await idOf(second) });
		expect([await signedOut(here), await signedOut(second), await signedOut(third)]).toEqual([false, true, false]);
		await submit(here, 'revokeOthers');
		expect([await signedOut(here), await signedOut(third)]).toEqual([false, true]);
	});

	it('of another person cannot be revoked, even by their id', async () => {
		await owner('victim@example.test');
		await owner('other@example.test');
		const [victim, other] = [await signedIn('victim@example.test'), await signedIn('other@example.test')];
		await submit(other, 'revoke', { sessionId: await idOf(victim) });
		await submit(other, 'revokeOthers');
		expect(await signedOut(victim)).toBe(false);
	});

	it('end when they expire', async () => {
		await owner('expires@example.test');
		const visitor = await signedIn('expires@example.test');
		await database()
			.update(signedInSession)
			.set({ expiresAt: new Date(Date.now() - 1000) })
			.where(eq(signedInSession.id, await idOf(visitor)));
		expect(await signedOut(visitor)).toBe(true);
	});

	it('are noted as seen at most every five minutes', async () => {
		await owner('seen@example.test');
		const visitor = await signedIn('seen@example.test');
		const row = eq(signedInSession.id, await idOf(visitor));
		const seenAfter = async (minutesAgo: number) => {
			const lastSeenAt = new Date(Date.now() - minutesAgo * 60_000);
			await database().update(signedInSession).set({ lastSeenAt }).where(row);
			await whoIs(visitor);
			const [now] = await database().select().from(signedInSession).where(row);
			return now?.lastSeenAt.getTime() !== lastSeenAt.getTime();
		};
		expect(await seenAfter(4)).toBe(false);
		expect(await seenAfter(6)).toBe(true);
	});

	it('are not made by a cookie that was signed with another secret', async () => {
		await owner('forged@example.test');
		const visitor = await signedIn('forged@example.test');
		const secret = process.env.AUTH_SECRET;
		process.env.AUTH_SECRET = 'another secret that somebody guessed';
		expect(await signedOut(visitor)).toBe(true);
		process.env.AUTH_SECRET = secret;
		expect(await signedOut(visitor)).toBe(false);
	});
});

describe('the account page', () => {
	it('changes the name', async () => {
		await owner('named@example.test', 'Old Name');
		const visitor = await signedIn('named@example.test');
		await submit(visitor, 'name', { name: ' New Name ' });
		expect((await whoIs(visitor)).person?.name).toBe('New Name');
	});

	it('changes the password for one who knows the present one, and signs the other browsers out', async () => {
		await owner('changes@example.test');
		const [here, elsewhere] = [await signedIn('changes@example.test'), await signedIn('changes@example.test')];
		const wrong = await submit(here, 'password', { present: 'not it at all', password: 'the next sentence' });
		expect(wrong.body).toMatchObject({ status: 400, data: { form: { errors: { present: [expect.any(String)] } } } });
		expect(await signedOut(elsewhere)).toBe(false);
		await submit(here, 'password', { present: PASSWORD, password: 'the next sentence' });
		expect([await signedOut(here), await signedOut(elsewhere)]).toEqual([false, true]);
		expect((await enter(browser(), 'changes@example.test', PASSWORD)).status).toBe(200);
		expect((await enter(browser(), 'changes@example.test', 'the next sentence')).status).toBe(303);
	});

	it('keeps the appearance in a cookie and takes no other word for it', async () => {
		await owner('looks@example.test');
		const visitor = await signedIn('looks@example.test');
		await submit(visitor, 'appearance', { appearance: 'dark' });
		expect((await whoIs(visitor)).appearance).toBe('dark');
		await submit(visitor, 'appearance', { appearance: '"><script>' });
		expect((await whoIs(visitor)).appearance).toBe('dark');
		visitor.jar.set('appearance', '"><script>');
		expect((await whoIs(visitor)).appearance).toBe('system');
	});
});
