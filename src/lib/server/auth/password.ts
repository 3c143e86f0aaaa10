import { hash, verify } from '@node-rs/argon2';
import { COMMON_PASSWORDS } from './common-passwords';

/**
 * argon2id with 19 MiB, two passes, one lane; the library's default algorithm is argon2id.
 * @source OWASP Password Storage Cheat Sheet, section Argon2id (from memory)
 */
const COST = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

/** The password in argon2's own encoded form, with its salt and cost. */
export const passwordHash = (password: string): Promise<string> => hash(password, COST);

let stranger: Promise<string> | null = null;

/** Whether the password fits. Without a hash it takes as long and answers no, so that time tells nothing. */
export async function isPassword(password: string, encoded: string | null): Promise<boolean> {
	stranger ??= passwordHash('no account has this password');
	const fits = await verify(encoded ?? (await stranger), password);
	return encoded !== null && fits;
}

/** Why a password may not be chosen, in words for the person; null when it may. */
export function passwordObjection(password: string, email: string): string | null {
	const plain = password.toLowerCase();
	const [local = ''] = email.toLowerCase().split('@');
	if (plain === email.toLowerCase() || (local.length >= 5 && plain.replace(local, '').length < 5))
		return 'Choose a password that is not your address.';
	if (COMMON_PASSWORDS.has(plain) || new Set(plain).size < 4)
		return 'This password is among the first that are tried. Choose another.';
	return null;
}
