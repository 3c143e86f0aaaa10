import { foundFirm } from '../firms/found-firm';
import { sendAddressKnown, sendVerifyAddress } from '../mail/letters';
import { postBeside } from '../mail/post';
import { newMailToken } from './mail-tokens';
import { passwordHash } from './password';

interface SignUp {
	readonly name: string;
	readonly firmName: string;
	readonly email: string;
	readonly password: string;
}

/**
 * Makes a person and their firm and sends the letter that confirms the address. For a known address nothing is made
 * and its owner is told by letter; whoever asks sees no difference.
 */
export async function signUp({ name, firmName, email, password }: SignUp): Promise<void> {
	const founded = await foundFirm({ name, firmName, email, passwordHash: await passwordHash(password) });
	postBeside(async () => {
		if (!founded) return sendAddressKnown(email);
		return sendVerifyAddress(email, await newMailToken(founded.userId, 'verify-address'));
	});
}
