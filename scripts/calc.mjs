/** `npm run --silent calc -- FILE`: a design document in, its solution out. Needs neither a database nor a server. */
import { spawnSync } from 'node:child_process';
import path from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { bundle, installed } from './bundle.mjs';

if (!installed()) {
	const root = path.dirname(path.dirname(fileURLToPath(import.meta.url)));
	process.stderr.write('Installing the packages once.\n');
	// Its output goes to standard error: standard output is the solution's alone.
	const { status } = spawnSync('npm', ['ci'], { cwd: root, stdio: ['ignore', 2, 2] });
	if (status !== 0) process.exit(status ?? 1);
}

const { calc } = await import(pathToFileURL(await bundle('calc')).href);
process.exitCode = calc(process.argv.slice(2));
