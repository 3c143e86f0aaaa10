import { createTransport } from 'nodemailer';
import { log } from '../http/log';
import { origin } from '../http/origin';

export interface Letter {
	readonly to: string;
	readonly subject: string;
	readonly text: string;
	readonly html: string;
}

/** Address of the mail server, as smtp://127.0.0.1:1025. */
function smtpUrl(): string {
	const url = process.env.SMTP_URL;
	if (!url) throw new Error('SMTP_URL is not set');
	return url;
}

/** Who the letters are from. */
const sender = (): string => process.env.MAIL_FROM ?? `Evendraft <no-reply@${new URL(origin()).hostname}>`;

/** Hands one letter to the mail server. */
export async function post(letter: Letter): Promise<void> {
	const transport = createTransport(smtpUrl());
	try {
		await transport.sendMail({ ...letter, from: sender() });
	} finally {
		transport.close();
	}
}

const underWay = new Set<Promise<void>>();

/**
 * Posts beside the reply. Whether an address is known must not show in how long an answer takes, nor in whether the
 * mail server was reached; a letter that failed is in the log.
 */
export function postBeside(letter: () => Promise<void>): void {
	const posted = letter()
		.catch((cause: unknown) => log.error({ err: cause }, 'a letter was not sent'))
		.finally(() => underWay.delete(posted));
	underWay.add(posted);
}

/** Resolves when every letter under way has been handed over; before the server ends. */
export async function lettersPosted(): Promise<void> {
	await Promise.all(underWay);
}
