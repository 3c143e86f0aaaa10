import { endLetters } from './mail-tokens';
import { isPassword, passwordHash } from './password';
import { revokeSessions } from './sessions';
import { changeUser, findUser } from './users';

/**
 * Changes the password of a signed-in person and signs their other browsers out. False when the present password
 * does not fit; one who has none yet gives none.
 */
export async function changePassword(
	userId: string,
	sessionId: string,
	change: { readonly present: string; readonly password: string }
): Promise<boolean> {
	const found = await findUser(userId);
	if (!found) return false;
	if (found.passwordHash !== null && !(await isPassword(change.present, found.passwordHash))) return false;
	await changeUser(userId, { passwordHash: await passwordHash(change.password) });
	await endLetters(userId, found.email);
	await revokeSessions(userId, sessionId);
	return true;
}

/** Whether a person has a password; those who came only by links have none. */
export async function hasPassword(userId: string): Promise<boolean> {
	return (await findUser(userId))?.passwordHash != null;
}
