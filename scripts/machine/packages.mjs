/** The npm packages, exactly as the lock file has them. */
import { createHash } from 'node:crypto';
import { existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { fullDisk, tellsOfFullDisk } from './disk.mjs';
import { KEPT, LOGS, PROJECT } from './folders.mjs';
import { run } from './processes.mjs';
import { paint, Refusal, say } from './say.mjs';

/** npm itself, as it was called or as it stands on the PATH. @param {string[]} args @returns {[string, string[]]} */
export function npm(...args) {
	const called = process.env.npm_execpath;
	return called && /npm-cli\.c?js$/.test(called) ? [process.execPath, [called, ...args]] : ['npm', args];
}

/**
 * Whether what npm noted in node_modules is what the lock asks for.
 * @param {string} project
 */
export function packagesMatchLock(project) {
	const noted = join(project, 'node_modules/.package-lock.json');
	if (!existsSync(noted)) return false;
	/** @typedef {Record<string, { version?: string, integrity?: string, optional?: boolean }>} Packages */
	/** @type {Packages} */
	const asked = JSON.parse(readFileSync(join(project, 'package-lock.json'), 'utf8')).packages;
	/** @type {Packages} */
	const there = JSON.parse(readFileSync(noted, 'utf8')).packages;
	return Object.entries(asked).every(([path, { version, integrity, optional }]) => {
		if (path === '') return true;
		const found = there[path];
		// Packages for other processors and systems are in the lock but rightly not here.
		if (!found) return optional === true;
		return found.version === version && found.integrity === integrity && existsSync(join(project, path));
	});
}

/** @returns {Promise<'unchanged' | 'installed'>} */
export async function installPackages() {
	const stamp = join(KEPT, 'packages.sha256');
	const hash = createHash('sha256')
		.update(readFileSync(join(PROJECT, 'package-lock.json')))
		.digest('hex');
	const stamped = existsSync(stamp) && readFileSync(stamp, 'utf8').trim() === hash;
	if (stamped && existsSync(join(PROJECT, 'node_modules/.package-lock.json'))) return 'unchanged';
	if (packagesMatchLock(PROJECT)) {
		writeFileSync(stamp, hash);
		return 'unchanged';
	}
	rmSync(stamp, { force: true });
	say(paint('dim', '  Installing the npm packages from the lock file (half a minute or so) …'));
	// NODE_ENV=production would leave out what the build needs.
	const [command, args] = npm('ci', '--include=dev', '--no-audit', '--no-fund');
	const { code, output } = await run(command, args, { cwd: PROJECT });
	writeFileSync(join(LOGS, 'npm-ci.log'), output);
	if (code !== 0) throw npmTrouble(output);
	writeFileSync(stamp, hash);
	return 'installed';
}

/** @param {string} output of npm ci */
export function npmTrouble(output) {
	if (tellsOfFullDisk(output)) return fullDisk('installing the npm packages');
	if (/EAI_AGAIN|ENOTFOUND|ECONNREFUSED|ETIMEDOUT|ENETUNREACH|ECONNRESET/.test(output))
		return new Refusal(
			'The npm packages could not be fetched: connect this machine to the network and run the command again.'
		);
	if (/EACCES|EPERM/.test(output))
		return new Refusal(
			'node_modules cannot be written by this user: run the command as the user who owns the project, or remove node_modules.'
		);
	if (/can only install packages when your package\.json and package-lock\.json/.test(output))
		return new Refusal(
			"package.json and package-lock.json do not agree: take both from git again, or run 'npm install'."
		);
	const reason = output.match(/^npm (?:error|ERR!) (?!code|A complete log).*/m)?.[0] ?? 'npm gave no reason';
	return new Refusal(`npm ci failed (${reason}; see .evendraft/log/npm-ci.log): mend that and run the command again.`);
}
