import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { findUserByEmail } from '../../src/lib/server/auth/users';
import { actions as forgotten } from '../../src/routes/(site)/forgotten/+page.server';
import { actions as reset } from '../../src/routes/(site)/reset/+page.server';
import { actions as link } from '../../src/routes/(site)/sign-in/link/+page.server';
import { actions as signUp } from '../../src/routes/(site)/sign-up/+page.server';
import { actions as verify } from '../../src/routes/(site)/verify/+page.server';
import { browser, ORIGIN, type Browser } from './support/browser';
import { freshDatabase, type TestDatabase } from './support/database';
import { startMail } from './support/mail';
import { owner, PASSWORD, whoIs } from './support/people';

let made: TestDatabase;
let mail: Awaited<ReturnType<typeof startMail>>;

beforeAll(async () => {
	Object.assign(process.env, { AUTH_URL: ORIGIN, AUTH_SECRET: 'a secret for tests alone, 32 or more' });
	[made, mail] = await Promise.all([freshDatabase(), startMail()]);
});
afterAll(async () => {
	await mail?.close();
	await made?.drop();
});

const submit = (path: string, form: Record<string, string>, run?: (event: never) => unknown) =>
	browser().ask({ routeId: `/(site)${path}`, path, form, run });
const tokenFor = async (email: string) => (await mail.link(email)).searchParams.get('token') ?? '';
const choose = (token: string, password: string) => submit('/reset', { token, password }, reset.default);

/** Opens the address that signs in by a link, by any method. */
const press = (visitor: Browser, token: string, email: string, method = 'GET') =>
	visitor.ask({ routeId: null, path: `/auth/callback/email?${new URLSearchParams({ token, email })}`, method });

describe('the token of a letter for a new password', () => {
	it('does not confirm an address', async () => {
		const email = 'unconfirmed@example.test';
		await submit('/sign-up', { name: 'Somebody', firmName: 'Firm', email, password: PASSWORD }, signUp.default);
		await mail.letters(email);
		await submit('/forgotten', { email }, forgotten.default);
		const token = await tokenFor(email);
		expect((await submit('/verify', { token }, verify.default)).body).toEqual({ verified: false });
		expect((await findUserByEmail(email))?.emailVerified).toBeNull();
	});

	it('ends when a newer letter is asked for', async () => {
		const { email } = await owner('twice@example.test');
		await submit('/forgotten', { email }, forgotten.default);
		const older = await tokenFor(email);
		await submit('/forgotten', { email }, forgotten.default);
		expect(await tokenFor(email)).not.toBe(older);
		expect((await choose(older, 'the next sentence')).body).toMatchObject({ outcome: 'expired' });
	});

	it('works for one of many who use it at the same moment', async () => {
		const { email } = await owner('race@example.test');
		await submit('/forgotten', { email }, forgotten.default);
		const token = await tokenFor(email);
		const answers = await Promise.all([1, 2, 3, 4, 5].map((n) => choose(token, `the next sentence ${n}`)));
		const outcomes = answers.map(({ body }) => (body as { outcome: string }).outcome).sort();
		expect(outcomes).toEqual(['changed', 'expired', 'expired', 'expired', 'expired']);
	});
});

describe('the token of a sign-in link', () => {
	it('signs nobody in under another address, nor by HEAD, and is not used up by that', async () => {
		const [{ email }, other] = [await owner('mine@example.test'), await owner('victim@example.test')];
		await submit('/sign-in/link', { email, to: '' }, link.default);
		const token = await tokenFor(email);
		const visitor = browser();
		expect((await press(visitor, token, other.email)).location).toContain('error=Verification');
		expect((await press(visitor, token, email, 'HEAD')).status).toBe(404);
		expect((await whoIs(visitor)).person).toBeNull();
		await press(visitor, token, email);
		expect((await whoIs(visitor)).person?.email).toBe(email);
	});

	it('chooses no password and confirms no address by the forms of other letters', async () => {
		const { email } = await owner('crossed@example.test');
		await submit('/sign-in/link', { email, to: '' }, link.default);
		const token = await tokenFor(email);
		expect((await choose(token, 'the next sentence')).body).toMatchObject({ outcome: 'expired' });
		expect((await submit('/verify', { token }, verify.default)).body).toEqual({ verified: false });
	});

	it('is taken from our own form alone: from another site it leads to that form, and is not used up', async () => {
		const { email } = await owner('led@example.test');
		await submit('/sign-in/link', { email, to: '' }, link.default);
		const token = await tokenFor(email);
		const path = `/auth/callback/email?${new URLSearchParams({ token, email })}`;
		const visitor = browser();
		const led = await visitor.ask({ routeId: null, path, headers: { 'sec-fetch-site': 'cross-site' } });
		expect([led.status, led.location?.split('?')[0]]).toEqual([303, '/sign-in/link/open']);
		expect((await whoIs(visitor)).person).toBeNull();
		await visitor.ask({ routeId: null, path, headers: { 'sec-fetch-site': 'same-origin' } });
		expect((await whoIs(visitor)).person?.email).toBe(email);
	});

	it('ends with the password: a link from before a reset signs nobody in', async () => {
		const { email } = await owner('reset@example.test');
		await submit('/sign-in/link', { email, to: '' }, link.default);
		const before = await tokenFor(email);
		await submit('/forgotten', { email }, forgotten.default);
		await expect.poll(() => tokenFor(email)).not.toBe(before);
		expect((await choose(await tokenFor(email), 'the next sentence')).body).toMatchObject({ outcome: 'changed' });
		const visitor = browser();
		await press(visitor, before, email);
		expect((await whoIs(visitor)).person).toBeNull();
	});
});
