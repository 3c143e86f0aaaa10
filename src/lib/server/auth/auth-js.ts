import { SvelteKitAuth, CredentialsSignin, type SvelteKitAuthConfig } from '@auth/sveltekit';
import Credentials from '@auth/sveltekit/providers/credentials';
import Nodemailer from '@auth/sveltekit/providers/nodemailer';
import type { RequestEvent } from '@sveltejs/kit';
import { passwordSignInSchema } from '$lib/schemas/sign-in';
import { log } from '../http/log';
import { origin } from '../http/origin';
import { sendSignInLink } from '../mail/letters';
import { adapter } from './adapter';
import { isPassword } from './password';
import { returnPath } from './return-path';
import { beginSession, SESSION_LIFE_s } from './sessions';
import { changeUser, findUserByEmail } from './users';

const LINK_LIFE_s = 3600;

/** The password fits, but nobody has yet shown that the address is theirs. */
export class AddressNotVerified extends CredentialsSignin {
	override code = 'address-not-verified';
}

const byPassword = Credentials({
	credentials: { email: {}, password: {} },
	async authorize(typed) {
		const read = passwordSignInSchema.safeParse(typed);
		if (!read.success) return null;
		const found = await findUserByEmail(read.data.email);
		if (!(await isPassword(read.data.password, found?.passwordHash ?? null)) || !found) return null;
		if (!found.emailVerified) throw new AddressNotVerified();
		return { id: found.id, email: found.email, name: found.name };
	}
});

const byLink = () =>
	Nodemailer({
		id: 'email',
		// Asked for but not used: our own letter is posted.
		server: 'smtp://127.0.0.1',
		maxAge: LINK_LIFE_s,
		// Its own address is built from the request; the letter's is built from the configured origin.
		sendVerificationRequest: ({ identifier, token, url }) =>
			sendSignInLink(identifier, token, returnPath(pathOf(new URL(url).searchParams.get('callbackUrl'))))
	});

/** Names of errors that tell of a wrong password or an old link, not of a fault. */
const REFUSALS: ReadonlySet<string> = new Set([
	'CredentialsSignin',
	'AddressNotVerified',
	'Verification',
	'AccessDenied'
]);

/** The path of an address of ours. */
function pathOf(url: string | null): string | null {
	if (url === null || !URL.canParse(url, origin())) return null;
	const { pathname, search } = new URL(url, origin());
	return pathname + search;
}

/** Only people who signed up may use a link. A password that was set before the address was proved is dropped. */
async function mayUseLink(email: string, asksForLetter: boolean): Promise<boolean> {
	const found = await findUserByEmail(email);
	if (found && !found.emailVerified && !asksForLetter) await changeUser(found.id, { passwordHash: null });
	return found !== null;
}

async function config(event: RequestEvent): Promise<SvelteKitAuthConfig> {
	return {
		adapter: adapter(),
		providers: [byPassword, byLink()],
		secret: process.env.AUTH_SECRET,
		trustHost: true,
		useSecureCookies: origin().startsWith('https:'),
		session: { strategy: 'jwt', maxAge: SESSION_LIFE_s },
		pages: { signIn: '/sign-in', error: '/sign-in/link', verifyRequest: '/sign-in/sent', signOut: '/' },
		callbacks: {
			signIn: async ({ user, account, email }) =>
				account?.type === 'credentials' || mayUseLink(user.email ?? '', email?.verificationRequest === true),
			redirect: async ({ url }) => origin() + returnPath(pathOf(url)),
			async jwt({ token, user, trigger }) {
				if (trigger !== 'signIn' || !user.id) return token;
				const sessionId = await beginSession(user.id, event.request.headers.get('user-agent') ?? '');
				return { sub: user.id, sessionId };
			}
		},
		logger: {
			error: (cause) =>
				REFUSALS.has(cause.name)
					? log.info({ reason: cause.name }, 'sign-in was refused')
					: log.error({ err: cause }, 'sign-in failed'),
			warn: (code) => log.debug({ code }, 'sign-in'),
			debug: () => undefined
		}
	};
}

/** Auth.js, bound to the running request. Only sign-in.ts and the hooks call it. */
export const authJs = SvelteKitAuth(config);
