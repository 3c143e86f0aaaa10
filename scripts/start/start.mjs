/** The steps of `npm start`, in order; each says what came of it, and all that was started stops with it. */
import { join } from 'node:path';
import { stopCluster } from '../machine/cluster.mjs';
import { requireRoom } from '../machine/disk.mjs';
import { KEPT, makeFolders } from '../machine/folders.mjs';
import { buildIfChanged, bundlePrograms, copyBuild } from '../machine/build.mjs';
import { live } from '../machine/lifetime.mjs';
import { localEnv } from '../machine/local-env.mjs';
import { installPackages } from '../machine/packages.mjs';
import { webPort } from '../machine/ports.mjs';
import { say, seconds, step } from '../machine/say.mjs';
import { readAccounts, welcome } from './accounts.mjs';
import { serverEnvironment } from './environment.mjs';
import { runProgram } from './program.mjs';
import { stopLeftServer, takeRecord } from './record.mjs';
import { startServer } from './server.mjs';

/** @typedef {import('../machine/lifetime.mjs').Lifetime} Lifetime */

export function start() {
	return live(steps, { signalCode: () => 0, onSignal: () => say('\n  Stopping …') });
}

/** @param {Lifetime} life */
async function steps(life) {
	makeFolders();
	const record = takeRecord(join(KEPT, 'running.json'));
	life.onStop(record.drop);
	if (await stopLeftServer(record.left)) say('  A server that an earlier start left behind was stopped.');
	// Before the long steps, so that a port that cannot be had is told at once.
	const port = await webPort(process.env.PORT);
	requireRoom(KEPT);

	let since = performance.now();
	const told = (/** @type {string} */ name, /** @type {string} */ outcome) => {
		step(name, `${outcome} (${seconds(since)})`);
		life.checkpoint();
		since = performance.now();
	};
	told('packages', await installPackages());
	const database = await openDatabase(life, record);
	told('database', database.words);
	told('build', await buildIfChanged());
	await bundlePrograms();
	const accounts = await prepareDatabase(database);
	told('data', 'migrated, demo firm loaded');
	const mail = await startMail(life);

	const env = serverEnvironment({
		port,
		databaseUrl: database.appUrl,
		authSecret: process.env.AUTH_SECRET || localEnv().AUTH_SECRET,
		...mail
	});
	record.note({ address: env.ORIGIN });
	life.checkpoint();
	await startServer(life, { entry: copyBuild(), port, env, onStart: (mark) => record.note({ server: mark }) });
	told('server', 'answers');
	say(welcome(env.ORIGIN, accounts));
}

/** @param {Lifetime} life @param {ReturnType<typeof takeRecord>} record */
async function openDatabase(life, record) {
	// Read through node_modules, which the step before has just filled.
	const given = process.env.DATABASE_URL;
	if (given) {
		const { useDatabaseElsewhere } = await import('../database/elsewhere.mjs');
		const { adminUrl, appUrl, name } = await useDatabaseElsewhere(given);
		return { adminUrl, appUrl, words: `${name}, as DATABASE_URL says` };
	}
	const { startLocalDatabase } = await import('../database/local.mjs');
	let ours = true;
	const database = await startLocalDatabase(({ cluster, mark, wasRunning }) => {
		const leftByUs = record.left?.database?.pid === mark.pid && record.left.database.began === mark.began;
		ours = !wasRunning || leftByUs;
		if (!ours) return;
		record.note({ database: mark });
		life.onStop(() => stopCluster(cluster));
	});
	const { cluster, wasRunning } = database;
	const how = ours ? (wasRunning ? 'taken over from an earlier start' : 'started') : 'was running and will be left so';
	const words = `${database.made ? 'made and ' : ''}${how}, PostgreSQL ${cluster.programs.version} on port ${database.port}`;
	return { adminUrl: database.adminUrl, appUrl: database.appUrl, words };
}

/** @param {{ adminUrl: string, appUrl: string }} database */
async function prepareDatabase({ adminUrl, appUrl }) {
	const env = { DATABASE_ADMIN_URL: adminUrl, DATABASE_APP_PASSWORD: localEnv().DATABASE_APP_PASSWORD };
	await runProgram('migrate', { ...env, DATABASE_URL: appUrl }, 'migrating the database');
	return readAccounts(await runProgram('demo', { DATABASE_URL: appUrl }, 'loading the demo firm'));
}

/** @param {Lifetime} life */
async function startMail(life) {
	const { startMailFake } = await import('../fakes/mail.mjs');
	const { smtpUrl, inboxUrl, close } = await startMailFake({ folder: join(KEPT, 'mail') });
	life.onStop(close);
	return { smtpUrl, inboxUrl };
}
