/** What a person does on the pages before and around a design. */
import type { Page } from 'playwright-core';
import { PASSWORD } from '../../server/support/people';

/** Signs in by the form; the person was made by the use cases, with the password of the tests. */
export async function signIn(page: Page, email: string, to = '/register'): Promise<void> {
	await page.goto(`/sign-in?to=${encodeURIComponent(to)}`);
	await page.getByLabel('E-mail').fill(email);
	await page.getByLabel('Password').fill(PASSWORD);
	await page.getByRole('button', { name: 'Sign in' }).click();
	await page.waitForURL((url) => url.pathname === to);
}
