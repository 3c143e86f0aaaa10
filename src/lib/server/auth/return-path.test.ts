import { describe, expect, it } from 'vitest';
import { FIRST_PAGE, returnPath } from './return-path';

describe('the path to return to after sign-in', () => {
	it.each(['/register', '/designs/1/sheet?at=S01', '/a/./b', '/methods#elbows'])('%s is one of our own', (path) =>
		expect(returnPath(path)).toBe(new URL(path, 'http://x.invalid').pathname + new URL(path, 'http://x.invalid').search)
	);

	it.each([
		...[
			'',
			'register',
			'//elsewhere.example',
			'/\\elsewhere.example',
			'http://elsewhere.example',
			'/\t/elsewhere.example'
		],
		...[
			'/.//elsewhere.example/x',
			'/x/..//elsewhere.example',
			'/%2e//elsewhere.example',
			'/a/%2E%2e//elsewhere.example'
		]
	])('%s leads to the first page instead', (path) => expect(returnPath(path)).toBe(FIRST_PAGE));
});
