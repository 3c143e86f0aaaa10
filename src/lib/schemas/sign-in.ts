import { z } from 'zod';
import { keepable } from './keepable';

/** An address in lower case. The pattern admits plain ASCII addresses only, so that none can look like another. */
const email = z
	.string()
	// Before anything reads through it.
	.max(1_000, { error: 'An address has at most 254 characters.', abort: true })
	.trim()
	.toLowerCase()
	.min(1, { error: 'Type your e-mail address.', abort: true })
	.max(254, { error: 'An address has at most 254 characters.', abort: true })
	.regex(z.regexes.email, 'This is not an e-mail address. One looks like name@firm.example.');

/** Shortest password that may be chosen. */
export const PASSWORD_MIN = 10;
// Longer ones would only cost the server time.
const PASSWORD_MAX = 200;

/** A password that is being chosen. */
export const newPassword = z
	.string()
	.min(PASSWORD_MIN, `A password has at least ${PASSWORD_MIN} characters.`)
	.max(PASSWORD_MAX, `A password has at most ${PASSWORD_MAX} characters.`);

/** A person's name as colleagues read it. */
export const personName = keepable()
	.trim()
	.min(1, 'Type your name.')
	.max(100, 'A name has at most 100 characters here.');

export const passwordSignInSchema = z.object({
	email,
	password: z.string().min(1, 'Type your password.').max(PASSWORD_MAX, 'This is longer than any password here.'),
	to: z.string().default('')
});

export const linkSchema = z.object({ email, to: z.string().default('') });

export const emailSchema = z.object({ email });

export const signUpSchema = z.object({
	name: personName,
	firmName: keepable()
		.trim()
		.min(1, 'Type the name of your firm.')
		.max(120, 'A firm’s name has at most 120 characters here.'),
	email,
	password: newPassword
});

export const resetSchema = z.object({ token: z.string().max(100), password: newPassword });
