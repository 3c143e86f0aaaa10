import { origin } from '../http/origin';
import { letter } from './letter';
import { post } from './post';

/** An address of the application with values in its query; built from the configured origin. */
function address(path: string, query: Readonly<Record<string, string>> = {}): string {
	const url = new URL(path, origin());
	for (const [name, value] of Object.entries(query)) url.searchParams.set(name, value);
	return url.href;
}

const NOT_YOU = 'If this was not you, leave the letter unanswered; nothing changes.';

/**
 * Asks the person who signed up to confirm that the address is theirs. Valid for 24 hours. Nothing that was typed at
 * sign-up stands in it: anybody can type anybody's address there.
 */
export function sendVerifyAddress(to: string, token: string): Promise<void> {
	return post(
		letter({
			to,
			subject: 'Confirm your address for Evendraft',
			heading: 'Confirm your address',
			paragraphs: [
				`This address was given to start a firm in Evendraft. Confirm it, then sign in with the password that you chose.`,
				`${NOT_YOU} Do not confirm a firm that you did not start.`
			],
			link: { words: 'Confirm this address', url: address('/verify', { token }) },
			foot: [
				['Letter', 'Confirm address'],
				['Works', 'Once, for 24 hours'],
				['Sent to', to]
			]
		})
	);
}

/** Leads to a page where a new password is chosen. Valid for one hour. */
export function sendResetPassword(to: string, token: string): Promise<void> {
	return post(
		letter({
			to,
			subject: 'Choose a new password for Evendraft',
			heading: 'Choose a new password',
			paragraphs: [
				'Somebody asked for a new password for this address. Choosing one signs out every browser that is signed in.',
				`${NOT_YOU} Your password stays as it is.`
			],
			link: { words: 'Choose a new password', url: address('/reset', { token }) },
			foot: [
				['Letter', 'New password'],
				['Works', 'Once, for 1 hour'],
				['Sent to', to]
			]
		})
	);
}

/** Signs in without a password. Valid for one hour. `next` is a path of the application. */
export function sendSignInLink(to: string, token: string, next: string): Promise<void> {
	return post(
		letter({
			to,
			subject: 'Your link to sign in to Evendraft',
			heading: 'Sign in',
			paragraphs: ['Somebody asked for a link to sign in with this address.', NOT_YOU],
			link: { words: 'Sign in to Evendraft', url: address('/sign-in/link/open', { token, email: to, to: next }) },
			foot: [
				['Letter', 'Sign-in link'],
				['Works', 'Once, for 1 hour'],
				['Sent to', to]
			]
		})
	);
}

/** Tells the owner of a known address that somebody tried to sign up with it. */
export function sendAddressKnown(to: string): Promise<void> {
	return post(
		letter({
			to,
			subject: 'You already have an account in Evendraft',
			heading: 'This address is known already',
			paragraphs: [
				'Somebody tried to start a firm in Evendraft with this address. It has an account already, so none was made.',
				`Sign in with it. If you do not know the password, ask there for a link or for a new one. ${NOT_YOU}`
			],
			link: { words: 'Sign in', url: address('/sign-in') },
			foot: [
				['Letter', 'Address known'],
				['Needs', 'No answer'],
				['Sent to', to]
			]
		})
	);
}
