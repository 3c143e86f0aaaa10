/** The steps of `npm test`, and its last line. */
import { KEPT, makeFolders } from '../machine/folders.mjs';
import { installDebianPackage, onPath } from '../machine/debian.mjs';
import { requireRoom } from '../machine/disk.mjs';
import { live, wordsFor } from '../machine/lifetime.mjs';
import { installPackages } from '../machine/packages.mjs';
import { complain, Interrupted, paint, Refusal, say, seconds } from '../machine/say.mjs';
import { buildStage, runStage, scriptStage, vitestStage } from './stages.mjs';
import { clearLeftRuns, makeRunFolder, removeRun, RUN_MARK, startThrowAway } from './throw-away.mjs';

const PARTS = ['unit', 'server', 'e2e'];
const SIGNALS = /** @type {Record<string, number>} */ ({ SIGHUP: 129, SIGINT: 130, SIGTERM: 143 });

/** @typedef {import('../machine/lifetime.mjs').Lifetime} Lifetime */
/** @typedef {import('./stages.mjs').Stage} Stage */

/** @param {string[]} words of the command line: a part, and what vitest is to be told */
export function test([part, ...only]) {
	if (process.stdout.isTTY && !process.env.CI) process.env.FORCE_COLOR ??= '1';
	else {
		delete process.env.FORCE_COLOR;
		process.env.NO_COLOR = '1';
	}
	// Tests never reach a database that somebody works with.
	for (const name of ['DATABASE_URL', 'DATABASE_ADMIN_URL', 'DATABASE_APP_PASSWORD']) delete process.env[name];
	return live((life) => runTests(life, part, only), { signalCode: (signal) => SIGNALS[signal] ?? 1 });
}

/**
 * @param {Lifetime} life @param {string | undefined} part @param {string[]} only
 */
async function runTests(life, part, only) {
	const since = performance.now();
	const total = { passed: 0, failed: 0 };
	let finished = false;
	// Registered first, so it comes last, when all that ran has been stopped.
	life.onStop(() => {
		if (life.signalled) return complain('The tests were broken off.');
		if (!finished) total.failed += 1;
		say(paint('dim', `\nAll in ${seconds(since)}`));
		say(`${total.passed} passed, ${total.failed} failed`);
	});
	try {
		await plan(life, part, only, async (stage) => {
			life.checkpoint();
			const { passed, failed } = await runStage(stage, life);
			total.passed += passed;
			total.failed += failed;
			return failed === 0;
		});
	} catch (error) {
		if (error instanceof Interrupted) return;
		complain(wordsFor(error));
		total.failed += 1;
	}
	finished = true;
	life.end(total.failed ? 1 : 0);
}

/**
 * Sets up what the stages need and carries them out.
 * @param {Lifetime} life @param {string | undefined} part @param {string[]} only
 * @param {(stage: Stage) => Promise<boolean>} carryOut
 */
async function plan(life, part, only, carryOut) {
	if (part !== undefined && !PARTS.includes(part))
		throw new Refusal(`There is no part '${part}': say npm test, or npm test unit, server or e2e.`);
	makeFolders();
	requireRoom(KEPT);
	await installPackages();
	life.checkpoint();
	await clearLeftRuns();
	const folder = makeRunFolder();
	life.onStop(() => removeRun(folder));
	const wanted = (/** @type {string} */ name) => part === undefined || part === name;

	const cluster = once(() => startThrowAway(folder));
	const mark = { [RUN_MARK]: folder };
	const withDatabase = async () => {
		const { adminUrl, appPassword } = await cluster();
		return { ...mark, TEST_DATABASE_ADMIN_URL: adminUrl, TEST_DATABASE_APP_PASSWORD: appPassword };
	};
	const withBrowser = async () => ({ ...(await withDatabase()), CHROMIUM: await requireChromium() });

	let built = true;
	const build = async () => {
		built = await carryOut(buildStage);
	};
	if (part === undefined) {
		// Two at a time, each telling only when it is done.
		const first = async () => {
			await carryOut(scriptStage('types', 'check'));
			await build();
		};
		const second = async () => {
			await carryOut(scriptStage('format', 'format:check'));
			await carryOut(scriptStage('lint', 'lint'));
		};
		const lanes = await Promise.allSettled([first(), second()]);
		for (const lane of lanes) if (lane.status === 'rejected') throw lane.reason;
	} else if (part === 'e2e') await build();
	if (wanted('unit')) await carryOut(vitestStage('unit', folder, async () => mark, only));
	if (wanted('server')) await carryOut(vitestStage('server', folder, withDatabase, only));
	if (wanted('e2e')) await carryOut(built ? vitestStage('e2e', folder, withBrowser, only) : unbuilt);
}

/** @type {Stage} */
const unbuilt = {
	name: 'e2e',
	run: async () => ({ passed: 0, failed: 1, remarks: ['not run, for want of a build'] })
};

/** @template T @param {() => Promise<T>} make @returns {() => Promise<T>} */
function once(make) {
	/** @type {Promise<T> | undefined} */
	let made;
	return () => (made ??= make());
}

async function requireChromium() {
	const find = () => process.env.CHROMIUM || onPath('chromium');
	const there = find();
	if (there) return there;
	await installDebianPackage('chromium', 'set CHROMIUM to the path of one');
	const installed = find();
	if (!installed) throw new Refusal("Debian's chromium is installed but is not on the PATH: set CHROMIUM to its path.");
	return installed;
}
