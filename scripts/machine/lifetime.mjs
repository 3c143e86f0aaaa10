/**
 * The lifetime of a command: what was started is stopped again, last first, whatever ends it (its own end, an error,
 * Ctrl-C, SIGTERM, a closed terminal).
 */
import { setTimeout as delay } from 'node:timers/promises';
import { fullDisk, tellsOfFullDisk } from './disk.mjs';
import { breakOff } from './processes.mjs';
import { complain, Interrupted, Refusal } from './say.mjs';

/**
 * @typedef {object} Lifetime
 * @property {(undo: () => unknown) => void} onStop keeps what is to be undone at the end
 * @property {() => void} checkpoint throws Interrupted once a stop was asked for
 * @property {boolean} stopping
 * @property {boolean} signalled the stop was asked for from outside
 * @property {(code: number) => void} end
 */

/** @param {unknown} error @returns {string} one line where the reader can mend it, else all that is known */
export function wordsFor(error) {
	if (error instanceof Refusal) return error.message;
	if (!(error instanceof Error)) return String(error);
	if (tellsOfFullDisk(error.message)) return fullDisk('writing files').message;
	const { code, path } = /** @type {NodeJS.ErrnoException} */ (error);
	if (code === 'EACCES' || code === 'EPERM' || code === 'EROFS')
		return `${path ?? error.message} cannot be written or read by this user: run the command as the user who owns the folder.`;
	return error.stack ?? error.message;
}

/**
 * Runs `main`, waits until the lifetime ends, undoes, and leaves the process. Never returns.
 *
 * @param {(life: Lifetime) => Promise<void>} main
 * @param {{ signalCode: (signal: NodeJS.Signals) => number, onSignal?: () => void }} how
 */
export async function live(main, how) {
	/** @type {(() => unknown)[]} */
	const undo = [];
	/** @type {(code: number) => void} */
	let finish = () => {};
	/** @type {Promise<number>} */
	const finished = new Promise((resolve) => (finish = resolve));
	const life = {
		stopping: false,
		signalled: false,
		onStop: (/** @type {() => unknown} */ step) => void undo.push(step),
		checkpoint() {
			if (life.stopping) throw new Interrupted();
		},
		end(/** @type {number} */ code) {
			life.stopping = true;
			finish(code);
		}
	};
	const fail = (/** @type {unknown} */ error) => {
		if (life.stopping) return;
		complain(wordsFor(error));
		life.end(1);
	};
	// A second Ctrl-C changes nothing: npm passes the terminal's signal on, so each arrives twice.
	const stop = (/** @type {NodeJS.Signals} */ signal) => {
		if (life.stopping) return;
		life.signalled = true;
		how.onSignal?.();
		life.end(how.signalCode(signal));
	};
	for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) process.on(signal, () => stop(signal));
	watchNpm(() => stop('SIGTERM'));
	process.on('uncaughtException', fail);
	process.on('unhandledRejection', fail);

	const work = main(life).catch(fail);
	const code = await finished;
	breakOff();
	await Promise.race([work, delay(130_000)]);
	for (const step of undo.reverse()) {
		try {
			await step();
		} catch (error) {
			complain(wordsFor(error));
		}
	}
	process.exit(code);
}

/**
 * npm hands a SIGTERM to the shell between it and us, which dies of it and tells nobody: its end is taken for the signal.
 * @param {() => void} gone
 */
function watchNpm(gone) {
	if (!process.env.npm_lifecycle_event) return;
	const shell = process.ppid;
	const watch = setInterval(() => {
		if (process.ppid === shell) return;
		clearInterval(watch);
		gone();
	}, 250);
	watch.unref();
}
