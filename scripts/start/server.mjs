/** The web server: the production build as a process of its own, its words kept in .evendraft/log/server.log. */
import { spawn } from 'node:child_process';
import { createWriteStream, existsSync, renameSync, statSync } from 'node:fs';
import { get } from 'node:http';
import { join } from 'node:path';
import { createInterface } from 'node:readline';
import { setTimeout as delay } from 'node:timers/promises';
import { LOGS, PROJECT } from '../machine/folders.mjs';
import { isAlive, markOf, stopGroup } from '../machine/processes.mjs';
import { complain, Interrupted, Refusal } from '../machine/say.mjs';

const LOG_LIMIT = 5e6;
const ERROR_LEVEL = 50;
const PATIENCE = 30_000;
/** The solution of 10,000 rows is 17 MB: with the usual room for new objects it would be copied several times as it grows [MB]. */
const ROOM_FOR_SOLUTIONS = '--max-semi-space-size=64';

/** @param {string} line of the log @returns {string | null} an error in words, null for anything less */
export function errorIn(line) {
	try {
		const entry = JSON.parse(line);
		if (typeof entry?.level === 'number' && entry.level < ERROR_LEVEL) return null;
		return [entry.msg, entry.err?.message].filter(Boolean).join(': ') || line;
	} catch {
		return null;
	}
}

/**
 * Starts the server and waits until it answers.
 *
 * @param {import('../machine/lifetime.mjs').Lifetime} life that it stops with, and that ends when it dies by itself
 * @param {{ entry: string, port: number, env: Record<string, string>,
 *   onStart: (mark: import('../machine/processes.mjs').ProcessMark) => void }} how
 */
export async function startServer(life, { entry, port, env, onStart }) {
	const file = join(LOGS, 'server.log');
	if (existsSync(file) && statSync(file).size > LOG_LIMIT) renameSync(file, `${file}.1`);
	const log = createWriteStream(file, { flags: 'a', mode: 0o600 });
	log.on('error', (error) => complain(`The server's log cannot be written: ${error.message}`));
	const child = spawn(process.execPath, [ROOM_FOR_SOLUTIONS, entry], {
		cwd: PROJECT,
		env: { ...process.env, ...env },
		detached: true,
		stdio: ['ignore', 'pipe', 'pipe']
	});
	/** @type {string | null} */
	let death = null;
	let answers = false;
	child.once('error', (error) => (death = error.message));
	child.once('exit', (code, signal) => {
		death = signal ? `signal ${signal}` : `exit code ${code}`;
		if (!answers || life.stopping) return;
		complain(`The server ended by itself (${death}): see .evendraft/log/server.log. The rest is being stopped.`);
		life.end(1);
	});
	createInterface({ input: child.stdout }).on('line', (line) => {
		log.write(line + '\n');
		const error = errorIn(line);
		if (error) complain(`server: ${error}`);
	});
	createInterface({ input: child.stderr }).on('line', (line) => {
		log.write(line + '\n');
		complain(`server: ${line}`);
	});
	const mark = markOf(child.pid ?? 0);
	onStart(mark);
	life.onStop(async () => {
		if (isAlive(mark)) await stopGroup(mark);
		log.end();
	});
	await untilItAnswers(port, () => {
		if (life.stopping) throw new Interrupted();
		if (death !== null) throw new Refusal(`The server ended at once (${death}): see .evendraft/log/server.log.`);
	});
	answers = true;
}

/** @param {number} port @param {() => void} checkpoint throws when there is nothing left to wait for */
async function untilItAnswers(port, checkpoint) {
	const until = performance.now() + PATIENCE;
	let last = 'no answer';
	while (performance.now() < until) {
		checkpoint();
		const status = await frontPageStatus(port);
		if (status !== null && status < 500) return;
		last = status === null ? 'no answer' : `status ${status}`;
		await delay(100);
	}
	throw new Refusal(`The server does not serve its front page (${last}): see .evendraft/log/server.log.`);
}

/** @param {number} port any, also one that fetch refuses @returns {Promise<number | null>} null when there is no answer */
function frontPageStatus(port) {
	return new Promise((resolve) => {
		const request = get({ host: '127.0.0.1', port, path: '/', timeout: 5000 }, (response) => {
			response.resume();
			resolve(response.statusCode ?? null);
		});
		request.once('timeout', () => request.destroy());
		request.once('error', () => resolve(null));
	});
}
