import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { actions as forgotten } from '../../src/routes/(site)/forgotten/+page.server';
import { actions as reset } from '../../src/routes/(site)/reset/+page.server';
import { actions as link } from '../../src/routes/(site)/sign-in/link/+page.server';
import { actions as signIn } from '../../src/routes/(site)/sign-in/+page.server';
import { POST as signOut } from '../../src/routes/(site)/sign-out/+server';
import { actions as signUp } from '../../src/routes/(site)/sign-up/+page.server';
import { actions as verify } from '../../src/routes/(site)/verify/+page.server';
import { browser, ORIGIN, type Browser } from './support/browser';
import { freshDatabase, type TestDatabase } from './support/database';
import { startMail } from './support/mail';
import { enter, owner, PASSWORD, signedIn, whoIs } from './support/people';

let made: TestDatabase;
let mail: Awaited<ReturnType<typeof startMail>>;

beforeAll(async () => {
	Object.assign(process.env, {
		AUTH_URL: ORIGIN,
		AUTH_SECRET: 'a secret for tests alone, 32 or more',
		LOG_LEVEL: 'silent'
	});
	[made, mail] = await Promise.all([freshDatabase(), startMail()]);
});
afterAll(async () => {
	await mail?.close();
	await made?.drop();
});

const start = (visitor: Browser, email: string, password = PASSWORD) =>
	visitor.ask({
		routeId: '/(site)/sign-up',
		path: '/sign-up',
		form: { name: 'New Person', firmName: 'Brackenfold', email, password },
		run: signUp.default
	});
const confirm = (visitor: Browser, token: string) =>
	visitor.ask({ routeId: '/(site)/verify', path: '/verify', form: { token }, run: verify.default });
const askFor = (path: 'forgotten' | 'sign-in/link', email: string, headers = {}) =>
	browser().ask({
		routeId: `/(site)/${path}`,
		path: `/${path}`,
		form: { email, to: '/account' },
		headers,
		run: path === 'forgotten' ? forgotten.default : link.default
	});
const choose = (token: string, password: string) =>
	browser().ask({ routeId: '/(site)/reset', path: '/reset', form: { token, password }, run: reset.default });
/** Presses the button of the page to which a sign-in link leads. */
const press = (visitor: Browser, letter: URL) => {
	const { token = '', email = '', to = '' } = Object.fromEntries(letter.searchParams);
	const query = new URLSearchParams({ token, email, callbackUrl: to });
	return visitor.ask({ routeId: null, path: `/auth/callback/email?${query}` });
};

describe('from sign-up to sign-in', () => {
	const email = 'new@example.test';

	it('makes a person and a firm, asks for proof of the address, and then lets them in as its owner', async () => {
		const visitor = browser();
		expect(await start(visitor, 'New@Example.test ')).toMatchObject({ status: 303, location: '/sign-in/sent' });

		const early = await enter(visitor, email, PASSWORD);
		expect(early.body).toMatchObject({
			status: 400,
			data: { form: { message: { again: true }, data: { password: '' } } }
		});
		expect((await whoIs(visitor)).person).toBeNull();

		const token = (await mail.link(email)).searchParams.get('token') ?? '';
		expect((await confirm(visitor, token)).body).toEqual({ verified: true });
		expect((await confirm(visitor, token)).body).toEqual({ verified: false });

		expect(await enter(visitor, email, PASSWORD)).toMatchObject({ status: 303, location: '/register' });
		const { person, firm, scope } = await whoIs(visitor);
		expect(person).toMatchObject({ email, name: 'New Person' });
		expect(firm?.name).toBe('Brackenfold');
		expect(scope?.role).toBe('owner');
	});

	it('answers alike for a known address, makes nothing and tells its owner', async () => {
		const again = await start(browser(), email, 'quite another sentence');
		expect(again).toMatchObject({ status: 303, location: '/sign-in/sent' });
		expect((await mail.letters(email))[0]?.subject).toMatch(/already have an account/);
		expect((await enter(browser(), email, 'quite another sentence')).status).toBe(200);
		expect((await enter(browser(), email, PASSWORD)).status).toBe(303);
	});

	it.each([
		['short', 'nine char'],
		['common', 'Password123'],
		['the address', 'short@example.test'],
		['a repeated letter', 'aaaaaaaaaaaa']
	])('refuses a password that is %s, beside the field, and does not send it back', async (_why, password) => {
		const answer = await start(browser(), 'short@example.test', password);
		expect(answer.body).toMatchObject({ status: 400, data: { form: { errors: { password: [expect.any(String)] } } } });
		expect(answer.body).toMatchObject({ data: { form: { data: { name: 'New Person', password: '' } } } });
		expect(await mail.letters('short@example.test')).toEqual([]);
	});

	it('sends the letter again to an address that waits for it, and to no other', async () => {
		await start(browser(), 'waits@example.test');
		await owner('proved@example.test');
		const first = await mail.link('waits@example.test');
		for (const email of ['waits@example.test', 'proved@example.test', 'unknown@example.test']) {
			const asked = { routeId: '/(site)/sign-in', path: '/sign-in?/again', form: { email, password: '', to: '' } };
			const answer = await browser().ask({ ...asked, run: signIn.again });
			expect(answer).toMatchObject({ status: 303, location: '/sign-in/sent' });
		}
		expect(await mail.letters('proved@example.test')).toEqual([]);
		expect(await mail.letters('unknown@example.test')).toEqual([]);
		const second = await mail.link('waits@example.test');
		expect((await confirm(browser(), first.searchParams.get('token') ?? '')).body).toEqual({ verified: false });
		expect((await confirm(browser(), second.searchParams.get('token') ?? '')).body).toEqual({ verified: true });
	});
});

