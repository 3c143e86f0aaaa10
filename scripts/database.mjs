/**
 * The local database on its own, for work on the project: `node scripts/database.mjs start | stop | status`.
 * What it starts stays until it is stopped; `npm start` then uses it and leaves it running.
 */
import { nodeVersionProblem } from './machine/node-version.mjs';

const problem = nodeVersionProblem(process.versions.node);
if (problem) {
	process.stderr.write(problem + '\n');
	process.exitCode = 1;
} else {
	import('./database/command.mjs').then(({ databaseCommand }) => databaseCommand(process.argv[2]));
}
