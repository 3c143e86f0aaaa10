import { z } from 'zod';
import { origin } from '../http/origin';

const messageSchema = z.object({
	id: z.string(),
	to: z.array(z.string()),
	from: z.string(),
	subject: z.string(),
	/** When the fake took it, as ISO 8601. */
	received: z.string(),
	text: z.string(),
	html: z.string().nullable()
});

export type InboxMessage = z.infer<typeof messageSchema>;

/** Address of the fake mail server's inbox; null where there is none, as in production. */
export const inboxUrl = (): string | null => process.env.MAIL_INBOX_URL || null;

/**
 * Whether a request may see the inbox: one that names this very server. A page of another site can lead its own name to
 * this machine, and would read the letters under it.
 */
export const mayReadInbox = (request: Request): boolean =>
	inboxUrl() !== null && request.headers.get('host') === new URL(origin()).host;

async function read(path: string): Promise<unknown> {
	const answer = await fetch(new URL(path, inboxUrl() ?? undefined));
	if (answer.status === 404) return null;
	if (!answer.ok) throw new Error(`the inbox answered ${answer.status}`);
	return answer.json();
}

/** Every letter in the fake inbox, newest first. */
export async function listMessages(): Promise<InboxMessage[]> {
	return z.array(messageSchema).parse(await read('/messages'));
}

/** One letter; null when it is not there. */
export async function findMessage(id: string): Promise<InboxMessage | null> {
	return messageSchema.nullable().parse(await read(`/messages/${encodeURIComponent(id)}`));
}
