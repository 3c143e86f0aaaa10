/** The project's fake mail server for one test file, and what a person would do with a letter. */
import { startMailFake } from '../../../scripts/fakes/mail.mjs';
import { lettersPosted } from '../../../src/lib/server/mail/post';

interface Message {
	readonly subject: string;
	readonly text: string;
	readonly html: string;
}

export async function startMail() {
	const fake = await startMailFake();
	process.env.SMTP_URL = fake.smtpUrl;

	/** Letters to an address, newest first, when all that were under way have come. */
	async function letters(to: string): Promise<Message[]> {
		await lettersPosted();
		const answer = await fetch(`${fake.inboxUrl}/messages?to=${encodeURIComponent(to)}`);
		return (await answer.json()) as Message[];
	}

	/** The address that the newest letter leads to. */
	async function link(to: string): Promise<URL> {
		const [newest] = await letters(to);
		const found = /https?:\/\/\S+/.exec(newest?.text ?? '');
		if (!found) throw new Error(`no letter with a link came to ${to}`);
		return new URL(found[0]);
	}

	return { letters, link, close: fake.close };
}
