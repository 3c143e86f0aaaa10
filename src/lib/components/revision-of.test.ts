import { describe, expect, it } from 'vitest';
import { revisionOf } from './revision-of';

const P01 = { revision: 'P01', standsAt: 7, status: 'issued-for-review' } as const;

describe('what a title block says of the revision', () => {
	it('is the revision with its own status while the sheet stands as saved', () => {
		expect(revisionOf(P01, 7)).toEqual({
			caption: 'Revision',
			code: 'P01',
			about: 'as saved',
			status: 'issued-for-review'
		});
	});

	it('is work in progress after it from the first edit on, whatever the status of the revision', () => {
		expect(revisionOf(P01, 8)).toEqual({
			caption: 'In work, after',
			code: 'P01',
			about: 'changed since',
			status: 'work-in-progress'
		});
	});

	it('names no revision where none was saved', () => {
		expect(revisionOf(undefined, 3)).toMatchObject({ code: '–', status: 'work-in-progress' });
	});
});
