/** People for tests, made through the same use cases as by the pages. */
import { actions as signIn } from '../../../src/routes/(site)/sign-in/+page.server';
import { foundFirm } from '../../../src/lib/server/firms/found-firm';
import { passwordHash } from '../../../src/lib/server/auth/password';
import { browser, type Answer, type Browser } from './browser';

export const PASSWORD = 'a sentence that is long';

/** A person with a proved address, and the firm that they own. */
export async function owner(email: string, name = 'Some Person') {
	const founder = { name, email, firmName: `Firm of ${name}`, emailVerified: new Date() };
	const founded = await foundFirm({ ...founder, passwordHash: await passwordHash(PASSWORD) });
	if (!founded) throw new Error(`${email} was taken`);
	return { ...founded, email, password: PASSWORD };
}

/** Submits the form of sign-in. */
export function enter(visitor: Browser, email: string, password: string, to = ''): Promise<Answer> {
	const form = { email, password, to };
	return visitor.ask({ routeId: '/(site)/sign-in', path: '/sign-in?/enter', form, run: signIn.enter });
}

/** A browser in which this person is signed in. */
export async function signedIn(email: string, userAgent?: string): Promise<Browser> {
	const visitor = browser(userAgent);
	const answer = await enter(visitor, email, PASSWORD);
	if (answer.status !== 303) throw new Error(`${email} was not signed in`);
	return visitor;
}

/** Who the guard finds behind the browser; null when nobody is signed in. */
export async function whoIs(visitor: Browser): Promise<App.Locals> {
	const answer = await visitor.ask({
		routeId: '/(site)/methods',
		path: '/methods',
		run: (event: { locals: App.Locals }) => event.locals
	});
	return answer.body as App.Locals;
}
