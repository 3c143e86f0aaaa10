/**
 * Builds scripts/programs/NAME.ts, with all it imports from src, into one module for Node: .evendraft/programs/NAME.mjs.
 * Packages stay outside. It builds only when a source is newer than the module, and writes nothing to standard output.
 */
import { mkdirSync, readdirSync, readFileSync, renameSync, statSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';

const ROOT = path.dirname(path.dirname(fileURLToPath(import.meta.url)));
const OUT = path.join(ROOT, '.evendraft', 'programs');

/** Whether the packages are installed. */
export function installed() {
	return exists(path.join(ROOT, 'node_modules', 'vite', 'package.json'));
}

/**
 * @param {string} name of a program in scripts/programs, without ending
 * @returns {Promise<string>} the path of the module
 */
export async function bundle(name) {
	const entry = path.join(ROOT, 'scripts', 'programs', `${name}.ts`);
	const module = path.join(OUT, `${name}.mjs`);
	if (isFresh(module)) return module;
	if (!installed()) {
		process.stderr.write('The packages are not installed: run `npm ci` first.\n');
		process.exit(1);
	}
	const { build } = await import('vite');
	const result = await build({
		root: ROOT,
		configFile: false,
		envFile: false,
		logLevel: 'silent',
		publicDir: false,
		resolve: { alias: [{ find: '$lib', replacement: path.join(ROOT, 'src', 'lib') }] },
		build: {
			ssr: entry,
			target: 'node20',
			write: false,
			sourcemap: false,
			minify: false,
			rollupOptions: { external: isPackage, output: { format: 'es', codeSplitting: false } }
		}
	});
	const { output } = Array.isArray(result) ? result[0] : result;
	const chunk = output.find((part) => part.type === 'chunk' && part.isEntry);
	mkdirSync(OUT, { recursive: true });
	// Written aside and renamed: another process never reads half a module.
	const draft = path.join(OUT, `.${name}-${process.pid}.mjs`);
	writeFileSync(draft, chunk.code);
	renameSync(draft, module);
	return module;
}

function isPackage(id) {
	if (id.startsWith('.') || id.startsWith('$lib') || path.isAbsolute(id) || id.startsWith('\0')) return false;
	return true;
}

/** Newer than every source, and than the packages. */
function isFresh(module) {
	const built = changed(module);
	if (built === 0 || readFileSync(module).length === 0) return false;
	const places = ['package-lock.json', 'scripts/bundle.mjs', 'scripts/programs', 'src', 'tests/bench'];
	return places.every((place) => latest(path.join(ROOT, place)) < built);
}

/** Latest change of a file, or of anything below a folder; a removed file shows as a change of its folder. */
function latest(place) {
	let time = changed(place);
	if (!statSync(place, { throwIfNoEntry: false })?.isDirectory()) return time;
	for (const entry of readdirSync(place, { withFileTypes: true })) {
		const inner = path.join(place, entry.name);
		time = Math.max(time, entry.isDirectory() ? latest(inner) : changed(inner));
	}
	return time;
}

function changed(file) {
	return statSync(file, { throwIfNoEntry: false })?.mtimeMs ?? 0;
}

function exists(file) {
	return changed(file) > 0;
}
