import { sendVerifyAddress } from '../mail/letters';
import { postBeside } from '../mail/post';
import { newMailToken, useMailToken } from './mail-tokens';
import { changeUser, findUserByEmail } from './users';

/** Takes the token of a letter as proof of the address. False when it is unknown, used or too old. */
export async function verifyAddress(token: string): Promise<boolean> {
	const userId = await useMailToken(token, 'verify-address');
	if (userId) await changeUser(userId, { emailVerified: new Date() });
	return userId !== null;
}

/** Sends the letter again, if the address waits for it; whoever asks sees no difference. */
export function sendVerificationAgain(email: string): void {
	postBeside(async () => {
		const found = await findUserByEmail(email);
		if (!found || found.emailVerified) return;
		const token = await newMailToken(found.id, 'verify-address');
		await sendVerifyAddress(email, token);
	});
}
