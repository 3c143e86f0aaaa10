import { describe, expect, it } from 'vitest';
import { errorWords } from './error-words';

describe('what the log keeps of an error', () => {
	it('is its kind, its message and where it happened', () => {
		const words = errorWords(new RangeError('too deep'));
		expect(words).toMatchObject({ type: 'RangeError', message: 'too deep' });
		expect(words.stack).toContain('error-words.test');
	});

	it('is nothing of what a query carried, nor of what the database says of it', () => {
		const cause = Object.assign(new Error('duplicate key: (email)=(person@example.test)'), {
			...{ code: '23505', query: 'insert into "user" values ($1)', parameters: ['$argon2id$secret'] }
		});
		const failed = new Error('Failed query: insert into "user"\nparams: $argon2id$secret,person@example.test', {
			cause
		});
		const kept = JSON.stringify(errorWords(failed));
		expect(kept).toContain('23505');
		expect(kept).not.toMatch(/argon2|person@|insert into/);
	});

	it('is little of what is no error', () => expect(errorWords('secret')).toMatchObject({ type: 'string' }));
});
