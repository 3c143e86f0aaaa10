/** The stages of `npm test`: what each runs and how it is counted. */
import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { buildIfChanged, bundlePrograms } from '../machine/build.mjs';
import { wordsFor } from '../machine/lifetime.mjs';
import { npm } from '../machine/packages.mjs';
import { PROJECT } from '../machine/folders.mjs';
import { run } from '../machine/processes.mjs';
import { paint, say, seconds } from '../machine/say.mjs';
import { tallyOf } from './tally.mjs';

/**
 * @typedef {import('./tally.mjs').Tally} Tally
 * @typedef {{ name: string, run: () => Promise<Tally & { output?: string }> }} Stage
 */

const one = (/** @type {boolean} */ passed) => ({ passed: passed ? 1 : 0, failed: passed ? 0 : 1, remarks: [] });

/** A stage that is one script of package.json. @param {string} name @param {string} script @returns {Stage} */
export function scriptStage(name, script) {
	return {
		name,
		async run() {
			const [command, args] = npm('run', '--silent', script);
			const { code, output } = await run(command, args, { cwd: PROJECT });
			return { ...one(code === 0), output: code === 0 ? '' : output };
		}
	};
}

/** @type {Stage} */
export const buildStage = {
	name: 'build',
	async run() {
		try {
			const outcome = await buildIfChanged();
			await bundlePrograms();
			return { ...one(true), remarks: outcome === 'unchanged' ? ['of these very sources already there'] : [] };
		} catch (error) {
			const log = join(PROJECT, '.evendraft/log/build.log');
			const said = existsSync(log) ? readFileSync(log, 'utf8') : '';
			return { ...one(false), output: `${said}\n${wordsFor(error)}\n` };
		}
	}
};

/**
 * A stage that is one project of vitest, shown as it goes.
 * @param {string} name @param {string} folder for its report
 * @param {() => Promise<Record<string, string>>} environment
 * @param {string[]} [only] files or options for vitest
 * @returns {Stage}
 */
export function vitestStage(name, folder, environment, only = []) {
	return {
		name,
		async run() {
			const env = await environment();
			say(paint('bold', `\n${name}`));
			const report = join(folder, `${name}.json`);
			const vitest = join(PROJECT, 'node_modules/vitest/vitest.mjs');
			const args = ['run', '--project', name, '--reporter=default', '--reporter=json', `--outputFile.json=${report}`];
			const { code } = await run(process.execPath, [vitest, ...args, ...only], {
				cwd: PROJECT,
				env: { ...process.env, ...env },
				echo: true
			});
			return tallyOf(readReport(report), code);
		}
	};
}

/** @param {string} file @returns {import('./tally.mjs').VitestReport | null} */
function readReport(file) {
	try {
		return JSON.parse(readFileSync(file, 'utf8'));
	} catch {
		return null;
	}
}

/**
 * Runs a stage and says what came of it; a stage that crashes has failed.
 * @param {Stage} stage
 * @param {import('../machine/lifetime.mjs').Lifetime} life
 * @returns {Promise<{ passed: number, failed: number }>}
 */
export async function runStage(stage, life) {
	const since = performance.now();
	/** @type {Tally & { output?: string }} */
	let tally;
	try {
		tally = await stage.run();
	} catch (error) {
		tally = { ...one(false), output: wordsFor(error) + '\n' };
	}
	life.checkpoint();
	const { passed, failed, remarks, output } = tally;
	if (output) say(`\n${paint('bold', stage.name)}\n${output.trimEnd()}`);
	const verdict = failed ? paint('red', 'FAILED') : paint('green', 'passed');
	const counts = passed + failed > 1 ? `${passed} passed, ${failed} failed` : '';
	const details = [seconds(since), counts, ...remarks].filter(Boolean).join('; ');
	say(`${verdict}  ${stage.name.padEnd(8)} ${paint('dim', details)}`);
	return { passed, failed };
}
