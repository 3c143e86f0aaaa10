import { sendResetPassword } from '../mail/letters';
import { postBeside } from '../mail/post';
import { endLetters, isLiveMailToken, newMailToken, useMailToken } from './mail-tokens';
import { passwordHash } from './password';
import { revokeSessions } from './sessions';
import { changeUser, findUser, findUserByEmail } from './users';

/** Sends the letter for a new password to a known address; whoever asks sees no difference. */
export function askForReset(email: string): void {
	postBeside(async () => {
		const found = await findUserByEmail(email);
		if (found) await sendResetPassword(email, await newMailToken(found.id, 'reset-password'));
	});
}

/** Whether the token of a letter would still let a password be chosen. */
export const mayReset = (token: string): Promise<boolean> => isLiveMailToken(token, 'reset-password');

/**
 * Sets the password by the token of a letter, which also proves the address, and signs every browser out.
 * False when the token is unknown, used or too old.
 */
export async function resetPassword(token: string, password: string): Promise<boolean> {
	const hash = await passwordHash(password);
	const userId = await useMailToken(token, 'reset-password');
	if (!userId) return false;
	await changeUser(userId, { passwordHash: hash, emailVerified: new Date() });
	const found = await findUser(userId);
	if (found) await endLetters(userId, found.email);
	await revokeSessions(userId, null);
	return true;
}
