/** `npm test [unit|server|e2e]`: the one test command. The version of Node.js is looked at first. */
import { nodeVersionProblem } from './machine/node-version.mjs';

const problem = nodeVersionProblem(process.versions.node);
if (problem) {
	process.stderr.write(problem + '\n');
	process.stdout.write('0 passed, 1 failed\n');
	process.exitCode = 1;
} else {
	import('./test/test.mjs').then(({ test }) => test(process.argv.slice(2)));
}
