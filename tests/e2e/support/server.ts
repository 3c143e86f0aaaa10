/** The production build as a process that can be killed and started again under the same address. */
import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { setTimeout as delay } from 'node:timers/promises';
import { freePort } from '../../../scripts/machine/ports.mjs';
import { serverEnvironment } from '../../../scripts/start/environment.mjs';

const FIRST = 5_400;
const LAST = 5_599;
const PATIENCE_ms = 30_000;

export interface Server {
	/** Address as people type it. */
	readonly origin: string;
	readonly start: () => Promise<void>;
	/** Ends it at once by SIGKILL, without a chance to finish anything. */
	readonly kill: () => Promise<void>;
	readonly isRunning: () => boolean;
	/** What it wrote, for the words of a failure. */
	readonly log: () => string;
}

interface Around {
	readonly databaseUrl: string;
	readonly smtpUrl: string;
	readonly inboxUrl: string;
}

/** A server on a free port of loopback; not yet started. */
export async function makeServer(around: Around): Promise<Server> {
	const port = await freePort(FIRST, LAST, FIRST + (process.pid % (LAST - FIRST)));
	const env = serverEnvironment({ ...around, port, authSecret: 'a secret for tests alone, 32 or more' });
	let child: ChildProcess | null = null;
	let log = '';

	async function answers(): Promise<boolean> {
		try {
			return (await fetch(`http://127.0.0.1:${port}/api/v1/health`)).ok;
		} catch {
			return false;
		}
	}

	async function start(): Promise<void> {
		const running = spawn(process.execPath, ['build/index.js'], { env: { ...process.env, ...env }, stdio: 'pipe' });
		child = running;
		for (const stream of [running.stdout, running.stderr]) stream.on('data', (text) => (log += String(text)));
		const until = performance.now() + PATIENCE_ms;
		while (!(await answers())) {
			if (running.exitCode !== null || performance.now() > until)
				throw new Error(`the server does not answer:\n${log}`);
			await delay(50);
		}
	}

	async function kill(): Promise<void> {
		const running = child;
		child = null;
		if (!running || running.exitCode !== null || running.signalCode !== null) return;
		const ended = once(running, 'exit');
		running.kill('SIGKILL');
		await ended;
	}

	return { origin: env.ORIGIN ?? '', start, kill, isRunning: () => child !== null, log: () => log };
}
