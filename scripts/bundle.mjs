/**
 * Builds scripts/programs/NAME.ts, with all it imports from src, into one module for Node: .evendraft/programs/NAME.mjs.
 * Packages stay outside. It builds only when a file that went into the module has changed since, and writes nothing to
 * standard output.
 */
import { mkdirSync, readFileSync, renameSync, statSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';

const ROOT = path.dirname(path.dirname(fileURLToPath(import.meta.url)));
const OUT = path.join(ROOT, '.evendraft', 'programs');
const TSCONFIG = 'src/lib/engine/tsconfig.json';
/** What every program depends on beside its own sources. */
const ALWAYS = ['package-lock.json', 'scripts/bundle.mjs', TSCONFIG];

/** Whether the packages are installed. */
export function installed() {
	return statOf('node_modules/vite/package.json') !== undefined;
}

/**
 * @param {string} name of a program in scripts/programs, without ending
 * @returns {Promise<string>} the path of the module
 */
export async function bundle(name) {
	const module = path.join(OUT, `${name}.mjs`);
	if (isFresh(name)) return module;
	if (!installed()) {
		process.stderr.write('The packages are not installed: run `npm ci` first.\n');
		process.exit(1);
	}
	const started = Date.now();
	const chunk = await built(path.join(ROOT, 'scripts', 'programs', `${name}.ts`));
	const sources = chunk.moduleIds
		.filter((id) => path.isAbsolute(id))
		.map((id) => path.relative(ROOT, id.split('?')[0]));
	mkdirSync(OUT, { recursive: true });
	put(module, chunk.code);
	put(listOf(name), JSON.stringify(statesOf([...ALWAYS, ...sources], started)));
	return module;
}

async function built(entry) {
	const { build } = await import('vite');
	const result = await build({
		root: ROOT,
		configFile: false,
		envFile: false,
		logLevel: 'silent',
		publicDir: false,
		// One that stands on its own: the general one extends a file that only SvelteKit makes.
		tsconfig: TSCONFIG,
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
	return output.find((part) => part.type === 'chunk' && part.isEntry);
}

function isPackage(id) {
	return !(id.startsWith('.') || id.startsWith('$lib') || id.startsWith('\0') || path.isAbsolute(id));
}

/** @returns {boolean} whether the module is there and made of the files as they are now */
function isFresh(name) {
	if (statOf(path.join(OUT, `${name}.mjs`)) === undefined || statOf(listOf(name)) === undefined) return false;
	const states = JSON.parse(readFileSync(listOf(name), 'utf8'));
	return Object.entries(states).every(([file, state]) => state === stateOf(file));
}

function listOf(name) {
	return path.join(OUT, `${name}.json`);
}

/** Time and size of each file; one that changed while the module was made counts as changed after it. */
function statesOf(files, started) {
	return Object.fromEntries(
		files.map((file) => [file, (statOf(file)?.mtimeMs ?? started) >= started ? '' : stateOf(file)])
	);
}

function stateOf(file) {
	const stat = statOf(file);
	return stat === undefined ? 'absent' : `${stat.mtimeMs} ${stat.size}`;
}

function statOf(file) {
	return statSync(path.resolve(ROOT, file), { throwIfNoEntry: false });
}

/** Written aside and renamed: another process never reads half a file. */
function put(file, text) {
	const draft = `${file}.${process.pid}`;
	writeFileSync(draft, text);
	renameSync(draft, file);
}
