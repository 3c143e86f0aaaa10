import { describe, expect, it } from 'vitest';
import { nodeVersionProblem } from './node-version.mjs';

describe('the version of Node.js', () => {
	it.each(['20.19.0', '20.20.2', '21.0.0', '22.17.1', '24.9.0'])('%s will do', (version) => {
		expect(nodeVersionProblem(version)).toBeNull();
	});
	it.each(['12.22.0', '18.20.4', '20.9.0', '20.18.3', '25.0.0', '26.1.0'])('%s is refused in one line', (version) => {
		const problem = nodeVersionProblem(version);
		expect(problem).toContain(version);
		expect(problem).toMatch(/Install Node\.js 20/);
		expect(problem).not.toContain('\n');
	});
});