describe('sign-in with a password', () => {
	it('says the same for a wrong password, an unknown and an unconfirmed address, and keeps the address', async () => {
		await owner('known@example.test');
		const [wrong, unknown] = [
			await enter(browser(), 'known@example.test', 'not the right one'),
			await enter(browser(), 'nobody@example.test', 'not the right one')
		];
		const visitor = browser();
		await start(visitor, 'unconfirmed@example.test');
		const unconfirmed = await enter(visitor, 'unconfirmed@example.test', PASSWORD);
		const told = (answer: typeof wrong) => (answer.body as { data: { form: { message: unknown } } }).data.form.message;
		expect(told(wrong)).toEqual(told(unknown));
		expect(told(unconfirmed)).toEqual(told(unknown));
		expect(wrong.body).toMatchObject({ data: { form: { data: { email: 'known@example.test', password: '' } } } });
	});

	it.each([
		['/projects/new?from=letter', '/projects/new?from=letter'],
		['https://elsewhere.example/', '/register'],
		['//elsewhere.example/', '/register'],
		['/\\elsewhere.example/', '/register'],
		['/\t/elsewhere.example', '/register'],
		['javascript:alert(1)', '/register']
	])('returns from %j to %s', async (to, lands) => {
		const email = `returns${Buffer.from(to).toString('hex')}@example.test`;
		await owner(email);
		expect(await enter(browser(), email, PASSWORD, to)).toMatchObject({ status: 303, location: lands });
	});

	it('ends at sign-out, for the cookie too if somebody kept it', async () => {
		await owner('leaves@example.test');
		const visitor = await signedIn('leaves@example.test');
		const kept = new Map(visitor.jar);
		expect(await visitor.ask({ routeId: '/(site)/sign-out', path: '/sign-out', form: {}, run: signOut })).toMatchObject(
			{
				status: 303,
				location: '/'
			}
		);
		expect((await whoIs(visitor)).person).toBeNull();
		for (const [name, value] of kept) visitor.jar.set(name, value);
		expect((await whoIs(visitor)).person).toBeNull();
	});
});

describe('a link by letter', () => {
	it('signs in once, and leads where the person wanted to go', async () => {
		await owner('link@example.test');
		await askFor('sign-in/link', 'link@example.test');
		const letter = await mail.link('link@example.test');
		const visitor = browser();
		expect(await press(visitor, letter)).toMatchObject({ status: 302, location: `${ORIGIN}/account` });
		expect((await whoIs(visitor)).person?.email).toBe('link@example.test');
		const second = browser();
		expect((await press(second, letter)).location).toContain('/sign-in/link?error=Verification');
		expect((await whoIs(second)).person).toBeNull();
	});

	it('leads to the configured origin whatever host the request names', async () => {
		await owner('host@example.test');
		await askFor('sign-in/link', 'host@example.test', { host: 'evil.example', 'x-forwarded-host': 'evil.example' });
		expect((await mail.link('host@example.test')).origin).toBe(ORIGIN);
		const [letter] = await mail.letters('host@example.test');
		expect(letter?.text + String(letter?.html)).not.toContain('evil.example');
	});

	it('is not sent to an unknown address, and makes nobody', async () => {
		expect(await askFor('sign-in/link', 'stranger@example.test')).toMatchObject({
			status: 303,
			location: '/sign-in/sent'
		});
		expect(await mail.letters('stranger@example.test')).toEqual([]);
		expect((await enter(browser(), 'stranger@example.test', PASSWORD)).status).toBe(200);
	});

	it('proves the address, and drops a password that somebody set before it was proved', async () => {
		await start(browser(), 'squatted@example.test', 'set by somebody else');
		await mail.letters('squatted@example.test');
		await askFor('sign-in/link', 'squatted@example.test');
		const visitor = browser();
		await press(visitor, await mail.link('squatted@example.test'));
		expect((await whoIs(visitor)).person?.email).toBe('squatted@example.test');
		expect((await enter(browser(), 'squatted@example.test', 'set by somebody else')).status).toBe(200);
	});
});

describe('a forgotten password', () => {
	it('is replaced once by the token of a letter, which signs every browser out', async () => {
		await owner('forgets@example.test');
		const visitor = await signedIn('forgets@example.test');
		await askFor('forgotten', 'forgets@example.test');
		const token = (await mail.link('forgets@example.test')).searchParams.get('token') ?? '';
		expect((await choose(token, 'a new sentence then')).body).toMatchObject({ outcome: 'changed' });
		expect((await choose(token, 'and one more of them')).body).toMatchObject({ outcome: 'expired' });
		expect((await whoIs(visitor)).person).toBeNull();
		expect((await enter(browser(), 'forgets@example.test', PASSWORD)).status).toBe(200);
		expect((await enter(browser(), 'forgets@example.test', 'a new sentence then')).status).toBe(303);
	});

	it('answers alike for an unknown address and sends nothing', async () => {
		const [known, unknown] = [
			await askFor('forgotten', 'forgets@example.test'),
			await askFor('forgotten', 'nobody@example.test')
		];
		expect([unknown.status, unknown.location]).toEqual([known.status, known.location]);
		expect(await mail.letters('nobody@example.test')).toEqual([]);
	});

	it('does not take a token that was made to confirm an address', async () => {
		await start(browser(), 'confirms@example.test');
		const token = (await mail.link('confirms@example.test')).searchParams.get('token') ?? '';
		expect((await choose(token, 'a new sentence then')).body).toMatchObject({ outcome: 'expired' });
	});
});
