/** `npm start`: sets everything up and serves Evendraft on this machine. The version of Node.js is looked at first. */
import { nodeVersionProblem } from './machine/node-version.mjs';

const problem = nodeVersionProblem(process.versions.node);
if (problem) {
	process.stderr.write(problem + '\n');
	process.exitCode = 1;
} else {
	import('./start/start.mjs').then(({ start }) => start());
}
