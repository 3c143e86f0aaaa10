/** Runs one of the bundled programs in .evendraft/programs/. */
import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { fullDisk, tellsOfFullDisk } from '../machine/disk.mjs';
import { KEPT, LOGS, PROJECT } from '../machine/folders.mjs';
import { run } from '../machine/processes.mjs';
import { Refusal } from '../machine/say.mjs';

/**
 * @param {string} name
 * @param {Record<string, string>} env
 * @param {string} what it does, for the words of a refusal
 * @returns {Promise<string>} what it printed
 */
export async function runProgram(name, env, what) {
	const { code, output } = await run(process.execPath, [join(KEPT, 'programs', `${name}.mjs`)], {
		cwd: PROJECT,
		env: { ...process.env, ...env }
	});
	if (code === 0) return output;
	writeFileSync(join(LOGS, `${name}.log`), output);
	if (tellsOfFullDisk(output)) throw fullDisk(what);
	const reason = output.trim().split('\n').at(-1) || 'it gave no reason';
	throw new Refusal(`${name} failed (${reason}; see .evendraft/log/${name}.log): mend that and run the command again.`);
}
