/** Programs that the commands start: each in a process group of its own, stopped by its id. */
import { spawn } from 'node:child_process';
import { readdirSync, readFileSync } from 'node:fs';
import { setTimeout as delay } from 'node:timers/promises';

/**
 * @typedef {{ uid: number, gid: number }} Account the user that a program runs as, when not the one who called
 * @typedef {{ code: number | null, output: string }} Outcome
 */

/** Short programs that may be broken off when a stop is asked for. */
const breakable = new Set();

/**
 * Runs a short program to its end and gathers what it says.
 *
 * @param {string} command
 * @param {string[]} args
 * @param {{ cwd?: string, env?: NodeJS.ProcessEnv, account?: Account | null, hold?: boolean, foreground?: boolean,
 *   echo?: boolean }} [how] hold: never broken off (a half-started database helps nobody); foreground: stays in the
 *   terminal's group, so that sudo may ask for a password; echo: its output also goes to ours
 * @returns {Promise<Outcome>} code is null when a signal ended it or it could not be run
 */
export function run(command, args, how = {}) {
	return new Promise((resolve) => {
		const child = spawn(command, args, {
			cwd: how.cwd,
			env: how.env ?? process.env,
			detached: !how.foreground,
			stdio: [how.foreground ? 'inherit' : 'ignore', 'pipe', 'pipe'],
			...how.account
		});
		let output = '';
		const gather = (/** @type {Buffer} */ chunk) => {
			output += chunk;
			if (how.echo) process.stdout.write(chunk);
		};
		child.stdout.on('data', gather);
		child.stderr.on('data', gather);
		if (!how.hold) breakable.add(child);
		const done = (/** @type {number | null} */ code) => {
			breakable.delete(child);
			resolve({ code, output });
		};
		child.once('error', (error) => {
			output += error.message;
			done(null);
		});
		child.once('close', (code) => done(code));
	});
}

/** Breaks off the short programs that are still running. */
export function breakOff() {
	for (const child of breakable) if (child.pid) signalGroup(child.pid, 'SIGTERM');
}

/** @param {number} pid @param {NodeJS.Signals} signal */
export function signalGroup(pid, signal) {
	// A program in the foreground leads no group: then it alone is meant.
	for (const target of [-pid, pid]) {
		try {
			process.kill(target, signal);
			return;
		} catch (error) {
			if (/** @type {NodeJS.ErrnoException} */ (error).code !== 'ESRCH') return;
		}
	}
}

/**
 * Stops a program and its group: asks first, insists after a while.
 * @param {ProcessMark} mark @param {number} [patience] milliseconds
 */
export async function stopGroup(mark, patience = 6000) {
	signalGroup(mark.pid, 'SIGTERM');
	const until = performance.now() + patience;
	while (isAlive(mark) && performance.now() < until) await delay(50);
	try {
		process.kill(-mark.pid, 'SIGKILL');
	} catch {
		// The whole group has gone already.
	}
}

/**
 * A process by its id and the moment it began: an id alone may be given to a stranger after a restart.
 * @typedef {{ pid: number, began: string }} ProcessMark
 */

/** @param {number} pid @returns {{ state: string, began: string } | null} null when there is none */
function processState(pid) {
	try {
		const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
		// The name in brackets may hold spaces and brackets; what follows the last one is regular.
		const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
		const boot = readFileSync('/proc/sys/kernel/random/boot_id', 'utf8').trim();
		return { state: fields[0], began: `${boot} ${fields[19]}` };
	} catch {
		return null;
	}
}

/** @param {number} pid @returns {ProcessMark} */
export function markOf(pid) {
	return { pid, began: processState(pid)?.began ?? '' };
}

/** @param {ProcessMark | null | undefined} mark */
export function isAlive(mark) {
	if (!mark) return false;
	const found = processState(mark.pid);
	return found !== null && found.state !== 'Z' && found.state !== 'X' && found.began === mark.began;
}

/**
 * Stops every process that carries a variable with this value: those that were started with it and all that they
 * started in turn, also in groups of their own, as a browser's are.
 * @param {string} name @param {string} value
 */
export async function stopMarked(name, value) {
	const wanted = `${name}=${value}`;
	const marked = readdirSync('/proc').filter((pid) => {
		if (!/^\d+$/.test(pid) || Number(pid) === process.pid) return false;
		try {
			return readFileSync(`/proc/${pid}/environ`, 'utf8').split('\0').includes(wanted);
		} catch {
			return false;
		}
	});
	const marks = marked.map((pid) => markOf(Number(pid)));
	const send = (/** @type {NodeJS.Signals} */ signal) => {
		for (const mark of marks) {
			try {
				if (isAlive(mark)) process.kill(mark.pid, signal);
			} catch {
				// It went in this very moment.
			}
		}
	};
	send('SIGTERM');
	for (let n = 0; n < 40 && marks.some(isAlive); n++) await delay(50);
	send('SIGKILL');
}
