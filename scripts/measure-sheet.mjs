/**
 * `npm run --silent bench:sheet`: how long a committed edit takes in a sheet of 500 rows, in Chromium against the production
 * build, as JSON on standard output. Its database and server are its own and end with it.
 */
import { spawn } from 'node:child_process';
import { setTimeout as delay } from 'node:timers/promises';
import { startMailFake } from './fakes/mail.mjs';
import { buildIfChanged, bundlePrograms } from './machine/build.mjs';
import { applicationUrl } from './database/elsewhere.mjs';
import { makeFolders, PROJECT } from './machine/folders.mjs';
import { live } from './machine/lifetime.mjs';
import { secret } from './machine/local-env.mjs';
import { freePort } from './machine/ports.mjs';
import { markOf, stopGroup } from './machine/processes.mjs';
import { Refusal } from './machine/say.mjs';
import { measureEdits } from './measure/edits.mjs';
import { readAccounts } from './start/accounts.mjs';
import { serverEnvironment } from './start/environment.mjs';
import { runProgram } from './start/program.mjs';
import { makeRunFolder, removeRun, startThrowAway } from './test/throw-away.mjs';

const [FIRST, LAST] = [5_600, 5_699];
const PATIENCE_ms = 30_000;

/** @param {import('./machine/lifetime.mjs').Lifetime} life */
async function startServer(life) {
	const folder = makeRunFolder();
	life.onStop(() => removeRun(folder));
	const { adminUrl, appPassword } = await startThrowAway(folder);
	const databaseUrl = applicationUrl(adminUrl, appPassword);
	const env = { DATABASE_ADMIN_URL: adminUrl, DATABASE_APP_PASSWORD: appPassword, DATABASE_URL: databaseUrl };
	await runProgram('migrate', env, 'migrating the database');
	const accounts = readAccounts(await runProgram('demo', env, 'loading the demo firm'));
	const mail = await startMailFake();
	life.onStop(mail.close);
	const port = await freePort(FIRST, LAST);
	const { smtpUrl, inboxUrl } = mail;
	const server = serverEnvironment({ port, databaseUrl, authSecret: secret(), smtpUrl, inboxUrl });
	const child = spawn(process.execPath, ['build/index.js'], {
		...{ cwd: PROJECT, env: { ...process.env, ...server }, detached: true, stdio: ['ignore', 'ignore', 'inherit'] }
	});
	const mark = markOf(child.pid ?? 0);
	life.onStop(() => stopGroup(mark));
	const until = performance.now() + PATIENCE_ms;
	while (!(await answers(port))) {
		life.checkpoint();
		if (child.exitCode !== null || performance.now() > until) throw new Refusal('The server does not answer.');
		await delay(100);
	}
	return { origin: server.ORIGIN ?? '', account: accounts[0] };
}

/** @param {number} port */
async function answers(port) {
	try {
		return (await fetch(`http://127.0.0.1:${port}/api/v1/health`)).ok;
	} catch {
		return false;
	}
}

await live(
	async (life) => {
		makeFolders();
		await buildIfChanged();
		await bundlePrograms();
		const { origin, account } = await startServer(life);
		if (!account) throw new Refusal('The demo named no account.');
		const measured = await measureEdits({ ...account, origin });
		process.stdout.write(`${JSON.stringify(measured, null, 2)}\n`);
		life.end(0);
	},
	{ signalCode: () => 1 }
);
