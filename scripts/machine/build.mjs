/** The production build and the small programs, made again only when what they are made of has changed. */
import { createHash } from 'node:crypto';
import { cpSync, existsSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join, relative } from 'node:path';
import { KEPT, LOGS, PROJECT } from './folders.mjs';
import { fullDisk, tellsOfFullDisk } from './disk.mjs';
import { npm } from './packages.mjs';
import { run } from './processes.mjs';
import { Refusal } from './say.mjs';

const SOURCES = ['src', 'static', 'package.json', 'package-lock.json'];
const CONFIGURATION = /^(svelte|vite|postcss|tailwind)\.config\.[jt]s$|^tsconfig\.json$/;

/** @param {string} path @returns {string[]} the files below it, in order */
function filesBelow(path) {
	if (!existsSync(path)) return [];
	const entries = readdirSync(path, { withFileTypes: true, recursive: true });
	return entries
		.filter((entry) => entry.isFile())
		.map((entry) => join(entry.parentPath, entry.name))
		.sort();
}

/** @param {string[]} files @param {string} base */
function hashOf(files, base) {
	const hash = createHash('sha256');
	for (const file of files) {
		const content = readFileSync(file);
		hash.update(`${relative(base, file)}\0${content.length}\0`).update(content);
	}
	return hash.digest('hex');
}

/** @param {string} project what the build depends on */
export function sourcesHash(project) {
	const top = readdirSync(project).filter((name) => CONFIGURATION.test(name));
	const files = [...SOURCES, ...top].flatMap((name) => {
		const path = join(project, name);
		return /\.[a-z]+$/.test(name) ? [path] : filesBelow(path).filter((file) => !/\.test\.[jt]s$/.test(file));
	});
	return `${process.versions.node} ${hashOf(files, project)}`;
}

/** @param {string} project what the build gave */
const builtHash = (project) => hashOf(filesBelow(join(project, 'build')), project);

/**
 * Builds unless the build at hand was made from these sources and nobody has touched it since.
 * @param {{ echo?: boolean }} [how] echo: show what the build says
 * @returns {Promise<'unchanged' | 'built'>}
 */
export async function buildIfChanged({ echo } = {}) {
	const stamp = join(KEPT, 'build.sha256');
	const sources = sourcesHash(PROJECT);
	const noted = existsSync(stamp) ? readFileSync(stamp, 'utf8') : '';
	if (existsSync(join(PROJECT, 'build/index.js')) && noted === `${sources}\n${builtHash(PROJECT)}\n`)
		return 'unchanged';
	rmSync(stamp, { force: true });
	const [command, args] = npm('run', '--silent', 'build');
	const env = { ...process.env, NODE_ENV: 'production' };
	const { code, output } = await run(command, args, { cwd: PROJECT, env, echo });
	writeFileSync(join(LOGS, 'build.log'), output);
	if (code !== 0) throw buildTrouble(output);
	writeFileSync(stamp, `${sources}\n${builtHash(PROJECT)}\n`);
	return 'built';
}

/** Copies the build to where it is served from, so that another build or a test run does not pull files from under it. */
export function copyBuild() {
	const served = join(KEPT, 'served');
	rmSync(served, { recursive: true, force: true });
	cpSync(join(PROJECT, 'build'), served, { recursive: true });
	return join(served, 'index.js');
}

/** @param {string} output */
function buildTrouble(output) {
	if (tellsOfFullDisk(output)) return fullDisk('building');
	const reason = output.match(/^.*\berror\b.*$/im)?.[0].trim();
	return new Refusal(
		`The build failed (${reason ?? 'it gave no reason'}; see .evendraft/log/build.log): mend that and run the command again.`
	);
}

/** Bundles every program in scripts/programs/. */
export async function bundlePrograms() {
	const { bundle } = await import('../bundle.mjs');
	const names = readdirSync(join(PROJECT, 'scripts/programs'))
		.filter((name) => /^[\w-]+\.ts$/.test(name))
		.map((name) => name.slice(0, -'.ts'.length));
	for (const name of names) await bundle(name);
}
