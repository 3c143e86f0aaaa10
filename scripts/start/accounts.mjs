/** The demo firm's accounts, as the demo program prints them: one JSON object a line. */
import { paint } from '../machine/say.mjs';

/** @typedef {{ email: string, role: string, password: string }} DemoAccount */

/** @param {string} output @returns {DemoAccount[]} lines of another kind are passed over */
export function readAccounts(output) {
	return output.split('\n').flatMap((line) => {
		try {
			const account = JSON.parse(line);
			return typeof account?.email === 'string' && typeof account.password === 'string' ? [account] : [];
		} catch {
			return [];
		}
	});
}

/** @param {string} address @param {DemoAccount[]} accounts @returns {string} what the reader needs to begin */
export function welcome(address, accounts) {
	const width = (/** @type {'email' | 'role'} */ field) => Math.max(0, ...accounts.map((one) => one[field].length)) + 2;
	const rows = accounts.map(
		({ email, role, password }) =>
			`    ${email.padEnd(width('email'))}${paint('dim', role.padEnd(width('role')))}${password}`
	);
	const demo = rows.length ? ['', '  Demo accounts (e-mail, role, password)', ...rows] : [];
	const mail = `  Letters it sends are kept at ${address}/dev/inbox`;
	return ['', `  Evendraft is ready at ${paint('bold', address)}`, mail, ...demo, '', '  Ctrl-C stops it.', ''].join(
		'\n'
	);
}
