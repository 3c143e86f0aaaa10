/** The command `node scripts/database.mjs`. */
import { existsSync } from 'node:fs';
import { stopCluster } from '../machine/cluster.mjs';
import { makeFolders } from '../machine/folders.mjs';
import { wordsFor } from '../machine/lifetime.mjs';
import { installPackages } from '../machine/packages.mjs';
import { runningPostmaster } from '../machine/postmaster.mjs';
import { complain, say } from '../machine/say.mjs';

/** @type {Record<string, () => Promise<void>>} */
const COMMANDS = {
	async start() {
		makeFolders();
		await installPackages();
		const { startLocalDatabase } = await import('./local.mjs');
		const { adminUrl, appUrl } = await startLocalDatabase();
		say(`DATABASE_ADMIN_URL=${adminUrl}`);
		say(`DATABASE_URL=${appUrl}`);
	},
	async stop() {
		const { localCluster } = await import('./local.mjs');
		await stopCluster(await localCluster());
		say('The local database is stopped.');
	},
	async status() {
		const { localCluster } = await import('./local.mjs');
		const { folder } = await localCluster();
		const running = existsSync(folder) ? runningPostmaster(folder) : null;
		say(running ? `Running on 127.0.0.1:${running.port} from ${folder}.` : `Not running (${folder}).`);
	}
};

/** @param {string | undefined} name */
export async function databaseCommand(name) {
	const command = name && Object.hasOwn(COMMANDS, name) ? COMMANDS[name] : null;
	try {
		if (command) await command();
		else complain('Say what to do: node scripts/database.mjs start | stop | status');
		process.exitCode = command ? 0 : 1;
	} catch (error) {
		complain(wordsFor(error));
		process.exitCode = 1;
	}
}
