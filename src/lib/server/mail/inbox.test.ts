import { afterEach, describe, expect, it, vi } from 'vitest';
import { mayReadInbox } from './inbox';

const asked = (host: string) => new Request('http://localhost:5180/dev/inbox', { headers: { host } });

afterEach(() => vi.unstubAllEnvs());

describe('the inbox of the fake mail server', () => {
	it('opens to requests that name this very server, and to no other name that leads here', () => {
		vi.stubEnv('MAIL_INBOX_URL', 'http://127.0.0.1:1');
		vi.stubEnv('AUTH_URL', '');
		vi.stubEnv('ORIGIN', 'http://localhost:5180');
		expect(mayReadInbox(asked('localhost:5180'))).toBe(true);
		expect(mayReadInbox(asked('elsewhere.example:5180'))).toBe(false);
		expect(mayReadInbox(asked('localhost'))).toBe(false);
	});

	it('is not there where no such server is configured', () => {
		vi.stubEnv('MAIL_INBOX_URL', '');
		expect(mayReadInbox(asked('localhost:5180'))).toBe(false);
	});
});
